using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Records.Access;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Flags;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.DailyWeights;

/// <summary>Views, search, order, pages and counts of the daily list (invented data: behaviour only).</summary>
public class DailyWeightsQueryTests
{
    private static readonly DateOnly Today = PatientsAtHome.Today;

    [Theory]
    [BothDatabases(DailyWeightsView.All, "GAIN,HELD,OFF,QUIET,SILENT")]
    [BothDatabases(DailyWeightsView.Today, "GAIN")]
    [BothDatabases(DailyWeightsView.ThisWeek, "HELD,SILENT")]
    [BothDatabases(DailyWeightsView.Silent, "SILENT")]
    [BothDatabases(DailyWeightsView.ToCheck, "HELD")]
    [BothDatabases(DailyWeightsView.Mine, "QUIET")]
    [BothDatabases(DailyWeightsView.NotYet, "HELD,SILENT")]
    [BothDatabases(DailyWeightsView.PutOff, "OFF")]
    public async Task A_view_shows_its_own_and_no_others(DatabaseEngine engine, DailyWeightsView view, string numbers)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var nurse = await SeedAsync(clinic);
        var query = clinic.Get<DailyWeightsQuery>();
        var request = new DailyWeightsRequest(view, NurseId: nurse);

        var rows = await query.RowsAsync(request, TestContext.Current.CancellationToken);

        Assert.Equal(numbers, string.Join(',', rows.Select(row => row.ClinicNumber).Order(StringComparer.Ordinal)));
        Assert.Equal(rows.Count, await query.CountAsync(request, TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task The_counts_agree_with_the_views(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var nurse = await SeedAsync(clinic);

        Assert.Equal(
            new DailyWeightsCounts(OnList: 5, Today: 1, ThisWeek: 2, NextVisit: 0, Silent: 1, ToCheck: 1, NotYet: 2, Mine: 1, PutOff: 1),
            await clinic.Get<DailyWeightsQuery>().CountsAsync(nurse, TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task An_empty_clinic_counts_nobody(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        Assert.Equal(0, (await clinic.Get<DailyWeightsQuery>().CountsAsync(null, TestContext.Current.CancellationToken)).OnList);
    }

    [Theory, BothDatabases]
    public async Task Nobody_is_mine_to_a_person_without_patients(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await SeedAsync(clinic);
        Assert.Empty(await clinic.Get<DailyWeightsQuery>().RowsAsync(new(DailyWeightsView.Mine, NurseId: null), TestContext.Current.CancellationToken));
    }

    [Theory]
    [BothDatabases("maria jose")]
    [BothDatabases("MARÍA-JOSÉ")]
    [BothDatabases("obrien")]
    [BothDatabases("O'Brien")]
    [BothDatabases("t 77")]
    [BothDatabases("T77")]
    public async Task Search_finds_accents_apostrophes_and_numbers_either_way(DatabaseEngine engine, string search)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-77", FamilyName = "O’Brien", GivenName = "María-José" });
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-78", FamilyName = "Tamsey", GivenName = "Bram" });

        var rows = await clinic.Get<DailyWeightsQuery>().RowsAsync(new(Search: search), TestContext.Current.CancellationToken);

        Assert.Equal(["T-77"], rows.Select(row => row.ClinicNumber));
    }

    [Theory]
    [BothDatabases(DailyWeightsSort.Name, "Adler,Moss,Zeller")]
    [BothDatabases(DailyWeightsSort.Change1Day, "Moss,Zeller,Adler")]
    [BothDatabases(DailyWeightsSort.Change3Days, "Moss,Zeller,Adler")]
    [BothDatabases(DailyWeightsSort.Change7Days, "Moss,Zeller,Adler")]
    [BothDatabases(DailyWeightsSort.ToTarget, "Zeller,Moss,Adler")]
    [BothDatabases(DailyWeightsSort.LastWeight, "Adler,Moss,Zeller")]
    public async Task The_order_is_the_one_asked_for_and_unknown_values_come_last(DatabaseEngine engine, DailyWeightsSort sort, string names)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolAtHomeAsync("T-1", "Adler", 80m);
        var moss = await clinic.EnrolAtHomeAsync("T-2", "Moss", 80m);
        var zeller = await clinic.EnrolAtHomeAsync("T-3", "Zeller", 80m);
        await clinic.WeighDailyAsync(moss, 80.0m, 80.6m);
        await clinic.WeighDailyAsync(zeller, 80.9m, 80.8m);

        var rows = await clinic.Get<DailyWeightsQuery>().RowsAsync(new(Sort: sort), TestContext.Current.CancellationToken);

        Assert.Equal(names, string.Join(',', rows.Select(row => row.FamilyName)));
    }

    [Theory, BothDatabases]
    public async Task The_most_urgent_come_first_and_of_these_the_longest_waiting(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await SeedAsync(clinic);
        clinic.Clock.Advance(TimeSpan.FromMinutes(5));
        await clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "LATER" });

        var rows = await clinic.Get<DailyWeightsQuery>().RowsAsync(new(), TestContext.Current.CancellationToken);

        Assert.Equal(["GAIN", "LATER"], rows.Take(2).Select(row => row.ClinicNumber));
        Assert.Null(rows[^1].Summary.WorstUrgency);
    }

    [Theory, BothDatabases]
    public async Task Pages_follow_each_other_without_gap_or_repeat(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        for (var at = 1; at <= 7; at++)
        {
            await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = $"T-{at}" });
        }

        var query = clinic.Get<DailyWeightsQuery>();
        var pages = new List<string>();
        for (var skip = 0; skip < 9; skip += 3)
        {
            pages.AddRange((await query.RowsAsync(new(Skip: skip, Take: 3), TestContext.Current.CancellationToken)).Select(row => row.ClinicNumber));
        }

        Assert.Equal(["T-1", "T-2", "T-3", "T-4", "T-5", "T-6", "T-7"], pages);
    }

    [Theory, BothDatabases]
    public async Task Those_who_left_or_do_not_weigh_at_home_are_not_on_the_list(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-1", WeighsAtHome = false });
        Assert.Empty(await clinic.Get<DailyWeightsQuery>().RowsAsync(new(), TestContext.Current.CancellationToken));
    }

    /// <summary>One person of each kind; returns the nurse of the quiet one.</summary>
    private static async Task<Guid> SeedAsync(TestClinic clinic)
    {
        await using var db = clinic.OpenDb();
        var nurse = await db.Users.Where(user => user.UserName == "nurse").Select(user => user.Id).SingleAsync(TestContext.Current.CancellationToken);
        await clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "GAIN" });
        var silent = await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SILENT" });
        await clinic.WeighAsync(silent, Today.AddDays(-6), 70.0m);
        var held = await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "HELD" });
        await clinic.WeighAsync(held, Today.AddDays(-1), 64.2m);
        await clinic.HoldWeightAsync(held, Today, 141.6m, HoldReason.PoundsTakenAsKilograms);
        var quiet = await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "QUIET", NurseId = nurse });
        await clinic.WeighAsync(quiet, Today, 70.0m);
        var off = await clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "OFF" });
        var flags = await db.Flags.Where(flag => flag.PatientId == off && flag.State == FlagState.Open).Select(flag => flag.Id).ToListAsync(TestContext.Current.CancellationToken);
        await clinic.Get<PutOffFlag>().RunAsync(TestClinic.As(ClinicRole.Nurse), flags, Today.AddDays(3), "seen in clinic on Friday", TestContext.Current.CancellationToken);
        return nurse;
    }
}
