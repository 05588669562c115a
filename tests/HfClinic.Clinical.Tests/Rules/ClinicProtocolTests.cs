using HfClinic.Clinical.Rules;

namespace HfClinic.Clinical.Tests.Rules;

public class ClinicProtocolTests
{
    private const string Gain = "weight.gain-3-days";

    private readonly ClinicProtocol _defaults = ProtocolDefaults.Load();

    [Fact]
    public void An_override_changes_the_value_and_nothing_else()
    {
        var changed = _defaults.With([new(Gain, Value: 1500)]);

        Assert.Equal(_defaults[Gain] with { Value = 1500 }, changed[Gain]);
        Assert.Equal(_defaults["silence.days"], changed["silence.days"]);
        Assert.Equal(2000, _defaults[Gain].Value);
    }

    [Fact]
    public void An_override_switches_a_threshold_on() =>
        Assert.True(_defaults.With([new("weight.gain-1-day-2lb", IsOn: true)])["weight.gain-1-day-2lb"].IsMetBy(907));

    [Fact]
    public void A_threshold_that_is_off_is_never_met() =>
        Assert.False(_defaults.With([new(Gain, IsOn: false)])[Gain].IsMetBy(9000));

    [Fact]
    public void The_later_of_two_overrides_wins() =>
        Assert.Equal(1800, _defaults.With([new(Gain, 1500), new(Gain, 1800)])[Gain].Value);

    [Theory]
    [InlineData(500, true)]
    [InlineData(499.9, false)]
    [InlineData(5000, true)]
    [InlineData(5000.1, false)]
    public void A_value_outside_the_safe_range_is_refused(decimal value, bool accepted)
    {
        var change = new ThresholdOverride(Gain, value);

        Assert.Equal(accepted, _defaults.WhyRefused(change) is null);
        if (!accepted)
        {
            Assert.Contains("is outside 500 to 5000 g", Assert.Throws<ArgumentException>(() => _defaults.With([change])).Message);
        }
    }

    [Fact]
    public void An_unknown_threshold_is_refused() =>
        Assert.Contains("no threshold 'weight.y'", Assert.Throws<ArgumentException>(() => _defaults.With([new("weight.y", 1)])).Message);

    [Theory]
    [InlineData(Comparison.Above, false, false, true)]
    [InlineData(Comparison.AtLeast, false, true, true)]
    [InlineData(Comparison.Below, true, false, false)]
    [InlineData(Comparison.AtMost, true, true, false)]
    public void Each_comparison_at_its_limit(Comparison comparison, bool below, bool at, bool above)
    {
        var threshold = _defaults[Gain] with { Comparison = comparison };

        Assert.Equal((below, at, above), (threshold.IsMetBy(1999), threshold.IsMetBy(2000), threshold.IsMetBy(2001)));
    }
}
