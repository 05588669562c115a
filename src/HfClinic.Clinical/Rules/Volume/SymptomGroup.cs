using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>Symptoms that are followed as one matter, so that one answer covers them.</summary>
/// <param name="Name">The subject of the flag.</param>
/// <param name="Members">Each symptom with how soon a person should look.</param>
internal sealed record SymptomGroup(string Name, ImmutableArray<(Symptoms Symptom, Urgency Urgency)> Members)
{
    /// <summary>Chest pain and fainting get a word of caution, because they may be an emergency.</summary>
    public const Symptoms Emergencies = Symptoms.ChestPain | Symptoms.Syncope;

    public static readonly ImmutableArray<SymptomGroup> All =
    [
        new("chest pain", [(Symptoms.ChestPain, Urgency.Today)]),
        new("faintness", [(Symptoms.Syncope, Urgency.Today), (Symptoms.Dizziness, Urgency.ThisWeek)]),
        new("breathlessness",
        [
            (Symptoms.BreathlessAtRest, Urgency.Today),
            (Symptoms.Orthopnoea, Urgency.Today),
            (Symptoms.NightBreathlessness, Urgency.Today),
            (Symptoms.BreathlessOnExertion, Urgency.ThisWeek),
        ]),
        new("swelling", [(Symptoms.AnkleSwelling, Urgency.ThisWeek), (Symptoms.AbdominalSwelling, Urgency.ThisWeek)]),
        new("palpitations", [(Symptoms.Palpitations, Urgency.ThisWeek)]),
        new("other symptoms",
        [
            (Symptoms.PoorAppetite, Urgency.NextVisit),
            (Symptoms.Nausea, Urgency.NextVisit),
            (Symptoms.Fatigue, Urgency.NextVisit),
            (Symptoms.Cough, Urgency.ForInformation),
        ]),
    ];

    /// <summary>Those of the symptoms that belong to the group.</summary>
    public Symptoms Of(Symptoms symptoms) =>
        symptoms & Members.Aggregate(Symptoms.None, (all, member) => all | member.Symptom);

    /// <summary>The soonest urgency among the symptoms.</summary>
    public Urgency UrgencyOf(Symptoms symptoms) =>
        Members.Where(member => symptoms.HasFlag(member.Symptom)).Max(member => member.Urgency);
}
