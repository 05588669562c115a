using CsCheck;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Picture;
using static HfClinic.Clinical.Tests.Pictures;

namespace HfClinic.Clinical.Tests.Medicines;

/// <summary>
/// HFrEF 40 % or less, HFmrEF 41 to 49 %, HFpEF 50 % or more (ESC 2021); HFimpEF once 40 % or less, risen by 10 points or more to
/// above 40 % (universal definition 2021, from memory). HFrEF therapy is kept for life (ESC 2021, AHA 2022).
/// </summary>
public class PhenotypeTests
{
    [Theory]
    [InlineData(EjectionFractionKind.Reduced, true, "40")]
    [InlineData(EjectionFractionKind.Reduced, true, "40.4")]
    [InlineData(EjectionFractionKind.MildlyReduced, false, "40.5")]
    [InlineData(EjectionFractionKind.MildlyReduced, false, "41")]
    [InlineData(EjectionFractionKind.MildlyReduced, false, "49.4")]
    [InlineData(EjectionFractionKind.Preserved, false, "49.5")]
    [InlineData(EjectionFractionKind.Preserved, false, "50")]
    [InlineData(EjectionFractionKind.MildlyReduced, true, "35", "44")]
    [InlineData(EjectionFractionKind.Improved, true, "32", "45")]
    [InlineData(EjectionFractionKind.Improved, true, "40", "50")]
    [InlineData(EjectionFractionKind.Improved, true, "40.4", "49.5")]
    [InlineData(EjectionFractionKind.Reduced, true, "38", "39")]
    [InlineData(EjectionFractionKind.Reduced, true, "60", "30")]
    [InlineData(EjectionFractionKind.Improved, true, "55", "30", "60")]
    [InlineData(EjectionFractionKind.Preserved, false, "45", "60")]
    public void Below_at_and_above_each_bound(EjectionFractionKind kind, bool onPathway, params string[] percents)
    {
        var phenotype = Phenotype.Of(AtHome.Ejection(percents))!;

        Assert.Equal((kind, onPathway), (phenotype.Kind, phenotype.OnHfrefPathway));
    }

    [Fact]
    public void Once_reduced_it_is_never_preserved() =>
        Gen.Int[5, 80].Array[1, 6].Sample(percents =>
        {
            var phenotype = Phenotype.Of(AtHome.Ejection([.. percents.Select(percent => $"{percent}")]))!;
            return percents.Min() > 40 || phenotype is { OnHfrefPathway: true, Kind: not EjectionFractionKind.Preserved };
        });

    [Fact]
    public void A_prescribers_word_goes_before_the_numbers()
    {
        var picture = AtHome.Ejection("35", "60") with
        {
            PhenotypeOverride = new(EjectionFractionKind.Preserved, "measured in fast atrial fibrillation", "Dr Invented", Today.AddDays(-3)),
        };

        var phenotype = Phenotype.Of(picture)!;

        Assert.Equal((EjectionFractionKind.Preserved, false), (phenotype.Kind, phenotype.OnHfrefPathway));
        Assert.Equal("HFpEF, set by Dr Invented on 28 Feb 2026: measured in fast atrial fibrillation", phenotype.Sentence);
    }

    [Fact]
    public void It_says_what_it_rests_on() =>
        Assert.Equal("HFimpEF: LVEF 52 % on 03 Mar 2026, 30 % on 01 Feb 2026", Phenotype.Of(AtHome.Ejection("30", "52"))!.Sentence);

    [Fact]
    public void Without_an_ejection_fraction_there_is_none() => Assert.Null(Phenotype.Of(AtHome));
}
