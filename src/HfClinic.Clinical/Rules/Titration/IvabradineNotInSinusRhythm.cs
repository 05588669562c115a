using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// Ivabradine is taken and the rhythm last found is atrial fibrillation: it acts only in sinus rhythm. Sources: label; ESC 2021, 5.4.3.
/// </summary>
public sealed class IvabradineNotInSinusRhythm : TitrationRule
{
    public override string Id => "titration.ivabradine-rhythm";

    public override string Title => "Ivabradine without sinus rhythm";

    public override ImmutableArray<string> SourceKeys { get; } = ["label-ivabradine", "esc-2021-text"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Where(reading => reading.Class == TitrationClass.Ivabradine).Select(reading =>
            reading.Notes.FirstOrDefault(note => note.Kind == TitrationNoteKind.NotInSinusRhythm) is { } note
                ? Fires(reading, Urgency.ThisWeek, note.Text, "sinus rhythm")
                : Clear(reading));
}
