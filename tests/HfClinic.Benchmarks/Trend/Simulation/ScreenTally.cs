namespace HfClinic.Benchmarks.Trend;

/// <summary>Counts what the entry checks set aside, against the truth.</summary>
internal sealed class ScreenTally
{
    private int entries;
    private int held;
    private int gross;
    private int grossHeld;

    /// <summary>Share of all entries not accepted.</summary>
    public double Held => (double)held / entries;

    /// <summary>Share of gross errors (off by more than 4 kg and 4.5% of weight) not accepted.</summary>
    public double GrossHeld => (double)grossHeld / gross;

    /// <summary>Share of all other entries not accepted.</summary>
    public double OrdinaryHeld => (double)(held - grossHeld) / (entries - gross);

    public void Count(SimulatedDay[] days, SimulatedPatient patient)
    {
        for (int day = 0; day < days.Length; day++)
        {
            if (days[day].Raw is int grams)
            {
                bool isGross = Math.Abs((grams / 1000.0) - patient.TrueKilograms[day]) > Math.Max(4, 0.045 * patient.StartKilograms);
                bool isHeld = days[day].Screened is null;
                entries++;
                held += isHeld ? 1 : 0;
                gross += isGross ? 1 : 0;
                grossHeld += isGross && isHeld ? 1 : 0;
            }
        }
    }
}
