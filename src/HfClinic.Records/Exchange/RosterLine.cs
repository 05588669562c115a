using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;

namespace HfClinic.Records.Exchange;

/// <summary>What one line of a roster says.</summary>
internal sealed record RosterLine(CsvLine Source)
{
    /// <summary>Everything wrong with the line; the rest is only to be used when there is nothing.</summary>
    public List<LineFault> Faults { get; } = [];

    public PatientDetails Details { get; set; } = new();

    public Weight? Target { get; set; }

    public DateOnly? TargetFrom { get; set; }
}
