using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// On the post-discharge track, while one of beta blocker, RAS inhibitor and MRA is short of target: where it stands, which safety indicators
/// delay a step, and when the next visit of the scheme is due. Off unless switched on. Source: STRONG-HF as told in ESC 2023.
/// </summary>
public sealed class PostDischargeStep : TitrationRule
{
    public override string Id => "titration.after-discharge";

    public override string Title => "Post-discharge track";

    public override ImmutableArray<string> SourceKeys { get; } = ["strong-hf-2022", "esc-2023-update"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol)
    {
        if (assessment.Track is not { } track)
        {
            return [];
        }

        var behind = assessment.Classes.Where(reading => PostDischargeTrack.Covers(reading.Class) && reading.IsShort).ToList();
        if (behind.Count == 0)
        {
            return [Answer(Outcome.Clear)];
        }

        var indicators = track.SafetyIndicators;
        var held = indicators.IsEmpty ? "" : $"; held: {string.Join("; ", indicators.Select(indicator => indicator.Sentence))}";
        var visit = track.NextVisit is { } next ? $"; visit of week {next.Week} due {Wording.Day(next.On)}" : "";
        return [Answer(Outcome.Fires) with
        {
            Urgency = Urgency.NextVisit,
            Statement = $"Day {track.Day} after discharge, short of target: {Wording.List([.. behind.Select(reading => TitrationClasses.Words(reading.Class))])}{held}{visit}",
            Limit = "full target by the end of week 2, visits in weeks 1, 2, 3 and 6",
            Caution = "For the prescriber's decision.",
            Evidence =
            [
                new Evidence("Discharged", Wording.Day(track.DischargedOn), track.DischargedOn, RaisedIt: true),
                .. indicators.Select(indicator => new Evidence("Safety indicator", indicator.Words, indicator.Day, indicator.ReadingId)),
            ],
        }];
    }
}
