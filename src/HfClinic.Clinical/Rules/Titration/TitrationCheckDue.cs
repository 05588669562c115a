using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// Due, and a pressure, heart rate, weight or blood test that must be looked at first is missing or too old. Source: a default of this
/// program.
/// </summary>
public sealed class TitrationCheckDue : TitrationRule
{
    public override string Id => "titration.check-due";

    public override string Title => "Check due before a step";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Select(reading => reading.State == TitrationState.CheckDue
            ? Fires(reading, Urgency.NextVisit, reading.Sentence, $"needed: {Wording.List(reading.Missing)}")
            : Clear(reading));
}
