using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Weights;

/// <summary>The plain figures of a patient's weights: the latest, how long ago, and how it changed.</summary>
/// <remarks>
/// A change over d days compares a day with the lowest (gain) or highest (loss) weight of the day series on the d days
/// before it. Days without a weight are passed over; when none of the d days has one, there is no figure. Both may be
/// negative: a gain of −1.7 kg over 3 days means that even the lowest of those days was higher.
/// </remarks>
public sealed class WeightSummary
{
    private readonly ImmutableArray<WeightReading> _series;

    private WeightSummary(ImmutableArray<WeightReading> series, DateOnly asOf)
    {
        _series = series;
        Latest = series.LastOrDefault();
        SilentDays = Latest is null ? null : asOf.DayNumber - Latest.Day.DayNumber;
    }

    /// <summary>The reading that stands for the latest day that has an accepted one.</summary>
    public WeightReading? Latest { get; }

    /// <summary>Days since that day: 0 when it is the clinic day itself. Null without any weight.</summary>
    public int? SilentDays { get; }

    /// <summary>Sums up the accepted weights of the picture.</summary>
    public static WeightSummary Of(PatientPicture picture) => new(DaySeries.ReadingsOf(picture.Weights), picture.AsOf);

    /// <summary>The latest weight against the lowest of the days before.</summary>
    public WeightChange? Gain(int days) => Latest is null ? null : GainUpTo(Latest, days);

    /// <summary>The latest weight against the highest of the days before.</summary>
    public WeightChange? Loss(int days) =>
        Latest is not null && LatestFirstBefore(Latest, days).MaxBy(earlier => earlier.Weight) is { } highest
            ? new WeightChange(days, Latest, highest)
            : null;

    /// <summary>Any reading, also a held one, against the lowest accepted weight of the days before it.</summary>
    public WeightChange? GainUpTo(WeightReading reading, int days) =>
        LatestFirstBefore(reading, days).MinBy(earlier => earlier.Weight) is { } lowest
            ? new WeightChange(days, reading, lowest)
            : null;

    private IEnumerable<WeightReading> LatestFirstBefore(WeightReading reading, int days) =>
        _series.Reverse().Where(earlier => earlier.Day < reading.Day && earlier.Day >= reading.Day.AddDays(-days));
}
