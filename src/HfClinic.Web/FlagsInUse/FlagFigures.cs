using System.Globalization;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;
using HfClinic.Records.Flags;

namespace HfClinic.Web.FlagsInUse;

/// <summary>The counts in words: how often and how soon, never how right.</summary>
public static class FlagFigures
{
    /// <summary>"12 flags in 706.2 patient-months: 1.7 per 100 patient-months. …".</summary>
    public static string Sentence(Records.Flags.FlagBehaviour seen)
    {
        var raised = seen.Kinds.Sum(kind => kind.Raised);
        var sameDay = seen.Kinds.Sum(kind => kind.AnsweredSameDay);
        var rate = seen.PatientMonths > 0 ? $": {Number(100 * raised / seen.PatientMonths)} per 100 patient-months" : "";
        var answered = raised > 0 ? $" {sameDay} of them ({Share((decimal)sameDay / raised)}) {(sameDay == 1 ? "was" : "were")} answered on the day of raising." : "";
        return $"{Wording.Count(raised, "flag was", "flags were")} raised in {Number(seen.PatientMonths)} patient-months{rate}.{answered}";
    }

    /// <summary>"6 of 21304 weights, 0.03 %, were held at entry to be checked.".</summary>
    public static string Held(Records.Flags.FlagBehaviour seen) => seen.ShareHeld is { } share
        ? $"{Count(seen.HeldWeights)} of {Count(seen.Weights)} weights, {Share(share)}, were held at entry until a person decided."
        : "No weight was recorded in this period, so there is no share of held readings.";

    /// <summary>Names of the kinds that this rule book reads and that were not raised; empty when all were.</summary>
    public static string NotRaised(Records.Flags.FlagBehaviour seen) => Wording.List(
        [.. RuleBook.All.Where(rule => !seen.Kinds.Any(kind => kind.RuleId == rule.Id)).Select(rule => rule.Title.ToLowerInvariant())]);

    /// <summary>"4.3", "12.0": one decimal.</summary>
    public static string Number(decimal? number) => number is { } known ? known.ToString("0.0", CultureInfo.InvariantCulture) : Wording.Nothing;

    /// <summary>"62 %"; below half of one with two decimals, so that few are not shown as none.</summary>
    public static string Share(decimal? share) => share is not { } known ? Wording.Nothing
        : (100 * known).ToString(known is > 0 and < 0.005m ? "0.##" : "0", CultureInfo.InvariantCulture) + " %";

    /// <summary>Raised and neither answered nor cleared.</summary>
    public static int Waiting(FlagKind kind) => kind.Raised - kind.AnsweredSameDay - kind.AnsweredLater - kind.ClearedByData;

    private static string Count(int count) => count.ToString("#,0", Thousands);

    private static readonly NumberFormatInfo Thousands = new() { NumberGroupSeparator = "\u00a0" };
}
