using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// The trend against the target weight, in one direction: further than the larger of 2 kg and 2.5 % of the target, and by
/// 1 kg or more with one-sided 95 % certainty (1.645 standard errors). Source: a default of this program, for the clinic to
/// sign off.
/// </summary>
/// <param name="Target">The target that holds.</param>
/// <param name="Kilograms">How far the trend stands off it, positive in the direction that is looked at.</param>
/// <param name="Band">Half the width of its 95 % interval in kg.</param>
/// <param name="Limit">The limit in grams.</param>
/// <param name="IsBeyond">Whether both conditions hold.</param>
internal sealed record TrendOffTarget(TargetWeight Target, double Kilograms, double Band, Threshold Limit, bool IsBeyond)
{
    /// <summary>Whether the clinic uses it.</summary>
    public static bool IsOn(ClinicProtocol protocol) =>
        protocol["trend.off-target-certainty"].IsOn && (protocol["trend.off-target-kg"].IsOn || protocol["trend.off-target-percent"].IsOn);

    /// <summary>The distance above (+1) or below (−1) the target; null without a target or when switched off.</summary>
    public static TrendOffTarget? Of(TrendLook look, int direction, ClinicProtocol protocol)
    {
        if (!IsOn(protocol) || look.Picture.TargetWeight is not { } target || look.Excess is not { } excess)
        {
            return null;
        }

        var off = direction * excess;
        var limit = TargetBound.Larger(protocol["trend.off-target-kg"], protocol["trend.off-target-percent"], target.Weight);
        var certainty = (off - ((double)protocol["trend.off-target-margin"].Value / 1000)) / look.Day.ExcessError;
        var beyond = limit.IsMetBy((decimal)off * 1000) && protocol["trend.off-target-certainty"].IsMetBy((decimal)certainty);
        return new TrendOffTarget(target, off, look.Day.Band, limit, beyond);
    }

    /// <summary>"3.4 kg above target with the scatter taken out (2.6 to 4.2 kg)".</summary>
    public string Words(string side, ClinicProtocol protocol)
    {
        var unit = protocol.WeightUnit;
        var low = Wording.WeightNumber(TrendLook.Grams(Kilograms - Band), unit);
        var high = Wording.Weight(TrendLook.Grams(Kilograms + Band), unit);
        return $"{TrendLook.Size(Kilograms, protocol)} {side} target with the scatter taken out ({low} to {high})";
    }

    /// <summary>"more than 2.0 kg, and more than 1.0 kg for certain".</summary>
    public string LimitWords(ClinicProtocol protocol)
    {
        var sure = protocol["trend.off-target-margin"].Value;
        var unit = protocol.WeightUnit;
        return string.Create(
            CultureInfo.InvariantCulture,
            $"more than {Wording.Limit(new Weight((int)Limit.Value), unit)}, and {Wording.Limit(new Weight((int)sure), unit)} or more beyond doubt");
    }

    public Evidence Evidence(ClinicProtocol protocol) =>
        new("Target weight", Wording.Weight(Target.Weight, protocol.WeightUnit), Target.From);
}
