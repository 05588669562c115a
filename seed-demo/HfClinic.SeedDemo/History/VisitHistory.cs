using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.Records.Contacts;
using HfClinic.Records.Visits;
using HfClinic.SeedDemo.Persons;

namespace HfClinic.SeedDemo.History;

/// <summary>Invented visits, ejection fractions, earlier calls and earlier symptoms.</summary>
internal static class VisitHistory
{
    private static readonly ImmutableArray<string> VisitNotes =
    [
        "Stable, sleeps flat, no oedema.", "Walks to the shop and back. Lungs clear.", "Mild ankle oedema in the evening.",
        "Feels better since the last change.", "Tires on stairs; pressure and pulse as at home.",
    ];

    private static readonly ImmutableArray<(ContactOutcome Outcome, string Note)> Calls =
    [
        (ContactOutcome.Spoke, "Routine call. Takes the tablets, weighs each morning."),
        (ContactOutcome.Spoke, "Asked about salt and fluids; nothing new."),
        (ContactOutcome.SpokeWithRelative, "Daughter says all is well; away for the weekend."),
        (ContactOutcome.LeftMessage, "Asked to call back about the next visit."),
        (ContactOutcome.NoAnswer, "Rang twice."),
        (ContactOutcome.SentMessage, "Reminder of the blood test."),
    ];

    private static readonly ImmutableArray<Symptoms> Complaints =
    [
        Symptoms.AnkleSwelling, Symptoms.Fatigue, Symptoms.BreathlessOnExertion, Symptoms.Dizziness, Symptoms.Cough,
        Symptoms.Palpitations, Symptoms.PoorAppetite | Symptoms.Fatigue, Symptoms.BreathlessOnExertion | Symptoms.AnkleSwelling,
    ];

    public static ImmutableArray<Seen> Visits(Chance chance) =>
    [
        .. ((int[])[-174, -86, -30]).Where(_ => chance.Happens(0.85)).Select(about => new Seen(
            about + chance.Between(-6, 6),
            chance.Happens(0.8) ? VisitKind.Clinic : VisitKind.Phone,
            chance.Happens(0.6) ? 2 : chance.Happens(0.7) ? 3 : 1,
            chance.Pick(VisitNotes))),
    ];

    public static ImmutableArray<Fraction> Fractions(Chance chance, Person person) =>
    [
        new(chance.Between(-900, -300), Math.Clamp(person.EjectionFraction - chance.Between(-3, 8), 12, 70)),
        .. chance.Happens(0.7) ? (Fraction[])[new(chance.Between(-170, -40), person.EjectionFraction)] : [],
    ];

    /// <summary>Calls well before the last days.</summary>
    public static ImmutableArray<Called> EarlierCalls(Chance chance) =>
    [
        .. Enumerable.Range(0, chance.Below(4)).Select(_ =>
        {
            var (outcome, note) = chance.Pick(Calls);
            return new Called(chance.Between(-150, -24), outcome, note);
        }).OrderBy(call => call.Day),
    ];

    /// <summary>Symptoms told well before the last days.</summary>
    public static ImmutableArray<Told> EarlierSymptoms(Chance chance) =>
    [
        .. Enumerable.Range(0, chance.Happens(0.35) ? chance.Between(1, 3) : 0)
            .Select(_ => new Told(chance.Between(-150, -24), chance.Pick(Complaints))).OrderBy(told => told.Day),
    ];
}
