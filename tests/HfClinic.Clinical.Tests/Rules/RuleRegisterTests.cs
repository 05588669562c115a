using System.Collections.Immutable;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Rules;

public class RuleRegisterTests
{
    /// <summary>The rule book, and the titration rules, which the record does not feed yet.</summary>
    private static readonly ImmutableArray<IRule> Every = [.. RuleBook.All, .. TitrationRules.All];

    [Fact]
    public void Every_rule_in_the_program_has_its_line_in_the_rule_book()
    {
        var written = typeof(IRule).Assembly.GetTypes().Where(type => type is { IsAbstract: false } && type.IsAssignableTo(typeof(IRule)));

        Assert.Equal(written.Select(type => type.Name).Order(), Every.Select(rule => rule.GetType().Name).Order());
    }

    [Fact]
    public void Ids_and_titles_are_unique()
    {
        Assert.Distinct(Every.Select(rule => rule.Id));
        Assert.Distinct(Every.Select(rule => rule.Title));
    }

    [Fact]
    public void Every_rule_names_a_source_that_resolves()
    {
        var sources = SourceTable.Load();

        Assert.All(Every, rule => Assert.NotEmpty(rule.SourceKeys));
        Assert.All(Every.SelectMany(rule => rule.SourceKeys), key => Assert.True(sources.Has(key), key));
    }

    [Fact]
    public void A_weight_rule_and_its_threshold_name_the_same_sources() =>
        Assert.All(RuleBook.All.OfType<WeightChangeRule>(), rule => Assert.Equal(Pictures.Defaults[rule.ThresholdKey].SourceKeys, rule.SourceKeys));

    /// <summary>A test class of the rule's name with at least one test told to be below, at and above a limit.</summary>
    [Fact]
    public void Every_rule_has_boundary_tests()
    {
        var tests = typeof(RuleRegisterTests).Assembly.GetTypes().ToLookup(type => type.Name);

        Assert.All(Every, rule =>
        {
            var name = rule.GetType().Name + "Tests";
            var methods = Assert.Single(tests[name]).GetMethods().Where(method => method.IsDefined(typeof(TheoryAttribute), false));
            Assert.Contains(methods, method => method.Name.Contains("elow_at_and_above", StringComparison.Ordinal));
        });
    }
}
