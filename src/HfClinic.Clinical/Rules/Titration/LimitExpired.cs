using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// The reason a prescriber recorded for stopping short of target has stood for more than 180 days, or past its own date, and the dose is
/// still short. Source: ESC 2021, 9.5.1, follow-up at most 6 months apart.
/// </summary>
public sealed class LimitExpired : TitrationRule
{
    public override string Id => "titration.limit-expired";

    public override string Title => "Recorded limit has run out";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-text"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Select(reading => reading.IsShort && RecordedLimits.Expired(reading.Class, picture, protocol) is { } limit
            ? Fires(
                reading,
                Urgency.NextVisit,
                $"{TitrationClasses.Words(reading.Class)}: limit recorded by {limit.By} on {Wording.Day(limit.On)} ({limit.Reason}) stood until {Wording.Day(RecordedLimits.LastDay(limit, protocol))}",
                $"a recorded limit stands until {Wording.Day(RecordedLimits.LastDay(limit, protocol))}")
            : Clear(reading));
}
