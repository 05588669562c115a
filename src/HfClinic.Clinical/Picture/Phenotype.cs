using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Picture;

/// <summary>The kind of heart failure by ejection fraction.</summary>
public enum PhenotypeKind
{
    /// <summary>HFrEF: 40 % or less.</summary>
    Reduced = 1,

    /// <summary>HFmrEF: 41 to 49 %.</summary>
    MildlyReduced = 2,

    /// <summary>HFpEF: 50 % or more, never reduced before.</summary>
    Preserved = 3,

    /// <summary>HFimpEF: once reduced, since improved.</summary>
    Improved = 4,
}

/// <summary>A prescriber's word on the phenotype, which goes before the numbers (for example an ejection fraction measured in fast atrial fibrillation).</summary>
public sealed record PhenotypeOverride(PhenotypeKind Kind, string Reason, string By, DateOnly On);

/// <summary>The phenotype read from the history of ejection fractions.</summary>
/// <param name="Kind">By number, or by the prescriber's word.</param>
/// <param name="OnHfrefPathway">
/// Whether HFrEF therapy is looked for: for life once an ejection fraction was 40 % or less (ESC 2021, AHA 2022), unless the
/// prescriber says otherwise.
/// </param>
/// <param name="Latest">The ejection fraction it rests on; null when the prescriber set it without one.</param>
/// <param name="Sentence">Why, in one sentence.</param>
public sealed record Phenotype(PhenotypeKind Kind, bool OnHfrefPathway, EjectionFraction? Latest, string Sentence)
{
    /// <summary>
    /// Reads the picture; null when there is no ejection fraction and no word of a prescriber. Definitions: ESC 2021 and the
    /// universal definition of 2021 (HFimpEF: 40 % or less, then a rise of 10 points or more to above 40 %; from memory).
    /// Fractions are rounded to whole numbers, halves up, before they are compared: 40.5 % is 41 %.
    /// </summary>
    public static Phenotype? Of(PatientPicture picture)
    {
        var seen = picture.EjectionFractions.Where(fraction => fraction.Day <= picture.AsOf).ToList();
        var latest = seen.LastOrDefault();
        if (picture.PhenotypeOverride is { } word && word.On <= picture.AsOf)
        {
            return new(
                word.Kind,
                word.Kind is PhenotypeKind.Reduced or PhenotypeKind.Improved,
                latest,
                $"{Words(word.Kind)}, set by {word.By} on {Wording.Day(word.On)}: {word.Reason}");
        }

        if (latest is null)
        {
            return null;
        }

        var lowest = seen.MinBy(Whole)!;
        var kind = KindOf(Whole(latest), Whole(lowest));
        var because = Whole(lowest) <= 40 && Whole(latest) > 40 ? $", {Number(lowest)} on {Wording.Day(lowest.Day)}" : "";
        return new(kind, Whole(lowest) <= 40, latest, $"{Words(kind)}: LVEF {Number(latest)} on {Wording.Day(latest.Day)}{because}");
    }

    /// <summary>"HFrEF", "HFmrEF", "HFpEF" or "HFimpEF".</summary>
    public static string Words(PhenotypeKind kind) => kind switch
    {
        PhenotypeKind.Reduced => "HFrEF",
        PhenotypeKind.MildlyReduced => "HFmrEF",
        PhenotypeKind.Preserved => "HFpEF",
        _ => "HFimpEF",
    };

    /// <summary>The ejection fraction as a whole number, halves up.</summary>
    public static int Whole(EjectionFraction fraction) => (int)decimal.Floor(fraction.Percent + 0.5m);

    private static PhenotypeKind KindOf(int latest, int lowest) => latest switch
    {
        <= 40 => PhenotypeKind.Reduced,
        _ when lowest <= 40 && latest - lowest >= 10 => PhenotypeKind.Improved,
        <= 49 => PhenotypeKind.MildlyReduced,
        _ => PhenotypeKind.Preserved,
    };

    private static string Number(EjectionFraction fraction) =>
        string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{fraction.Percent:0.##} %");
}
