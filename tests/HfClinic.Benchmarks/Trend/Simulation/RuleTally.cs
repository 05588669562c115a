namespace HfClinic.Benchmarks.Trend;

/// <summary>Counts a rule's alerts in stable people and before events.</summary>
internal sealed class RuleTally(SimulatedRule rule)
{
    private const int SettlingDays = 28;
    private const int MuteDays = 7;
    private const double MonthDays = 30.4375;
    private readonly List<int> leads = [];
    private double stableMonths;
    private int falseAlerts;
    private int windows;
    private int windowsWithAlert;
    private int events;
    private int eventsFound;
    private int largeGains;
    private int largeGainsFound;

    public SimulatedRule Rule => rule;

    /// <summary>Alert episodes in stable people; after an alert the rule is silent for a week.</summary>
    public double FalseAlarmsPerMonth => falseAlerts / stableMonths;

    /// <summary>Share of stable fortnights with an alert: what a blind rule would find.</summary>
    public double ChanceLevel => (double)windowsWithAlert / windows;

    /// <summary>Share of events with an alert in the window before.</summary>
    public double Sensitivity => (double)eventsFound / events;

    /// <summary>The same among events with more than 2 kg gained or lost.</summary>
    public double SensitivityLarge => (double)largeGainsFound / largeGains;

    /// <summary>Median days from the first alert to the event, over events found.</summary>
    public double MedianLead => leads.Order().Skip((leads.Count - 1) / 2).Take(2 - (leads.Count % 2)).Select(days => (double)days).DefaultIfEmpty(double.NaN).Average();

    public void Stable(SimulatedDay[] days, double start)
    {
        int muted = int.MinValue;
        int lastAlert = int.MinValue;
        for (int day = SettlingDays; day < days.Length; day++)
        {
            bool alerts = rule.Alerts(days, day, start);
            if (alerts && day > muted)
            {
                falseAlerts++;
                muted = day + MuteDays;
            }

            lastAlert = alerts ? day : lastAlert;
            if ((day - SettlingDays) % 14 == 13)
            {
                windows++;
                windowsWithAlert += lastAlert > day - 14 ? 1 : 0;
            }
        }

        stableMonths += (days.Length - SettlingDays) / MonthDays;
    }

    /// <param name="from">First day of the window that counts.</param>
    /// <param name="until">The day after its last.</param>
    /// <param name="eventDay">The day lead is counted to.</param>
    public void BeforeEvent(SimulatedDay[] days, SimulatedPatient patient, int from, int until, int eventDay)
    {
        int first = from;
        while (first < until && !rule.Alerts(days, first, patient.StartKilograms))
        {
            first++;
        }

        bool found = first < until;
        bool large = Math.Abs(patient.GainKilograms) > 2;
        events++;
        eventsFound += found ? 1 : 0;
        largeGains += large ? 1 : 0;
        largeGainsFound += found && large ? 1 : 0;
        if (found)
        {
            leads.Add(eventDay - first);
        }
    }
}
