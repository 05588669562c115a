using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Picture;

/// <summary>One weight. <paramref name="LocalTime"/> is the clinic's wall-clock time, which decides the clinic day.</summary>
/// <param name="Id">The stored reading, so that evidence can point to it.</param>
/// <param name="LocalTime">Date and time of day in the clinic's time zone.</param>
/// <param name="Weight">The weight as recorded.</param>
/// <param name="Held">Why the reading is set aside until a person decides, or null when it is accepted.</param>
public sealed record WeightReading(long Id, DateTime LocalTime, Weight Weight, HeldReading? Held = null)
{
    /// <summary>The clinic day of the reading.</summary>
    public DateOnly Day => DateOnly.FromDateTime(LocalTime);
}

/// <summary>Why a reading is held.</summary>
/// <param name="Reason">The likely slip.</param>
/// <param name="HeldSince">Wall-clock time in the clinic's time zone at which it was set aside.</param>
public sealed record HeldReading(HoldReason Reason, DateTime HeldSince);

/// <summary>The likely reason a weight does not fit, in the order they are offered.</summary>
public enum HoldReason
{
    /// <summary>The number fits if it was read off a scale in pounds and taken as kilograms.</summary>
    PoundsTakenAsKilograms = 1,

    /// <summary>The number fits if it was read off a scale in kilograms and taken as pounds.</summary>
    KilogramsTakenAsPounds = 2,

    /// <summary>Ten times too high.</summary>
    TenfoldTooHigh = 3,

    /// <summary>Ten times too low.</summary>
    TenfoldTooLow = 4,

    /// <summary>A digit was left out.</summary>
    DroppedDigit = 5,

    /// <summary>Two neighbouring digits were swapped.</summary>
    SwappedDigits = 6,

    /// <summary>One digit is off: 1, 10 or 100 kg away.</summary>
    WrongDigit = 7,

    /// <summary>It fits another member of the same household.</summary>
    AnotherPerson = 8,

    /// <summary>Far from the recent weights, with no likely slip.</summary>
    Unexplained = 9,
}

/// <summary>One vital sign other than weight.</summary>
/// <param name="Value">In the unit of the kind: mmHg, beats per minute or percent.</param>
public sealed record VitalReading(long Id, ReadingKind Kind, DateTime LocalTime, int Value)
{
    /// <summary>The clinic day of the reading.</summary>
    public DateOnly Day => DateOnly.FromDateTime(LocalTime);
}

/// <summary>What the patient told on one day.</summary>
public sealed record SymptomReport(long Id, DateOnly Day, Symptoms Symptoms, string? Note = null);

/// <summary>The weight the prescriber wants from a day on.</summary>
public sealed record TargetWeight(long Id, DateOnly From, Weight Weight, string SetBy, string? Reason = null);

/// <summary>One medicine at one dose.</summary>
/// <param name="Medicine">The generic name in lower case, with salt where it matters: "furosemide".</param>
/// <param name="DoseMilligrams">Milligrams at each taking.</param>
/// <param name="TimesDaily">Takings a day; 0.5 is every other day.</param>
/// <param name="Until">The first day it no longer holds; null while current.</param>
public sealed record DoseCourse(long Id, string Medicine, decimal DoseMilligrams, decimal TimesDaily, DateOnly From, DateOnly? Until)
{
    /// <summary>Milligrams a day.</summary>
    public decimal DailyMilligrams => DoseMilligrams * TimesDaily;

    /// <summary>Whether the course holds on the given day.</summary>
    public bool HoldsOn(DateOnly day) => From <= day && (Until is null || day < Until);
}

/// <summary>One laboratory value in its canonical unit.</summary>
/// <param name="Analyte">The analyte key, for example "potassium".</param>
/// <param name="Value">The value in the canonical unit of the analyte.</param>
public sealed record BloodResult(long Id, string Analyte, DateTime LocalTime, decimal Value)
{
    /// <summary>The clinic day of the sample.</summary>
    public DateOnly Day => DateOnly.FromDateTime(LocalTime);
}

/// <summary>A left ventricular ejection fraction.</summary>
/// <param name="Percent">Percent, as reported.</param>
public sealed record EjectionFraction(long Id, DateOnly Day, decimal Percent, string Method);
