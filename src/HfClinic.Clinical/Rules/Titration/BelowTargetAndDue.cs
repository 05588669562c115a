using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// A dose below target, unchanged for 28 days (MRA 56, finerenone 42), and nothing in the record argues against asking. Sources: the target
/// doses of ESC 2021 and AHA 2022; the days are a default of this program.
/// </summary>
public sealed class BelowTargetAndDue : TitrationRule
{
    public override string Id => "titration.below-target";

    public override string Title => "Below target";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-table-8", "aha-2022-table-14", "clinic-default"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Where(reading => reading.Taken is not null).Select(reading => GapAnswer(
            reading, reading is { State: TitrationState.Due, IsOverdue: false }, Urgency.NextVisit));
}
