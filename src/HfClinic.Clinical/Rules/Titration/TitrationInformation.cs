using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// What is worth knowing about a dose without being a gap: a higher dose allowed by weight, a target taken from the other profile, a class that
/// may be considered. Sources: with each remark.
/// </summary>
public sealed class TitrationInformation : TitrationRule
{
    public override string Id => "titration.information";

    public override string Title => "About the dose";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-table-8", "aha-2022-table-14"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Select(reading => reading.Notes.Where(note => note.Kind == TitrationNoteKind.Information).ToList() is { Count: > 0 } notes
            ? Fires(reading, Urgency.ForInformation, string.Join("; ", notes.Select(note => note.Text)), "information only") with
            {
                SourceKeys = [.. notes.SelectMany(note => note.SourceKeys).Distinct()],
            }
            : Clear(reading));
}
