using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;

namespace HfClinic.Clinical.Tests.Rules.Volume;

public class IntakeFileRuleTests
{
    [Theory]
    [InlineData("gain_over_2kg_in_3d", typeof(GainInThreeDays))]
    [InlineData("gain_5lb_in_7d", typeof(GainInSevenDays))]
    [InlineData("no_weight_5d", typeof(NoWeight))]
    public void The_same_patients_are_flagged_as_by_an_independent_reckoning(string figure, Type type)
    {
        var rule = (IRule)Activator.CreateInstance(type)!;
        var patients = IntakeFiles.Patients();

        var flagged = patients.Where(patient => rule.Read(patient.Picture).Outcome == Outcome.Fires).Select(patient => patient.Number);

        Assert.Equal(patients.Where(patient => patient.Expected.GetProperty(figure).GetBoolean()).Select(patient => patient.Number), flagged);
        Assert.InRange(flagged.Count(), 1, 95);
    }
}
