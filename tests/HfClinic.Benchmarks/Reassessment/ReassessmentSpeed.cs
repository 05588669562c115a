using System.Globalization;
using HfClinic.Benchmarks.Harness;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Records.Access;
using HfClinic.Records.Protocol;
using HfClinic.Records.Reassessment;
using HfClinic.Records.Work;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Benchmarks.Reassessment;

/// <summary>Time to reassess one patient whose data have not changed since, and where it goes.</summary>
internal static class ReassessmentSpeed
{
    private const int Days = 180;
    private const int Batch = 50;
    private const int WarmUp = 6;
    private const int Counted = 21;
    private static readonly Actor Measurer = Actor.Program("measure");

    /// <summary>Prints the measures. Takes no arguments.</summary>
    public static async Task RunAsync(string[] args)
    {
        ArgumentOutOfRangeException.ThrowIfNotEqual(args.Length, 0);
        var table = new Table("Database", "Fifty in one transaction, as in the sweep", "of it loading", "of it rules", "of it flags, summary, saving", "One in a transaction");
        foreach (var engine in Enum.GetValues<DatabaseEngine>())
        {
            await using var clinic = await TestClinic.StartAsync(engine);
            await new InventedClinic(clinic, Days).GrowAsync(Batch);
            await Engines.SettleAsync(clinic);
            await using var db = clinic.OpenDb();
            var patients = await db.Patients.Select(patient => patient.Id).ToListAsync();
            var pictures = await LoadAsync(clinic, patients);
            var protocol = clinic.Get<ProtocolInForce>().Clinic;
            var taken = await Rounds.RunAsync(WarmUp, Counted,
                () => ReassessAsync(clinic, patients),
                () => LoadAsync(clinic, patients),
                () => Task.FromResult(pictures.Sum(picture => RuleBook.Assess(picture, protocol).Length)),
                async () =>
                {
                    foreach (var patient in patients)
                    {
                        await ReassessAsync(clinic, [patient]);
                    }
                });
            var each = taken.Select(time => time / Batch).ToArray();
            var saving = new Taken(each[0].Median - each[1].Median - each[2].Median, each[0].Fastest - each[1].Fastest - each[2].Fastest);
            table.Add([await Engines.NameAsync(clinic), Table.Milliseconds(each[0]),
                .. new[] { each[1], each[2], saving }.Select(part => Share(part, each[0])), Table.Milliseconds(each[3])]);
        }

        Console.WriteLine($"Milliseconds a patient with {Days} days of weights; medians of {Counted} rounds of {Batch} patients, the fastest in brackets.");
        table.Print(Console.Out);
    }

    private static Task ReassessAsync(TestClinic clinic, IReadOnlyCollection<long> patients) => clinic.Get<ClinicWork>().RunAsync(
        Measurer, Capability.ReadCharts, scope => scope.TakePatientsAsync(patients, CancellationToken.None));

    private static async Task<List<PatientPicture>> LoadAsync(TestClinic clinic, IReadOnlyCollection<long> patients)
    {
        await using var db = clinic.OpenDb();
        await using var transaction = await db.Database.BeginTransactionAsync();
        var loader = clinic.Get<PatientPictureLoader>();
        List<PatientPicture> pictures = [];
        foreach (var id in patients)
        {
            var patient = await db.Patients.AsNoTracking().SingleAsync(p => p.Id == id);
            pictures.Add(await loader.LoadAsync(db, patient, PatientsAtHome.Today, CancellationToken.None));
        }

        return pictures;
    }

    private static string Share(Taken part, Taken whole) =>
        string.Create(CultureInfo.InvariantCulture, $"{Table.Milliseconds(part)}, {100 * part.Median / whole.Median:0} %");
}
