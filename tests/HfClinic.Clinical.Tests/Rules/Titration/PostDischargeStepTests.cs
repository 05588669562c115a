using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>STRONG-HF as told in ESC 2023: up to 42 days after the discharge, visits in weeks 1, 2, 3 and 6.</summary>
public class PostDischargeStepTests
{
    private readonly PostDischargeStep _rule = new();

    private static readonly ClinicProtocol On = Defaults.With([new("titration.after-discharge.days", IsOn: true)]);

    [Theory]
    [InlineData(-41, true)]
    [InlineData(-42, true)]
    [InlineData(-43, false)]
    public void Below_at_and_above(int discharged, bool fires) => Assert.Equal(
        fires, _rule.Assess(Short with { DischargedFromHospitalOn = Today.AddDays(discharged) }, On).Any(finding => finding.Outcome == Outcome.Fires));

    [Fact]
    public void It_is_off_unless_switched_on() =>
        Assert.Empty(_rule.Assess(Short with { DischargedFromHospitalOn = Today.AddDays(-8) }, Defaults));

    [Theory]
    [InlineData(6, TitrationState.NotYetDue)]
    [InlineData(7, TitrationState.Due)]
    [InlineData(8, TitrationState.Due)]
    public void Half_of_target_is_looked_for_after_a_week(int day, TitrationState state) => Assert.Equal(
        state, (Short with { DischargedFromHospitalOn = Today.AddDays(-day) }).StateOf(TitrationClass.BetaBlocker, On));

    [Theory]
    [InlineData(94, TitrationState.Held)]
    [InlineData(95, TitrationState.Due)]
    [InlineData(96, TitrationState.Due)]
    public void Systolic_pressure_is_a_safety_indicator(int systolic, TitrationState state) => Assert.Equal(state,
        (Short.NoVitals().Rate(0, 70).Systolic(0, systolic) with { DischargedFromHospitalOn = Today.AddDays(-8) }).StateOf(TitrationClass.RasInhibitor, On));

    [Theory]
    [InlineData(1099, TitrationState.Due)]
    [InlineData(1100, TitrationState.Due)]
    [InlineData(1101, TitrationState.Held)]
    public void NT_proBNP_is_a_safety_indicator(decimal peptide, TitrationState state) => Assert.Equal(state,
        (Short.Blood("nt-probnp", -8, 1000).Blood("nt-probnp", 0, peptide) with { DischargedFromHospitalOn = Today.AddDays(-8) })
            .StateOf(TitrationClass.RasInhibitor, On));
}
