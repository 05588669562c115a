using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>What makes a row of the formulary unfit to start with.</summary>
internal static class FormularyCheck
{
    public static string? WhyRefused(Medicine row, SourceTable sources) =>
        string.IsNullOrWhiteSpace(row.Name) || row.Name != row.Name.ToLowerInvariant() ? "the name is not a generic name in lower case"
        : row.Salt is not null && string.IsNullOrWhiteSpace(row.Salt) ? "the salt is blank"
        : row.Unit != "mg" ? $"the unit '{row.Unit}' is not known"
        : row.Phenotypes.IsEmpty ? "no phenotype is named"
        : SourceCheck.WhyRefused(Published(row), sources) is { } fault ? fault
        : row.Doses.Select(dose => dose.Profile).Distinct().Count() != row.Doses.Length ? "a profile is there twice"
        : Figures(row).Select(FigureFault).FirstOrDefault(found => found is not null) is { } figure ? figure
        : row.Doses.Select(StartFault).FirstOrDefault(found => found is not null) is { } start ? start
        : LadderFault(row.Ladder) is { } ladder ? ladder
        : row.Interval is { } interval && (interval.Days < 1 || interval.UpTo < interval.Days) ? "the interval is not a number of days"
        : SteeringFault(row);

    private static IEnumerable<IPublished> Published(Medicine row)
    {
        IEnumerable<IPublished?> single = [row.Atc, row.RxNorm, row.Ladder, row.Interval];
        return [.. single.OfType<IPublished>(), .. Figures(row), .. row.InformationFrom, .. row.LowStartWhen, .. row.Notes];
    }

    private static IEnumerable<DoseFigure> Figures(Medicine row) => row.Doses
        .SelectMany(dose => new[] { dose.Start, dose.LowStart, dose.Target, dose.Maximum, dose.Usual })
        .OfType<DoseFigure>()
        .Concat(row.ByWeight.Select(entry => entry.Dose))
        .Concat(row.ByKidney.SelectMany(entry => new[] { entry.Start, entry.Target }));

    private static string? FigureFault(DoseFigure figure) =>
        figure.Low <= 0 || figure.TimesDaily <= 0 ? "a dose is not above zero"
        : figure.High < figure.Low ? Say($"the range {figure.Low} to {figure.High} runs down")
        : figure.AtTargetFrom is { } from && (from < figure.Low || from > figure.High) ? Say($"{from} lies outside its own range")
        : null;

    private static string? StartFault(PublishedDoses doses) =>
        doses is { Start: { } start, Target: { } target } && start.HighDaily > target.HighDaily
            ? Say($"the start of {start.HighDaily} a day lies above the target of {target.HighDaily} a day")
        : doses is { LowStart: { } low, Start: { } usual } && low.LowDaily >= usual.HighDaily ? "the low start is not below the start"
        : null;

    private static string? LadderFault(DoseLadder? ladder) =>
        ladder is null ? null
        : ladder.Rungs.IsDefaultOrEmpty ? "the ladder has no rung"
        : ladder.Rungs.Any(rung => rung.Daily <= 0) ? "a rung is not above zero"
        : ladder.Rungs.Zip(ladder.Rungs.Skip(1)).Any(pair => pair.First.Daily >= pair.Second.Daily) ? "the ladder is not sorted upwards"
        : null;

    private static string? SteeringFault(Medicine row)
    {
        var hasTarget = row.Doses.Any(dose => dose.Target is not null);
        return row.SteeredBy is SteeredBy.Dose or SteeredBy.FixedDose
            ? (!hasTarget ? "it is steered by dose and has no target" : row.Ladder is null ? "it is steered by dose and has no ladder" : null)
            : (hasTarget ? "it is not steered by dose and has a target" : null);
    }

    private static string Say(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}

/// <summary>Whether every figure of a row names sources that resolve.</summary>
internal static class SourceCheck
{
    public static string? WhyRefused(IEnumerable<IPublished> figures, SourceTable sources) =>
        figures.Select(figure => WhyRefused(figure.SourceKeys, sources)).FirstOrDefault(fault => fault is not null);

    public static string? WhyRefused(ImmutableArray<string> keys, SourceTable sources) =>
        keys.IsDefaultOrEmpty ? "a figure names no source"
        : keys.FirstOrDefault(key => !sources.Has(key)) is { } missing ? $"the source '{missing}' is not in the source table"
        : null;
}
