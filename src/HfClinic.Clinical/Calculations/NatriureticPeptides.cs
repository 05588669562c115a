using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>Where a natriuretic peptide lies between the published limits.</summary>
public enum PeptideBand
{
    BelowRuleOut,
    BetweenLimits,
    AboveRuleIn,
}

/// <summary>
/// Natriuretic peptides against the limits of a table after ESC and HFA (seen second-hand). All comparisons are strict; ages 50
/// and 75 belong to the middle band, as papers write "50-75".
/// </summary>
public static class NatriureticPeptides
{
    private const string Cautions = "Atrial fibrillation and eGFR below 60 raise the level; obesity lowers it (limits lowered by up to 50 %).";

    private static readonly Formula AcuteNtProBnpFormula = new(
        "NT-proBNP, acute setting", "", 0, "below 300 pg/mL below rule-out; above 450 (under 50 years), 900 (50 to 75), 1800 (over 75) above rule-in", ["esc-hfa-natriuretic-peptides"])
    {
        Caution = Cautions,
    };

    private static readonly Formula AcuteBnpFormula = new(
        "BNP, acute setting", "", 0, "below 100 pg/mL below rule-out; above 400 above rule-in", ["esc-hfa-natriuretic-peptides"])
    {
        Caution = Cautions + " Sacubitril raises BNP: NT-proBNP is read instead (from memory).",
    };

    private static readonly Formula NtProBnpFormula = new(
        "NT-proBNP, not acute", "", 0, "below 125 pg/mL below rule-out", ["esc-hfa-natriuretic-peptides"])
    {
        Caution = Cautions,
    };

    private static readonly Formula BnpFormula = new("BNP, not acute", "", 0, "below 35 pg/mL below rule-out", ["esc-hfa-natriuretic-peptides"])
    {
        Caution = AcuteBnpFormula.Caution,
    };

    private static readonly Quantity<NtProBnp> NtProBnpLevel = new("NT-proBNP", "pg/mL", 5, 100_000, level => (double)level.PgPerMl);
    private static readonly Quantity<Bnp> BnpLevel = new("BNP", "pg/mL", 1, 20_000, level => (double)level.PgPerMl);

    /// <summary>In the acute setting. Level 5 to 100,000 pg/mL, age 18 to 110.</summary>
    public static Computed<PeptideBand> Acute(Given<NtProBnp> level, Given<int> ageYears)
    {
        var (taken, age) = (NtProBnpLevel.Take(level), Accepted.AdultAge.Take(ageYears));
        return AcuteNtProBnpFormula.Compute([taken, age], () => Between(taken.Number, 300, RuleIn(age.Value)), Words);
    }

    /// <summary>In the acute setting. Level 1 to 20,000 pg/mL.</summary>
    public static Computed<PeptideBand> Acute(Given<Bnp> level)
    {
        var taken = BnpLevel.Take(level);
        return AcuteBnpFormula.Compute([taken], () => Between(taken.Number, 100, 400), Words);
    }

    /// <summary>Outside the acute setting; there is no rule-in limit.</summary>
    public static Computed<PeptideBand> NotAcute(Given<NtProBnp> level)
    {
        var taken = NtProBnpLevel.Take(level);
        return NtProBnpFormula.Compute([taken], () => Between(taken.Number, 125, double.PositiveInfinity), NotAcuteWords);
    }

    /// <summary>Outside the acute setting; there is no rule-in limit.</summary>
    public static Computed<PeptideBand> NotAcute(Given<Bnp> level)
    {
        var taken = BnpLevel.Take(level);
        return BnpFormula.Compute([taken], () => Between(taken.Number, 35, double.PositiveInfinity), NotAcuteWords);
    }

    private static double RuleIn(int age) => age < 50 ? 450 : age <= 75 ? 900 : 1800;

    private static PeptideBand Between(double level, double ruleOut, double ruleIn) =>
        level < ruleOut ? PeptideBand.BelowRuleOut : level > ruleIn ? PeptideBand.AboveRuleIn : PeptideBand.BetweenLimits;

    private static string Words(PeptideBand band) => band switch
    {
        PeptideBand.BelowRuleOut => "below the rule-out limit",
        PeptideBand.AboveRuleIn => "above the rule-in limit",
        _ => "between the rule-out and the rule-in limit",
    };

    private static string NotAcuteWords(PeptideBand band) =>
        band == PeptideBand.BelowRuleOut ? "below the rule-out limit" : "at or above the rule-out limit";
}
