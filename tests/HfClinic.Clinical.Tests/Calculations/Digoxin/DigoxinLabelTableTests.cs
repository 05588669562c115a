using System.Globalization;
using HfClinic.Clinical.Calculations.Digoxin;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Calculations.Digoxin;

/// <summary>Table 5 of the older US digoxin label.</summary>
public class DigoxinLabelTableTests
{
    [Fact]
    public void All_66_cells_and_the_days_are_as_printed()
    {
        string[] lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "Files", "golden", "digoxin_label_table5.csv"));
        var rows = DigoxinLabelTable.Load();

        Assert.Equal(
            lines.Skip(1),
            rows.Select(row => string.Create(
                CultureInfo.InvariantCulture, $"{row.ClearancePer70Kilograms},{Joined(row)},{row.DaysToSteadyState}")));
        Assert.Equal(66, rows.Sum(row => row.MicrogramsDaily.Length));
        Assert.Equal(lines[0].Split(',')[1..^1], DigoxinLabelTable.LeanKilograms.Select(kg => $"lbw{kg}"));
    }

    [Fact]
    public void No_amount_falls_with_weight_or_with_clearance()
    {
        var rows = DigoxinLabelTable.Load();

        Assert.All(rows, row => Assert.Equal(row.MicrogramsDaily.Order(), row.MicrogramsDaily));
        Assert.All(Enumerable.Range(0, 6), column => Assert.Equal(
            rows.Select(row => row.MicrogramsDaily[column]).Order(), rows.Select(row => row.MicrogramsDaily[column])));
    }

    /// <summary>It aims at an older range of levels: 250 micrograms at a clearance of 60 go with 1.24 ng/mL by Koup and Jusko.</summary>
    [Fact]
    public void It_aims_twice_as_high_as_today() => In.Check(1.24, DigoxinSteadyState.Level(
        (double)DigoxinLabelTable.Load()[6].MicrogramsDaily[2], DigoxinForm.Tablet, DigoxinClearance.KoupJusko(60, HeartFailureGrade.ModerateToSevere)), 2);

    [Theory]
    [InlineData("[125,125,125,125,125]", 22, 0, "there must be 6 daily amounts")]
    [InlineData("[0,125,125,125,125,125]", 22, 0, "a daily amount is not above 0")]
    [InlineData("[125,125,125,125,125,125]", 0, 0, "the days to steady state are not above 0")]
    [InlineData("[125,125,125,125,125,125]", 22, -10, "the creatinine clearance is below 0")]
    public void A_faulty_row_is_refused(string amounts, int days, int clearance, string reason)
    {
        string json = $$"""[{"clearancePer70Kilograms":{{clearance}},"microgramsDaily":{{amounts}},"daysToSteadyState":{{days}}}]""";

        Assert.Equal($"digoxin-label-table.json, row 1: {reason}", Assert.Throws<TableFaultException>(() => DigoxinLabelTable.Parse(json)).Message);
    }

    private static string Joined(DigoxinLabelRow row) =>
        string.Join(",", row.MicrogramsDaily.Select(amount => amount.ToString(CultureInfo.InvariantCulture)));
}
