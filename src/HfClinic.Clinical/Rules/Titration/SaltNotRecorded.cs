using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// A medicine whose salt or formulation decides is recorded without it: metoprolol, perindopril. Source: ESC 2021, Table 37 names the
/// succinate only.
/// </summary>
public sealed class SaltNotRecorded : TitrationRule
{
    public override string Id => "titration.salt-not-recorded";

    public override string Title => "Salt not recorded";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-text"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Select(reading => reading.Notes.FirstOrDefault(note => note.Kind == TitrationNoteKind.SaltUnknown) is { } note
            ? Fires(reading, Urgency.NextVisit, note.Text, "the salt decides whether it counts and what its target is")
            : Clear(reading));
}
