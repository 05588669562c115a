using HfClinic.Clinical.Values;

namespace HfClinic.Records.Exchange;

/// <summary>What one line of a file of readings says.</summary>
internal sealed record ReadingLine(CsvLine Source, string ClinicNumber)
{
    /// <summary>Everything wrong with the line; values are only to be used when there is nothing.</summary>
    public List<LineFault> Faults { get; } = [];

    /// <summary>Wall-clock time in the clinic.</summary>
    public DateTime LocalTime { get; set; }

    /// <summary>UTC.</summary>
    public DateTime MeasuredAt { get; set; }

    public Weight? Weight { get; set; }

    /// <summary>The weight with its unit as in the file.</summary>
    public string? WeightAsTyped { get; set; }

    /// <summary>mmHg.</summary>
    public int? Systolic { get; set; }

    /// <summary>mmHg.</summary>
    public int? Diastolic { get; set; }

    /// <summary>Beats per minute.</summary>
    public int? Pulse { get; set; }

    /// <summary>Percent.</summary>
    public int? Saturation { get; set; }

    public string? Device { get; set; }

    /// <summary>The clinic day.</summary>
    public DateOnly Day => DateOnly.FromDateTime(LocalTime);

    /// <summary>The values by kind, in the unit of the kind.</summary>
    public IEnumerable<(ReadingKind Kind, int Value)> Values()
    {
        (ReadingKind, int?)[] all =
        [
            (ReadingKind.Weight, Weight?.Grams), (ReadingKind.SystolicPressure, Systolic), (ReadingKind.DiastolicPressure, Diastolic),
            (ReadingKind.HeartRate, Pulse), (ReadingKind.OxygenSaturation, Saturation),
        ];
        foreach (var (kind, value) in all)
        {
            if (value is { } given)
            {
                yield return (kind, given);
            }
        }
    }
}
