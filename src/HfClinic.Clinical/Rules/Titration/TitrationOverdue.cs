using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// A dose below target unchanged for 42 days (MRA and finerenone 84), or a pillar absent for 42 days, counted anew when a hold has cleared.
/// Sources: three months to target, ACC 2024; the days are a default of this program.
/// </summary>
public sealed class TitrationOverdue : TitrationRule
{
    public override string Id => "titration.overdue";

    public override string Title => "Titration overdue";

    public override ImmutableArray<string> SourceKeys { get; } = ["ecdp-2024", "clinic-default"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Select(reading => GapAnswer(
            reading, reading.IsOverdue && !reading.Has(TitrationNoteKind.StoppedAfterImprovement), Urgency.ThisWeek));
}
