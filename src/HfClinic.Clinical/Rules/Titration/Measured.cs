using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>One measured value as a limit reads it.</summary>
public sealed record Measured(LimitMeasure Measure, decimal Value, DateOnly Day, long? Id)
{
    /// <summary>"potassium 5.3 mmol/L on 12 Mar 2026".</summary>
    public string Words => $"{Name(Measure)} {Amount(Measure, Value)} on {Wording.Day(Day)}";

    /// <summary>All values up to the picture's day, in order of time.</summary>
    /// <param name="baseline">What a rise of creatinine is counted from; without it there is none.</param>
    internal static ImmutableArray<Measured> Series(LimitMeasure measure, PatientPicture picture, Measured? baseline) => measure switch
    {
        LimitMeasure.Potassium => Blood(measure, "potassium", picture),
        LimitMeasure.Creatinine => Blood(measure, "creatinine", picture),
        LimitMeasure.Egfr => Egfr(picture),
        LimitMeasure.CreatinineRise => Rise(picture, baseline),
        LimitMeasure.SystolicPressure => Vital(measure, ReadingKind.SystolicPressure, picture),
        _ => Vital(measure, ReadingKind.HeartRate, picture),
    };

    /// <summary>"5.3 mmol/L", "92/min".</summary>
    public static string Amount(LimitMeasure measure, decimal value) => measure switch
    {
        LimitMeasure.Potassium => Say($"{value:0.0#} mmol/L"),
        LimitMeasure.Creatinine => Say($"{value:0.#} µmol/L"),
        LimitMeasure.CreatinineRise => Say($"{value:0.#} %"),
        LimitMeasure.Egfr => Say($"{value:0.#} mL/min/1.73 m²"),
        LimitMeasure.SystolicPressure => Say($"{value:0} mmHg"),
        _ => Say($"{value:0}/min"),
    };

    public static string Name(LimitMeasure measure) => measure switch
    {
        LimitMeasure.Potassium => "potassium",
        LimitMeasure.Creatinine => "creatinine",
        LimitMeasure.CreatinineRise => "creatinine above baseline by",
        LimitMeasure.Egfr => "eGFR",
        LimitMeasure.SystolicPressure => "systolic pressure",
        _ => "heart rate",
    };

    private static ImmutableArray<Measured> Rise(PatientPicture picture, Measured? baseline) =>
        baseline is not { Value: > 0 }
            ? []
            : [.. Blood(LimitMeasure.CreatinineRise, "creatinine", picture)
                .Where(value => value.Day > baseline.Day)
                .Select(value => value with { Value = (value.Value - baseline.Value) / baseline.Value * 100 })];

    /// <summary>As reported; else from the creatinine of the day by CKD-EPI 2021, where age and sex are known.</summary>
    private static ImmutableArray<Measured> Egfr(PatientPicture picture)
    {
        var reported = Blood(LimitMeasure.Egfr, "egfr", picture);
        var days = reported.Select(value => value.Day).ToHashSet();
        var computed = Blood(LimitMeasure.Creatinine, "creatinine", picture)
            .Where(value => !days.Contains(value.Day))
            .Select(value => (Value: value, Result: Renal.Egfr(Creatinine.FromMicromolPerLitre(value.Value), AgeOn(value.Day, picture.BirthDate), picture.Sex).Value))
            .Where(found => found.Result is not null)
            .Select(found => found.Value with { Measure = LimitMeasure.Egfr, Value = Renal.Whole(found.Result!.Value) });
        return [.. reported.Concat(computed).OrderBy(value => value.Day)];
    }

    private static int? AgeOn(DateOnly day, DateOnly? birth) =>
        birth is not { } born ? null : day.Year - born.Year - (day < born.AddYears(day.Year - born.Year) ? 1 : 0);

    private static ImmutableArray<Measured> Blood(LimitMeasure measure, string analyte, PatientPicture picture) => [.. picture.BloodTests
        .Where(test => test.Analyte == analyte && test.Day <= picture.AsOf)
        .Select(test => new Measured(measure, test.Value, test.Day, test.Id))];

    private static ImmutableArray<Measured> Vital(LimitMeasure measure, ReadingKind kind, PatientPicture picture) => [.. picture.Vitals
        .Where(vital => vital.Kind == kind && vital.Day <= picture.AsOf)
        .Select(vital => new Measured(measure, vital.Value, vital.Day, vital.Id))];

    private static string Say(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
