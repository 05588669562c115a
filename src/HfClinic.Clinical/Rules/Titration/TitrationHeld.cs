using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// Below target or absent, and one or more listed limits are met: all are told, no gap is counted. Sources: with each limit.
/// </summary>
public sealed class TitrationHeld : TitrationRule
{
    public override string Id => "titration.held";

    public override string Title => "No step expected now";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-supplement", "strong-hf-2022"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Select(reading => reading.State == TitrationState.Held
            ? Fires(reading, Urgency.ForInformation, reading.Sentence, string.Join("; ", reading.Holds.Select(hold => hold.Limit.Length == 0 ? hold.Remark : hold.Limit)))
            : Clear(reading));
}
