using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// No medicine that counts of one of the four pillars, 14 days after the first visit or after it was stopped, and nothing in the record
/// argues against asking. Sources: ESC 2021 and 2023, AHA 2022; the days are a default of this program.
/// </summary>
public sealed class PillarNotCovered : TitrationRule
{
    public override string Id => "titration.pillar-not-covered";

    public override string Title => "Pillar not covered";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-text", "esc-2023-update", "aha-2022", "clinic-default"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Where(reading => reading.Taken is null).Select(reading => GapAnswer(
            reading,
            reading is { State: TitrationState.NotCovered, IsOverdue: false } && !reading.Has(TitrationNoteKind.StoppedAfterImprovement),
            Urgency.NextVisit));
}
