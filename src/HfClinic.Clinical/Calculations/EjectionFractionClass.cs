namespace HfClinic.Clinical.Calculations;

/// <summary>Kind of heart failure by ejection fraction.</summary>
public enum EjectionFractionKind
{
    Reduced,
    MildlyReduced,
    Preserved,
    Improved,
}

/// <summary>
/// The universal definition of 2021: reduced EF ≤ 40, mildly reduced 41 to 49, preserved ≥ 50; improved when an earlier EF of
/// ≤ 40 rose by 10 points or more to above 40.
/// </summary>
/// <remarks>
/// The definition leaves a gap between 40 and 41. Each EF is first rounded to a whole number, halves up (40.5 is 41): a choice
/// of this program, to be signed off by the clinic.
/// </remarks>
public static class EjectionFractionClass
{
    private static readonly Formula Formula = new(
        "kind of heart failure by EF",
        "",
        0,
        "EF ≤ 40 HFrEF, 41 to 49 HFmrEF, ≥ 50 HFpEF; HFimpEF when a baseline EF ≤ 40 rose by ≥ 10 points to above 40; whole numbers, halves up",
        ["universal-definition-2021", "clinic-default"])
    {
        Caution = "Without an earlier EF an improvement cannot be told.",
    };

    private static readonly Quantity<decimal> Baseline = Accepted.EjectionFraction.Named("baseline EF");

    /// <summary>Classifies the latest EF (percent, 5 to 90) against the baseline one, if there is any.</summary>
    public static Computed<EjectionFractionKind> Of(Given<decimal> latestPercent, Given<decimal> baselinePercent)
    {
        var (latest, baseline) = (Accepted.EjectionFraction.Take(latestPercent), Baseline.TakeIfThere(baselinePercent));
        return Formula.Compute([latest, baseline], () => Kind(Whole(latest.Value), baseline.Taken is { } was ? Whole(was) : null), Words);
    }

    /// <summary>An EF as it is classified: a whole percentage, halves up.</summary>
    public static int Whole(decimal percent) => (int)decimal.Round(percent, 0, MidpointRounding.AwayFromZero);

    public static string Words(EjectionFractionKind kind) => kind switch
    {
        EjectionFractionKind.Reduced => "HFrEF",
        EjectionFractionKind.MildlyReduced => "HFmrEF",
        EjectionFractionKind.Preserved => "HFpEF",
        _ => "HFimpEF",
    };

    private static EjectionFractionKind Kind(int now, int? before) =>
        now <= 40 ? EjectionFractionKind.Reduced
        : before <= 40 && now - before >= 10 ? EjectionFractionKind.Improved
        : now < 50 ? EjectionFractionKind.MildlyReduced
        : EjectionFractionKind.Preserved;
}
