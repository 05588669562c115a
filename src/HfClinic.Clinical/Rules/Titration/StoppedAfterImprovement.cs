using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// A pillar of HFrEF therapy was stopped after the ejection fraction had risen above 40 %, and no reason is on record. Sources: ESC 2021 and
/// AHA 2022 continue the therapy of HFrEF in HFimpEF.
/// </summary>
public sealed class StoppedAfterImprovement : TitrationRule
{
    public override string Id => "titration.stopped-after-improvement";

    public override string Title => "Stopped after improvement";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-text", "aha-2022"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Where(reading => reading.Taken is null).Select(reading =>
            reading.IsShort && reading.Notes.FirstOrDefault(note => note.Kind == TitrationNoteKind.StoppedAfterImprovement) is { } note
                ? Fires(reading, Urgency.ThisWeek, note.Text, "HFrEF therapy is continued after improvement")
                : Clear(reading));
}
