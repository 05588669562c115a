using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// A beta blocker other than bisoprolol, carvedilol, metoprolol succinate and nebivolol on the HFrEF pathway. Sources: ESC 2021, Table 37
/// (quality indicators); AHA 2022.
/// </summary>
public sealed class BetaBlockerNotEvidenceBased : TitrationRule
{
    public override string Id => "titration.beta-blocker-not-evidence-based";

    public override string Title => "Beta blocker without evidence in HFrEF";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-text", "aha-2022"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Where(reading => reading.Class == TitrationClass.BetaBlocker).Select(reading =>
            reading.Notes.FirstOrDefault(note => note.Kind == TitrationNoteKind.NotEvidenceBased) is { } note
                ? Fires(reading, Urgency.NextVisit, note.Text, "counted: bisoprolol, carvedilol, metoprolol succinate, nebivolol")
                : Clear(reading));
}
