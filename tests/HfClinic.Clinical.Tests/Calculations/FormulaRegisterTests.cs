using System.Reflection;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Calculations.Digoxin;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Calculations;

/// <summary>What holds of every formula in the program.</summary>
public class FormulaRegisterTests
{
    private static readonly Formula[] All =
    [
        .. typeof(Formula).Assembly.GetTypes()
            .Where(type => !type.ContainsGenericParameters)
            .SelectMany(type => type.GetFields(BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic))
            .Where(field => field.FieldType == typeof(Formula))
            .Select(field => (Formula)field.GetValue(null)!),
    ];

    [Fact]
    public void Every_formula_names_a_source_that_resolves()
    {
        var sources = SourceTable.Load();

        Assert.True(All.Length > 35, $"Only {All.Length} formulas were found.");
        Assert.All(All, formula => Assert.NotEmpty(formula.SourceKeys));
        Assert.All(All.SelectMany(formula => formula.SourceKeys).Append(DigoxinLabelTable.SourceKey), key => Assert.True(sources.Has(key), key));
    }

    [Fact]
    public void Every_formula_is_told_in_words()
    {
        Assert.All(All, formula => Assert.False(string.IsNullOrWhiteSpace(formula.Name)));
        Assert.All(All, formula => Assert.False(string.IsNullOrWhiteSpace(formula.InWords)));
    }

    [Fact]
    public void Two_formulas_for_one_thing_are_told_apart_by_their_method() =>
        Assert.Distinct(All.Select(formula => (formula.Name, formula.Method)));

    /// <summary>Formulas describe; a dose is never advised (common practice, no source).</summary>
    [Fact]
    public void No_formula_advises() => Assert.All(
        All.SelectMany(formula => new[] { formula.Name, formula.InWords, formula.Caution }),
        text => Assert.DoesNotMatch(@"(?i)\b(give|start|stop|increase|reduce|should|must|recommended)\b", text));
}
