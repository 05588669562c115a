using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Sources;
using HfClinic.Clinical.Values;
using HfClinic.Records.Flags;
using HfClinic.Records.Readings;
using Words = HfClinic.Clinical.Values.Wording;

namespace HfClinic.Web.Chart;

/// <summary>How the entries of a chart are written.</summary>
public static class ChartWords
{
    private static readonly SourceTable Sources = SourceTable.Load();

    public static string Of(ReadingKind kind) => kind switch
    {
        ReadingKind.Weight => "Weight",
        ReadingKind.SystolicPressure => "Systolic pressure",
        ReadingKind.DiastolicPressure => "Diastolic pressure",
        ReadingKind.HeartRate => "Pulse",
        _ => "Oxygen saturation",
    };

    /// <summary>"74.6 kg", "118 mmHg", "72 per minute", "96 %".</summary>
    public static string Value(ReadingKind kind, int value, WeightUnit unit) => kind switch
    {
        ReadingKind.Weight => Words.Weight(new Weight(value), unit),
        ReadingKind.SystolicPressure or ReadingKind.DiastolicPressure => string.Create(CultureInfo.InvariantCulture, $"{value} mmHg"),
        ReadingKind.HeartRate => string.Create(CultureInfo.InvariantCulture, $"{value} per minute"),
        _ => string.Create(CultureInfo.InvariantCulture, $"{value} %"),
    };

    public static string Of(ReadingSource source) => source switch
    {
        ReadingSource.HomeFile => "home scale, from a file",
        ReadingSource.Phone => "called in",
        _ => "measured in the clinic",
    };

    /// <summary>What a reading counts as, where that is not plain: "held: 155.0 kg looks like pounds".</summary>
    public static string State(Reading reading, WeightUnit unit) => reading.State switch
    {
        ReadingState.Held => $"held: {Held(reading, unit)}",
        ReadingState.StruckOut => "struck out",
        ReadingState.Superseded => "corrected",
        _ => reading.SupersedesId is null ? "" : "correction",
    };

    /// <summary>"struck out", "corrected", "confirmed".</summary>
    public static string Decision(ReadingState to) => to switch
    {
        ReadingState.Accepted => "confirmed",
        ReadingState.Superseded => "corrected",
        ReadingState.StruckOut => "struck out",
        _ => "held",
    };

    public static string Of(FlagStepKind kind) => kind switch
    {
        FlagStepKind.Raised => "raised",
        FlagStepKind.Joined => "seen again with newer values",
        FlagStepKind.Escalated => "grew",
        FlagStepKind.NoLongerMet => "the values no longer meet the limit",
        FlagStepKind.Seen => "looked at",
        FlagStepKind.PutOff => "put off",
        FlagStepKind.Woken => "back on the list",
        FlagStepKind.Answered => "settled",
        FlagStepKind.Cleared => "cleared by the data",
        _ => "open again",
    };

    /// <summary>"more than 2.0 kg", "at least 5 days".</summary>
    public static string Limit(Threshold threshold, decimal value, WeightUnit unit)
    {
        var side = threshold.Comparison switch
        {
            Comparison.Above => "more than",
            Comparison.AtLeast => "at least",
            Comparison.Below => "below",
            _ => "at most",
        };
        return $"{side} {Amount(threshold.Unit, value, unit)}";
    }

    /// <summary>A threshold's value in the unit people read: grams as kilograms or pounds.</summary>
    public static string Amount(string thresholdUnit, decimal value, WeightUnit unit) => thresholdUnit == "g"
        ? Words.Limit(new Weight((int)value), unit)
        : string.Create(CultureInfo.InvariantCulture, $"{value:0.###} {thresholdUnit}");

    /// <summary>"Potassium", "NT-proBNP", "TSAT": abbreviations as laboratories print them.</summary>
    public static string Analyte(string key) => key switch
    {
        "nt-probnp" => "NT-proBNP",
        "bnp" or "tsat" or "tsh" => key.ToUpperInvariant(),
        _ => Words.Sentence(key.Replace('-', ' ')),
    };

    /// <summary>Titles of the published sources of a flag.</summary>
    public static IReadOnlyList<string> SourceTitles(string keys) =>
        [.. keys.Split(' ', StringSplitOptions.RemoveEmptyEntries).Select(key => Sources.Has(key) ? Sources[key].Title : key)];

    /// <summary>"31 Mar 2026 07:00".</summary>
    public static string Time(DateTime local) => local.ToString("dd MMM yyyy HH:mm", CultureInfo.InvariantCulture);

    private static string Held(Reading reading, WeightUnit unit) => HeldWords.Describe(
        new WeightReading(reading.Id, reading.MeasuredAt, new Weight(reading.Value), new HeldReading(reading.HoldReason ?? HoldReason.Unexplained, reading.RecordedAt)), unit);
}
