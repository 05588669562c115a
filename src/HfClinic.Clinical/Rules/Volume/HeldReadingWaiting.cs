using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// A weight that does not fit is set aside until a person decides. Were it right (its likely slip undone, where there is one
/// way to undo it), the plain gain limits are read for it all the same, so that a true jump does not vanish as an error;
/// such a possible gain that has waited 24 hours is for today. Source: a default of this program.
/// </summary>
public sealed class HeldReadingWaiting : VolumeRule
{
    public override string Id => "volume.held-reading";

    public override string Title => "Reading waits to be checked";

    public override ImmutableArray<string> SourceKeys { get; } = ["clinic-default"];

    public override bool Latches => false;

    public override int JoinDays => 1;

    public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        if (!HasWeights(picture))
        {
            return [];
        }

        var held = picture.Weights.Where(reading => reading.Held is not null).ToList();
        return held.Count == 0 ? [Answer(Outcome.Clear)] : [Describe(held, picture, protocol)];
    }

    private Finding Describe(List<WeightReading> held, PatientPicture picture, ClinicProtocol protocol)
    {
        var summary = WeightSummary.Of(picture);
        var likely = held
            .Select(reading => PossibleGain.Of(reading, HeldWords.Mended(reading) ?? reading.Weight, summary, protocol))
            .MaxBy(gain => gain?.Grams);
        var main = likely?.Held ?? held[^1];
        return Answer(Outcome.Fires) with
        {
            Urgency = likely is not null && HasWaited(main, picture, protocol) ? Urgency.Today : Urgency.ThisWeek,
            Statement = Statement(main, likely, summary, protocol) + Others(held.Count),
            Limit = likely is null ? "a reading that does not fit waits for a person" : likely.Rule.LimitWords(protocol),
            Magnitude = likely?.Grams,
            Evidence = [.. Compared(likely, protocol), .. held.SelectMany(reading => Readings(reading, reading == main, protocol))],
        };
    }

    private static string Statement(WeightReading main, PossibleGain? likely, WeightSummary summary, ClinicProtocol protocol)
    {
        var words = HeldWords.Describe(main, protocol.WeightUnit);
        if (likely is null)
        {
            var asRecorded = PossibleGain.Of(main, main.Weight, summary, protocol);
            return $"Reading to check: {words}" + (asRecorded is null ? "" : "; possible gain, unconfirmed");
        }

        var limit = new Weight((int)protocol[likely.Rule.ThresholdKey].Value);
        return $"Possible gain of {Wording.SizeBeside(likely.Change.Difference, limit, protocol.WeightUnit)}, unconfirmed: {words}";
    }

    private static string Others(int count) => count == 1 ? "" : $"; {count} readings to check";

    private static IEnumerable<Evidence> Compared(PossibleGain? likely, ClinicProtocol protocol) =>
        likely is null ? [] : [likely.Rule.ReferenceOf(likely.Change, protocol)];

    private static IEnumerable<Evidence> Readings(WeightReading reading, bool isMain, ClinicProtocol protocol)
    {
        var unit = protocol.WeightUnit;
        yield return new Evidence("Set aside", HeldWords.Describe(reading, unit), reading.Day, reading.Id, isMain);
        if (HeldWords.Mended(reading) is { } mended)
        {
            yield return new Evidence("Would then be", Wording.Weight(mended, unit), reading.Day, reading.Id);
        }
    }

    /// <summary>The picture stands for the end of its clinic day.</summary>
    private static bool HasWaited(WeightReading main, PatientPicture picture, ClinicProtocol protocol)
    {
        var waited = picture.AsOf.AddDays(1).ToDateTime(TimeOnly.MinValue) - main.Held!.HeldSince;
        return protocol["held.worklist-hours"].IsMetBy((decimal)waited.TotalHours);
    }
}
