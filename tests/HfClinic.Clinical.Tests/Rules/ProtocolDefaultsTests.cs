using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Rules;

public class ProtocolDefaultsTests
{
    private const string Good =
        """{"key":"weight.x","title":"X","value":2000,"unit":"g","comparison":"above","isOn":true,"lowest":500,"highest":5000,"sourceKeys":["clinic-default"],"standing":"clinic-default"}""";

    private readonly ClinicProtocol _defaults = ProtocolDefaults.Load();

    /// <summary>
    /// 2 kg in 3 days: ESC self-care advice, quoted by Gudmundsson 2019. 5 lb in 7 days, 3 lb and 2 lb in 1 day: US and NHS
    /// patient leaflets. Creatinine +26.5 µmol/L in 48 hours or 1.5 times in 7 days: KDIGO 2012, from memory. 5 % lost in
    /// 6 months: an article for patients. All others are clinic defaults without a published figure.
    /// </summary>
    [Theory]
    [InlineData("weight.gain-3-days", 2000, "g", Comparison.Above, true)]
    [InlineData("weight.gain-7-days", 2268, "g", Comparison.AtLeast, true)]
    [InlineData("weight.gain-1-day-3lb", 1361, "g", Comparison.AtLeast, false)]
    [InlineData("weight.gain-1-day-2lb", 907, "g", Comparison.AtLeast, false)]
    [InlineData("weight.loss-7-days", 2268, "g", Comparison.AtLeast, true)]
    [InlineData("weight.above-target-kg", 2000, "g", Comparison.Above, true)]
    [InlineData("weight.above-target-percent", 2.5, "%", Comparison.Above, true)]
    [InlineData("target.age-days", 90, "days", Comparison.Above, true)]
    [InlineData("target.age-after-discharge-days", 30, "days", Comparison.Above, true)]
    [InlineData("silence.days", 5, "days", Comparison.AtLeast, true)]
    [InlineData("silence.days-close-watch", 3, "days", Comparison.AtLeast, true)]
    [InlineData("silence.after-discharge-days", 30, "days", Comparison.AtMost, true)]
    [InlineData("silence.after-diuretic-change-days", 14, "days", Comparison.AtMost, true)]
    [InlineData("held.worklist-hours", 24, "hours", Comparison.AtLeast, true)]
    [InlineData("symptoms.days", 3, "days", Comparison.AtMost, true)]
    [InlineData("pressure.low-systolic", 90, "mmHg", Comparison.Below, true)]
    [InlineData("trend.fluid-gain", 2.0, "sd", Comparison.Above, true)]
    [InlineData("trend.fluid-gain-early", 1.75, "sd", Comparison.Above, true)]
    [InlineData("trend.fluid-loss", 2.0, "sd", Comparison.Above, true)]
    [InlineData("trend.off-target-kg", 2000, "g", Comparison.Above, true)]
    [InlineData("trend.off-target-percent", 2.5, "%", Comparison.Above, true)]
    [InlineData("trend.off-target-margin", 1000, "g", Comparison.Above, true)]
    [InlineData("trend.off-target-certainty", 1.645, "sd", Comparison.Above, true)]
    [InlineData("trend.last-weight-days", 7, "days", Comparison.AtMost, true)]
    [InlineData("target.stale-percent", 2, "%", Comparison.Above, true)]
    [InlineData("target.stale-slope", 30, "g/day", Comparison.Below, true)]
    [InlineData("loss.systolic-fall", 20, "mmHg", Comparison.AtLeast, true)]
    [InlineData("loss.systolic-fall-below", 100, "mmHg", Comparison.Below, true)]
    [InlineData("loss.creatinine-48-hours", 26.5, "µmol/L", Comparison.AtLeast, true)]
    [InlineData("loss.creatinine-7-days", 50, "%", Comparison.AtLeast, true)]
    [InlineData("loss.creatinine-baseline", 30, "%", Comparison.AtLeast, true)]
    [InlineData("loss.sodium-low", 135, "mmol/L", Comparison.Below, true)]
    [InlineData("loss.sodium-high", 145, "mmol/L", Comparison.Above, true)]
    [InlineData("loss.potassium-low", 3.5, "mmol/L", Comparison.Below, true)]
    [InlineData("loss.potassium-high", 5.5, "mmol/L", Comparison.Above, true)]
    [InlineData("loss.blood-test-days", 14, "days", Comparison.AtMost, true)]
    [InlineData("wasting.loss-percent", 5, "%", Comparison.AtLeast, true)]
    [InlineData("wasting.appetite-days", 60, "days", Comparison.AtMost, true)]
    public void The_clinic_starts_with(string key, decimal value, string unit, Comparison comparison, bool isOn)
    {
        var threshold = _defaults[key];

        Assert.Equal((value, unit, comparison, isOn), (threshold.Value, threshold.Unit, threshold.Comparison, threshold.IsOn));
    }

    [Fact]
    public void It_is_version_0_of_the_ESC_profile() => Assert.Equal((0, "ESC"), (_defaults.Version, _defaults.Profile));

    [Theory]
    [InlineData("\"title\":\"X\"", "\"title\":\"X\",\"colour\":\"red\"", "colour")]
    [InlineData("\"title\":\"X\"", "\"title\":\"\"", "the title is blank")]
    [InlineData("\"value\":2000", "\"value\":499", "X: 499 g is outside 500 to 5000 g")]
    [InlineData("\"value\":2000", "\"value\":5001", "X: 5001 g is outside 500 to 5000 g")]
    [InlineData("\"unit\":\"g\"", "\"unit\":\"stone\"", "the unit 'stone' is not known")]
    [InlineData("[\"clinic-default\"]", "[]", "no source is named")]
    [InlineData("[\"clinic-default\"]", "[\"hearsay\"]", "the source 'hearsay' is not in the source table")]
    [InlineData("\"sourceKeys\":[\"clinic-default\"],", "", "sourceKeys")]
    [InlineData("\"comparison\":\"above\"", "\"comparison\":\"over\"", "comparison")]
    public void A_faulty_row_is_refused_with_file_row_and_reason(string part, string instead, string reason)
    {
        var json = $"[{Good.Replace("weight.x", "weight.first")},{Good.Replace(part, instead)}]";

        var fault = Assert.Throws<TableFaultException>(() => ProtocolDefaults.Parse(json, SourceTable.Load()));

        Assert.StartsWith("protocol.json, row 2: ", fault.Message);
        Assert.Contains(reason, fault.Message);
    }

    [Fact]
    public void A_repeated_key_is_refused() =>
        Assert.Equal("protocol.json, row 2: the key 'weight.x' is there twice",
            Assert.Throws<TableFaultException>(() => ProtocolDefaults.Parse($"[{Good},{Good}]", SourceTable.Load())).Message);
}
