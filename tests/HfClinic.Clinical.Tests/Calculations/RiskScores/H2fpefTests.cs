using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Calculations.RiskScores;

namespace HfClinic.Clinical.Tests.Calculations.RiskScores;

/// <summary>Reddy, Circulation 2018;138:861; points seen on several pages. Totals added by hand.</summary>
public class H2fpefTests
{
    /// <summary>2 + 1 + 3 + 1 + 1 + 1.</summary>
    [Fact]
    public void Everything_counts_9() => Assert.Equal(9, In.Value(H2fpef.Points(34, 3, true, 40, 72, 12)));

    /// <summary>Only E/e′.</summary>
    [Fact]
    public void A_slim_man_of_58_in_sinus_rhythm_has_1() => Assert.Equal("1 point", H2fpef.Points(28, 1, false, 30, 58, 10).Text);

    [Theory]
    [InlineData(29.9, 1, 35, 60, 9, 0)]
    [InlineData(30, 1, 35, 60, 9, 0)]
    [InlineData(30.1, 1, 35, 60, 9, 2)]
    [InlineData(30, 2, 35, 60, 9, 1)]
    [InlineData(30, 1, 35.1, 60, 9, 1)]
    [InlineData(30, 1, 35, 61, 9, 1)]
    [InlineData(30, 1, 35, 60, 9.1, 1)]
    public void Each_item_below_at_and_above_its_limit(double bmi, int medicines, double pasp, int age, double ratio, int points) =>
        Assert.Equal(points, In.Value(H2fpef.Points(bmi, medicines, false, pasp, age, ratio)));

    [Fact]
    public void A_body_mass_index_of_30_by_weight_and_height_counts_nothing() =>
        Assert.Equal(0, In.Value(H2fpef.Points(BodySize.BodyMassIndex(In.Kg(86.7m), In.Cm(170)), 0, false, 20, 40, 5)));

    [Theory]
    [InlineData(0, "low")]
    [InlineData(1, "low")]
    [InlineData(2, "intermediate")]
    [InlineData(5, "intermediate")]
    [InlineData(6, "high")]
    [InlineData(9, "high")]
    public void The_published_groups(int points, string group) => Assert.Equal(group, H2fpef.Group(points));

    [Fact]
    public void What_is_missing_is_named() => Assert.Equal(
        "not computed: no answer on atrial fibrillation, no PASP and no E/e′", H2fpef.Points(28, 1, default, default, 58, default).Text);
}
