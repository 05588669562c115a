using System.Diagnostics;
using System.Globalization;
using HfClinic.Benchmarks.Harness;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Reassessment;
using HfClinic.Testing;
using HfClinic.Testing.Databases;

namespace HfClinic.Benchmarks.DailyList;

/// <summary>Server time of opening Daily weights: the counts, the first 60 rows and their strips, against the bare SQL for the same rows.</summary>
internal static class DailyListSpeed
{
    public const int StripDays = 28;
    private const int Rows = 60;
    private const int WeighedDays = 90;
    private const int WarmUp = 80;
    private const int Counted = 61;
    private static readonly int[] Sizes = [InventedClinic.Patterns, 10 * InventedClinic.Patterns];

    /// <summary>Prints the measures. Takes no arguments.</summary>
    public static async Task RunAsync(string[] args)
    {
        ArgumentOutOfRangeException.ThrowIfNotEqual(args.Length, 0);
        var ratios = new Table("Database", "Patients", "What", "HfClinic, ms", "Bare SQL, ms", "Ratio");
        var growth = new Table("Database", "What", "10,000 to 1,000 patients", "Bare SQL, the same");
        foreach (var engine in Enum.GetValues<DatabaseEngine>())
        {
            await using var clinic = await TestClinic.StartAsync(engine);
            var name = await Engines.NameAsync(clinic);
            var invented = new InventedClinic(clinic, WeighedDays);
            var measured = new List<Pair[]>();
            foreach (var size in Sizes)
            {
                await invented.GrowAsync(size);
                if (measured.Count == 0)
                {
                    await SweepAsync(clinic, name, size);
                }

                await Engines.SettleAsync(clinic);
                var pairs = await MeasureAsync(clinic);
                measured.Add(pairs);
                foreach (var pair in pairs)
                {
                    ratios.Add(name, size.ToString("N0", CultureInfo.InvariantCulture), pair.What, Table.Milliseconds(pair.Own), Table.Milliseconds(pair.Bare), Table.Ratio(pair.Own, pair.Bare));
                }
            }

            foreach (var (few, many) in measured[0].Zip(measured[1]))
            {
                growth.Add(name, few.What, Table.Ratio(many.Own, few.Own), Table.Ratio(many.Bare, few.Bare));
            }
        }

        Console.WriteLine($"Medians of {Counted} rounds, the fastest in brackets; {WeighedDays} days of weights each.");
        Console.WriteLine($"The first {InventedClinic.Patterns:N0} summaries come from a real sweep, the others repeat them (their readings do too).");
        ratios.Print(Console.Out);
        growth.Print(Console.Out);
    }

    /// <summary>A first sweep: every summary is written and every flag raised.</summary>
    private static async Task SweepAsync(TestClinic clinic, string name, int patients)
    {
        var watch = Stopwatch.StartNew();
        await clinic.Get<MorningSweep>().RunIfDueAsync(CancellationToken.None);
        Console.WriteLine(string.Create(CultureInfo.InvariantCulture,
            $"{name}: first sweep of {patients:N0} patients {watch.Elapsed.TotalSeconds:0.0} s, {watch.Elapsed.TotalMilliseconds / patients:0.00} ms a patient"));
    }

    private static async Task<Pair[]> MeasureAsync(TestClinic clinic)
    {
        var (query, strips) = (clinic.Get<DailyWeightsQuery>(), clinic.Get<WeightStripQuery>());
        var today = PatientsAtHome.Today;
        var bare = new BareDailyList(clinic, today);
        var request = new DailyWeightsRequest(Take: Rows);
        var shown = (await query.RowsAsync(request)).Select(row => row.PatientId).ToList();
        await CheckSameAsync(query, bare, shown);

        Task OwnCounts() => query.CountsAsync(InventedPatient.Nurse);
        Task OwnRows() => query.RowsAsync(request);
        Task OwnStrips() => strips.ReadAsync(shown, today.AddDays(1 - StripDays), today);
        async Task OwnAll()
        {
            await OwnCounts();
            await OwnRows();
            await OwnStrips();
        }

        async Task BareAll()
        {
            await bare.CountsAsync();
            await bare.StripsAsync(await bare.RowsAsync(Rows));
        }

        var taken = await Rounds.RunAsync(WarmUp, Counted,
            OwnAll, BareAll, OwnCounts, bare.CountsAsync, OwnRows, () => bare.RowsAsync(Rows), OwnStrips, () => bare.StripsAsync(shown));
        return
        [
            new("opening the list", taken[0], taken[1]),
            new("of it the counts", taken[2], taken[3]),
            new("of it 60 rows", taken[4], taken[5]),
            new("of it their strips", taken[6], taken[7]),
        ];
    }

    private static async Task CheckSameAsync(DailyWeightsQuery query, BareDailyList bare, List<long> shown)
    {
        var counts = await query.CountsAsync(InventedPatient.Nurse);
        long[] own = [counts.Mine, counts.OnList, counts.Today, counts.ThisWeek, counts.NextVisit, counts.Silent, counts.ToCheck, counts.NotYet, counts.PutOff];
        var (bareRows, bareCounts) = (await bare.RowsAsync(Rows), await bare.CountsAsync());
        if (!shown.SequenceEqual(bareRows) || !own.SequenceEqual(bareCounts))
        {
            throw new InvalidOperationException("The bare SQL does not give what the list gives: the two cannot be compared.");
        }

        Console.WriteLine($"On the list: {counts}");
    }

    private sealed record Pair(string What, Taken Own, Taken Bare);
}
