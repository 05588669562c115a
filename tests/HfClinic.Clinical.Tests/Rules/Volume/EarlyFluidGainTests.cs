using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules.Volume;

/// <summary>A fluid score above 1.75 and not above 2.0: a default of this program, no published source.</summary>
public class EarlyFluidGainTests
{
    private readonly EarlyFluidGain _rule = new();

    private static PatientPicture Gaining => AtHome.Target(-60, 80_000).WeighedDaily(0, [.. About(80_000, 40), 80_400, 80_800, 81_100, 81_200]);

    [Theory]
    [InlineData(-0.001, Outcome.Clear)]
    [InlineData(0, Outcome.Clear)]
    [InlineData(0.001, Outcome.Fires)]
    public void Below_at_and_above(double beyond, Outcome expected)
    {
        var score = Score;
        var protocol = Defaults.With([new("trend.fluid-gain-early", score - (decimal)beyond), new("trend.fluid-gain", 4)]);

        Assert.Equal(expected, _rule.Read(Gaining, protocol).Outcome);
    }

    [Fact]
    public void A_gain_that_is_a_flag_of_its_own_is_not_early()
    {
        Assert.Equal(Outcome.Clear, _rule.Read(Gaining, Protocol(full: Score - 0.01m)).Outcome);
        Assert.Equal(Outcome.Fires, _rule.Read(Gaining, Protocol(full: Score)).Outcome);
        Assert.Equal(Outcome.Clear, _rule.Read(Gaining with { OpenFlagRules = ["volume.fluid-gain"] }, Protocol(full: Score)).Outcome);
    }

    [Fact]
    public void It_is_shown_without_a_task_and_cleared_by_the_data()
    {
        var finding = _rule.Read(Gaining, Protocol(full: 4));
        var raised = Assert.Single(FlagReconciler.Reconcile([], [finding], [_rule], Today)).After;

        Assert.Matches(@"^Early: \d\.\d kg above own baseline over \d days; day-to-day scatter 0\.\d kg$", finding.Statement);
        Assert.Equal(Urgency.ForInformation, raised.Urgency);
        var later = Assert.Single(FlagReconciler.Reconcile([raised with { Id = 1 }], [_rule.Read(AtHome.WeighedDaily(0, About(80_000, 40)))], [_rule], Today));
        Assert.Equal(FlagChangeKind.Clear, later.Kind);
    }

    [Fact]
    public void While_the_trend_learns_it_cannot_tell() => Assert.Equal(Outcome.CannotTell, _rule.Read(AtHome.Weighed(0, 80_000)).Outcome);

    private decimal Score => _rule.Read(Gaining).Magnitude!.Value;

    private ClinicProtocol Protocol(decimal full) => Defaults.With([new("trend.fluid-gain-early", Score - 0.1m), new("trend.fluid-gain", full)]);
}
