using System.Collections.Immutable;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Rules;

public class RuleBookTests
{
    [Fact]
    public void A_rule_that_fails_says_so_and_the_others_still_run()
    {
        var picture = AtHome.Weighed(-3, 80_000).Weighed(0, 83_000);

        var findings = RuleBook.Assess([new Failing(), new GainInThreeDays()], picture, Defaults);

        Assert.Equal([Outcome.CouldNotBeChecked, Outcome.Fires], findings.Select(finding => finding.Outcome));
        Assert.Equal(("Failing could not be checked", "DivideByZeroException: by nothing"), (findings[0].Statement, findings[0].Missing));
    }

    [Fact]
    public void A_rule_that_answers_twice_for_one_subject_could_not_be_checked() =>
        Assert.Equal("it answered twice for ''", Assert.Single(RuleBook.Assess([new Twice()], AtHome, Defaults)).Missing);

    [Fact]
    public void The_sparsest_picture_can_be_read_by_every_rule() =>
        Assert.DoesNotContain(RuleBook.Assess(AtHome, Defaults), finding => finding.Outcome == Outcome.CouldNotBeChecked);

    [Fact]
    public void Every_finding_that_fires_states_what_was_seen_its_limit_and_the_very_value()
    {
        var picture = AtHome.Target(-100, 70_000).Weighed(-7, 85_000).Weighed(-3, 71_000).Weighed(0, 74_000)
            .Weighed(0, 163_000, HoldReason.PoundsTakenAsKilograms).Told(0, (Symptoms)0x3FFF);

        var fired = RuleBook.Assess(picture, Defaults).Where(finding => finding.Outcome == Outcome.Fires).ToList();

        Assert.True(fired.Count > 8);
        Assert.All(fired, finding =>
        {
            Assert.NotEmpty(finding.Statement);
            Assert.NotEmpty(finding.Limit);
            Assert.NotEmpty(finding.SourceKeys);
            Assert.Single(finding.Evidence, evidence => evidence.RaisedIt);
        });
    }

    private sealed class Failing : VolumeRule
    {
        public override string Id => "test.failing";

        public override string Title => "Failing";

        public override ImmutableArray<string> SourceKeys => ["clinic-default"];

        public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
        {
            yield return Answer(Outcome.Clear);
            throw new DivideByZeroException("by nothing");
        }
    }

    private sealed class Twice : VolumeRule
    {
        public override string Id => "test.twice";

        public override string Title => "Twice";

        public override ImmutableArray<string> SourceKeys => ["clinic-default"];

        public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol) =>
            [Answer(Outcome.Clear), Answer(Outcome.Clear)];
    }
}
