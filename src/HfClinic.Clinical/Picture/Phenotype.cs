using System.Globalization;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Picture;

/// <summary>A prescriber's word on the phenotype, which goes before the numbers (for example an ejection fraction measured in fast atrial fibrillation).</summary>
public sealed record PhenotypeOverride(EjectionFractionKind Kind, string Reason, string By, DateOnly On);

/// <summary>The phenotype read from the history of ejection fractions.</summary>
/// <param name="Kind">By number, or by the prescriber's word.</param>
/// <param name="OnHfrefPathway">
/// Whether HFrEF therapy is looked for: for life once an ejection fraction was 40 % or less (ESC 2021, AHA 2022), unless the
/// prescriber says otherwise.
/// </param>
/// <param name="Latest">The ejection fraction it rests on; null when the prescriber set it without one.</param>
/// <param name="Sentence">Why, in one sentence.</param>
public sealed record Phenotype(EjectionFractionKind Kind, bool OnHfrefPathway, EjectionFraction? Latest, string Sentence)
{
    /// <summary>
    /// Reads the picture; null when there is no ejection fraction that can be used and no word of a prescriber. The lowest one up to
    /// the picture's day is the baseline of <see cref="EjectionFractionClass"/>.
    /// </summary>
    public static Phenotype? Of(PatientPicture picture)
    {
        var seen = picture.EjectionFractions.Where(fraction => fraction.Day <= picture.AsOf).ToList();
        var latest = seen.LastOrDefault();
        if (picture.PhenotypeOverride is { } word && word.On <= picture.AsOf)
        {
            return new(
                word.Kind,
                word.Kind is EjectionFractionKind.Reduced or EjectionFractionKind.Improved,
                latest,
                $"{Words(word.Kind)}, set by {word.By} on {Wording.Day(word.On)}: {word.Reason}");
        }

        var lowest = seen.MinBy(Whole);
        if (latest is null || lowest is null || EjectionFractionClass.Of(latest.Percent, lowest.Percent).Value is not { } kind)
        {
            return null;
        }

        var because = Whole(lowest) <= 40 && Whole(latest) > 40 ? $", {Number(lowest)} on {Wording.Day(lowest.Day)}" : "";
        return new(kind, Whole(lowest) <= 40, latest, $"{Words(kind)}: LVEF {Number(latest)} on {Wording.Day(latest.Day)}{because}");
    }

    /// <summary>The ejection fraction as a whole number, halves up.</summary>
    public static int Whole(EjectionFraction fraction) => EjectionFractionClass.Whole(fraction.Percent);

    private static string Words(EjectionFractionKind kind) => EjectionFractionClass.Words(kind);

    private static string Number(EjectionFraction fraction) =>
        string.Create(CultureInfo.InvariantCulture, $"{fraction.Percent:0.##} %");
}
