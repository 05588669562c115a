using HfClinic.Records.DailyWeights;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.DailyWeights;

/// <summary>The list as it is opened (invented data: behaviour only).</summary>
public class DailyWeightsQueryTests
{
    private static readonly Guid Nurse = new("0b6d4a52-3c1e-4c57-9d0f-6a1c2b3d4e5f");

    [Theory, BothDatabases]
    public async Task Counts_agree_with_the_rows_of_each_view(DatabaseEngine engine)
    {
        await using var clinic = await OpenAsync(engine);
        var query = clinic.Get<DailyWeightsQuery>();
        var counts = await query.CountsAsync(Nurse, TestContext.Current.CancellationToken);

        Assert.Equal(new DailyWeightsCounts(OnList: 3, Today: 1, ThisWeek: 1, NextVisit: 0, Silent: 1, ToCheck: 0, NotYet: 1, Mine: 1, PutOff: 0), counts);
        foreach (var (view, count) in new[]
        {
            (DailyWeightsView.All, counts.OnList), (DailyWeightsView.Today, counts.Today), (DailyWeightsView.ThisWeek, counts.ThisWeek),
            (DailyWeightsView.Silent, counts.Silent), (DailyWeightsView.ToCheck, counts.ToCheck), (DailyWeightsView.Mine, counts.Mine),
            (DailyWeightsView.NotYet, counts.NotYet), (DailyWeightsView.PutOff, counts.PutOff),
        })
        {
            Assert.Equal(count, await query.CountAsync(new(view, NurseId: Nurse), TestContext.Current.CancellationToken));
        }
    }

    [Theory, BothDatabases]
    public async Task Nobody_is_mine_without_a_nurse(DatabaseEngine engine)
    {
        await using var clinic = await OpenAsync(engine);
        Assert.Equal(0, (await clinic.Get<DailyWeightsQuery>().CountsAsync(null, TestContext.Current.CancellationToken)).Mine);
    }

    [Theory]
    [BothDatabases(DailyWeightsSort.Urgency, "gained,silent,steady")]
    [BothDatabases(DailyWeightsSort.Name, "silent,gained,steady")]
    [BothDatabases(DailyWeightsSort.LastWeight, "silent,steady,gained")]
    public async Task Puts_the_rows_in_the_order_asked_for(DatabaseEngine engine, DailyWeightsSort sort, string expected)
    {
        await using var clinic = await OpenAsync(engine);
        var rows = await clinic.Get<DailyWeightsQuery>().RowsAsync(new(Sort: sort), TestContext.Current.CancellationToken);
        Assert.Equal(expected, string.Join(',', rows.Select(row => row.ClinicNumber.ToLowerInvariant())));
        var second = await clinic.Get<DailyWeightsQuery>().RowsAsync(new(Sort: sort, Skip: 1, Take: 1), TestContext.Current.CancellationToken);
        Assert.Equal(rows[1].PatientId, Assert.Single(second).PatientId);
    }

    private static async Task<TestClinic> OpenAsync(DatabaseEngine engine)
    {
        var clinic = await TestClinic.StartAsync(engine);
        var steady = await clinic.EnrolAsync("steady", "Cressing");
        await clinic.WeighDailyAsync(steady, 80.0m, 80.1m, 80.0m, 80.2m);
        var gained = await clinic.EnrolAsync("gained", "Bexwell");
        await clinic.WeighDailyAsync(gained, 80.0m, 80.1m, 80.0m, 82.2m);
        var silent = await clinic.EnrolAsync("silent", "Alderley");
        await clinic.WeighAsync(silent, PatientsAtHome.Today.AddDays(-8), 80m);
        await using var db = clinic.OpenDb();
        await db.Patients.Where(patient => patient.Id == gained).ExecuteUpdateAsync(
            set => set.SetProperty(patient => patient.NurseId, Nurse), TestContext.Current.CancellationToken);
        return clinic;
    }
}
