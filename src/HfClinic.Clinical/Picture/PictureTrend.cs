using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Picture;

/// <summary>
/// The weight trend of a picture, computed when first asked for and kept, so that several rules share one computation.
/// A copy of the picture with other weights, targets or days gets its own. Takes no part in the equality of pictures.
/// </summary>
internal sealed class PictureTrend : IEquatable<PictureTrend>
{
    private Computed? last;

    /// <summary>The trend of the picture up to its day.</summary>
    public TrendHistory Of(PatientPicture picture)
    {
        var known = last;
        if (known is null || !known.IsOf(picture))
        {
            last = known = Computed.From(picture);
        }

        return known.History;
    }

    public bool Equals(PictureTrend? other) => other is not null;

    public override bool Equals(object? obj) => Equals(obj as PictureTrend);

    public override int GetHashCode() => 0;

    private sealed record Computed(
        ImmutableArray<WeightReading> Weights, ImmutableArray<TargetWeight> Targets, DateOnly AsOf, DateOnly? Discharged, TrendHistory History)
    {
        public static Computed From(PatientPicture picture)
        {
            var series = DaySeries.From(picture.Weights);
            return new Computed(
                picture.Weights,
                picture.TargetWeights,
                picture.AsOf,
                picture.DischargedFromHospitalOn,
                WeightTrend.Of(series, picture.TargetWeights, Discharge(picture, series), picture.AsOf));
        }

        public bool IsOf(PatientPicture picture) => Weights == picture.Weights && Targets == picture.TargetWeights
            && AsOf == picture.AsOf && Discharged == picture.DischargedFromHospitalOn;

        /// <summary>A discharge is a new baseline: the target of that day, or else the median of the first three weights from it on.</summary>
        private static ImmutableArray<BaselineReset> Discharge(PatientPicture picture, ImmutableArray<DayWeight> series)
        {
            if (picture.DischargedFromHospitalOn is not { } day || day > picture.AsOf)
            {
                return [];
            }

            Weight? target = picture.TargetWeights.LastOrDefault(set => set.From <= day)?.Weight;
            var since = series.Where(weight => weight.Day >= day).ToArray();
            return target is null && since.Length == 0 ? [] : [new BaselineReset(day, WeightTrend.Reference(since, target))];
        }
    }
}
