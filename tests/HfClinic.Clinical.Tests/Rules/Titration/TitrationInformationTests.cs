using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Carvedilol above 85 kg: ESC 2021, Table 8, footnote e; spironolactone 25 mg and the other profile: with each figure.</summary>
public class TitrationInformationTests
{
    private readonly TitrationInformation _rule = new();

    [Theory]
    [InlineData(84_999, Outcome.Clear)]
    [InlineData(85_000, Outcome.Clear)]
    [InlineData(85_001, Outcome.Fires)]
    public void Below_at_and_above(int grams, Outcome expected) => Assert.Equal(
        expected, _rule.About((Well(30) with { Weights = [] }).Weighed(0, grams).On("carvedilol", 25, 2, -60), TitrationClass.BetaBlocker).Outcome);

    [Theory]
    [InlineData("quinapril", 20, 2, "target of the AHA profile: the ESC table has no row for quinapril")]
    [InlineData("telmisartan", 40, 1, "telmisartan: an ARB without evidence in HFrEF")]
    public void What_is_worth_knowing(string medicine, decimal milligrams, decimal times, string words) => Assert.Contains(
        words, _rule.About(Well(30).On(medicine, milligrams, times, -60), TitrationClass.RasInhibitor).Statement);

    [Fact]
    public void Nebivolol_in_the_AHA_profile() => Assert.Contains(
        "nebivolol: not among the beta blockers this profile names for HFrEF",
        _rule.About(Well(30).On("nebivolol", 10, 1, -60), TitrationClass.BetaBlocker, Aha).Statement);

    [Fact]
    public void In_HFmrEF_a_dose_below_target_is_information() => Assert.Contains(
        "may be considered in HFmrEF (class IIb or 2b)",
        _rule.About(Well(45).On("bisoprolol", 2.5m, 1, -60), TitrationClass.BetaBlocker).Statement);
}
