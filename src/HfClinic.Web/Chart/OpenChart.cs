using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Chart;

namespace HfClinic.Web.Chart;

/// <summary>The chart on screen, who looks at it, and how to read it again after a change.</summary>
public sealed record OpenChart(PatientChart Chart, Actor Actor, WeightUnit Unit, DateOnly Today, Func<Task> ReloadAsync)
{
    public long PatientId => Chart.Patient.Id;

    public bool May(Capability capability) => Actor.May(capability);
}
