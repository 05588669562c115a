using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Contacts;
using HfClinic.Records.Visits;

namespace HfClinic.SeedDemo.History;

/// <summary>One measured value; the day counts back from the last morning.</summary>
internal readonly record struct Measured(ReadingKind Kind, int Day, int Minute, int Value, string? AsTyped = null, HoldReason? Held = null);

/// <summary>Symptoms as told on a day.</summary>
internal sealed record Told(int Day, Symptoms Symptoms, string? Note = null);

/// <summary>A target weight from a day on.</summary>
internal sealed record Target(int Day, Weight Weight, string Reason);

/// <summary>One medicine at one dose from a day until a day.</summary>
internal sealed record Course(string Medicine, decimal Milligrams, decimal TimesDaily, int From, int? Until = null, string? Reason = null);

/// <summary>One laboratory result.</summary>
internal sealed record Tested(string Analyte, int Day, decimal Value, string Unit);

/// <summary>One measured ejection fraction, percent.</summary>
internal sealed record Fraction(int Day, decimal Percent);

/// <summary>One visit with the class of the New York Heart Association.</summary>
internal sealed record Seen(int Day, VisitKind Kind, int NyhaClass, string Note);

/// <summary>One call or message.</summary>
internal sealed record Called(int Day, ContactOutcome Outcome, string Note);
