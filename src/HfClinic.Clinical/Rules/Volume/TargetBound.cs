using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>A distance from the target weight, given as a mass and as a share of the target.</summary>
internal static class TargetBound
{
    /// <summary>The larger of the two in grams; the one in use when the other is switched off.</summary>
    /// <param name="mass">In grams.</param>
    /// <param name="percent">In percent of the target.</param>
    public static Threshold Larger(Threshold mass, Threshold percent, Weight target)
    {
        var share = percent with { Value = percent.Value * target.Grams / 100 };
        return !percent.IsOn || (mass.IsOn && mass.Value >= share.Value) ? mass : share;
    }
}
