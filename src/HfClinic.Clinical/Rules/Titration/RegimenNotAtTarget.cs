using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// 90 days after the first visit one or more pillars are below target or absent, without a recorded limit or a hold. Source: ACC 2024,
/// titrated to the highest tolerated dose within 3 months when feasible.
/// </summary>
public sealed class RegimenNotAtTarget : TitrationRule
{
    public override string Id => "titration.regimen-not-at-target";

    public override string Title => "Whole regimen not at target";

    public override ImmutableArray<string> SourceKeys { get; } = ["ecdp-2024"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol)
    {
        if (assessment.Phenotype is not { OnHfrefPathway: true })
        {
            return [];
        }

        var limit = protocol["titration.regimen-days"];
        var days = picture.AsOf.DayNumber - picture.EnrolledOn.DayNumber;
        var behind = assessment.Classes
            .Where(reading => TitrationClasses.Pillars.Contains(reading.Class))
            .Where(reading => reading is { IsShort: true, State: not TitrationState.Held })
            .ToList();
        return [!limit.IsMetBy(days) || behind.Count == 0 ? Answer(Outcome.Clear) : Answer(Outcome.Fires) with
        {
            Urgency = Urgency.ThisWeek,
            Statement = $"Not at target {Wording.Days(days)} after the first visit: {Wording.List([.. behind.Select(reading => TitrationClasses.Words(reading.Class))])}",
            Limit = $"{Wording.Days((int)limit.Value)} or more after the first visit",
            Caution = "For the prescriber's decision.",
            Evidence =
            [
                new Evidence("First visit", Wording.Day(picture.EnrolledOn), picture.EnrolledOn, RaisedIt: true),
                .. behind.Select(reading => new Evidence(Wording.Sentence(TitrationClasses.Words(reading.Class)), reading.Sentence)),
            ],
        }];
    }
}
