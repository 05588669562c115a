using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

/// <summary>Ivabradine label; ESC 2021, 5.4.3.</summary>
public class IvabradineNotInSinusRhythmTests
{
    private readonly IvabradineNotInSinusRhythm _rule = new();

    [Theory]
    [InlineData(Rhythm.Sinus, Outcome.Clear)]
    [InlineData(Rhythm.AtrialFibrillation, Outcome.Fires)]
    [InlineData(Rhythm.Paced, Outcome.Clear)]
    public void By_rhythm_below_at_and_above(Rhythm rhythm, Outcome expected) => Assert.Equal(
        expected, _rule.About(Well(30).InRhythm(-1, rhythm).On("ivabradine", 5, 2, -30), TitrationClass.Ivabradine).Outcome);

    [Fact]
    public void Without_ivabradine_it_does_not_apply() => Assert.Empty(_rule.Assess(Well(30).InRhythm(-1, Rhythm.AtrialFibrillation), Esc));
}
