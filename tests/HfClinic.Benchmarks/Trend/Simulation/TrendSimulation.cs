using System.Globalization;

namespace HfClinic.Benchmarks.Trend;

/// <summary>
/// Plain thresholds, moving average and trend side by side on simulated home weights. A simulation, not a measure of accuracy
/// in patients: the events are shaped after four published studies.
/// </summary>
internal static class TrendSimulation
{
    private const int StableDays = 208;
    private const int EventDay = 120;

    /// <summary>Prints the table for each data model. Optional arguments: people in each group (6000), seed (11).</summary>
    public static void Run(string[] args)
    {
        int people = args.Length > 0 ? int.Parse(args[0], CultureInfo.InvariantCulture) : 6_000;
        int seed = args.Length > 1 ? int.Parse(args[1], CultureInfo.InvariantCulture) : 11;
        Console.WriteLine($"Simulated home weights, {people} stable people and {people} with an event in each model, seed {seed}. A simulation, not accuracy in patients.");
        foreach (var model in WeightDataModel.All)
        {
            Print(model.Name, Try(model, SimulatedRule.Gains, WeightEvent.Decompensation, people, seed));
        }

        Print("default model, fluid lost", Try(WeightDataModel.All[0], [SimulatedRule.Loss], WeightEvent.OverDiuresis, people, seed));
    }

    /// <summary>Runs the rules on as many stable people as people with an event.</summary>
    public static (IReadOnlyList<RuleTally> Rules, ScreenTally Screen) Try(
        WeightDataModel model, IReadOnlyList<SimulatedRule> rules, WeightEvent happens, int people, int seed)
    {
        List<RuleTally> tallies = [.. rules.Select(rule => new RuleTally(rule))];
        var screen = new ScreenTally();
        // The loss window reaches to the end of the event day; the gain window ends the day before.
        var (from, until) = happens == WeightEvent.OverDiuresis ? (EventDay - 10, EventDay + 1) : (EventDay - 14, EventDay);
        for (int person = 0; person < people; person++)
        {
            var stable = SimulatedPatient.Make(model, WeightEvent.Stable, StableDays, EventDay, HashCode(seed, person, 0));
            var stableDays = SimulatedDay.Run(stable);
            screen.Count(stableDays, stable);
            var ill = SimulatedPatient.Make(model, happens, EventDay + 1, EventDay, HashCode(seed, person, 1));
            var illDays = SimulatedDay.Run(ill);
            foreach (var tally in tallies)
            {
                tally.Stable(stableDays, stable.StartKilograms);
                tally.BeforeEvent(illDays, ill, from, until, EventDay);
            }
        }

        return (tallies, screen);
    }

    private static int HashCode(int seed, int person, int group) => (seed * 1_000_003) + (person * 2) + group;

    private static void Print(string title, (IReadOnlyList<RuleTally> Rules, ScreenTally Screen) outcome)
    {
        Console.WriteLine();
        Console.WriteLine(title);
        Console.WriteLine($"{"rule",-46}{"false/month",12}{"chance",8}{"found",8}{"found >2 kg",12}{"lead d",8}");
        foreach (var tally in outcome.Rules)
        {
            Console.WriteLine(string.Create(
                CultureInfo.InvariantCulture,
                $"{tally.Rule.Name,-46}{tally.FalseAlarmsPerMonth,12:0.000}{tally.ChanceLevel,8:0.000}{tally.Sensitivity,8:0.000}{tally.SensitivityLarge,12:0.000}{tally.MedianLead,8:0}"));
        }

        Console.WriteLine(string.Create(
            CultureInfo.InvariantCulture,
            $"entries held {outcome.Screen.Held:0.0000}; of gross errors {outcome.Screen.GrossHeld:0.0000}; of ordinary entries {outcome.Screen.OrdinaryHeld:0.00000}"));
    }
}
