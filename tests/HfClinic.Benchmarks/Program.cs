using HfClinic.Benchmarks.DailyList;
using HfClinic.Benchmarks.Harness;
using HfClinic.Benchmarks.Reassessment;
using HfClinic.Benchmarks.Trend;

Command[] commands =
[
    new("daily-list", "opening Daily weights with 1,000 and 10,000 patients, against the bare SQL for the same rows", DailyListSpeed.RunAsync),
    new("reassess", "reassessing one patient with 180 days of readings: loading, rules, saving", ReassessmentSpeed.RunAsync),
    Command.Plain("trend-speed", "the weight trend against the same filters on general matrices", TrendSpeed.Run),
    Command.Plain("trend-simulation", "plain thresholds, moving average and trend on simulated patients [people] [seed]", TrendSimulation.Run),
];

if (args.Length > 0 && Array.Find(commands, command => command.Name == args[0]) is { } chosen)
{
    Machine.Describe(Console.Out);
    await chosen.RunAsync(args[1..]);
    return 0;
}

if (args.Length > 0)
{
    Console.Error.WriteLine($"There is no measure '{args[0]}'.");
}

Console.WriteLine("Measures (run in Release):");
foreach (var command in commands)
{
    Console.WriteLine($"  {command.Name,-18} {command.What}");
}

return args.Length > 0 ? 2 : 0;
