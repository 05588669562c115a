using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Patients;

public class SetTargetWeightTests
{
    private static readonly Actor Prescriber = TestClinic.As(ClinicRole.Prescriber);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task The_latest_target_holds_and_the_earlier_one_stays(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var set = clinic.Get<SetTargetWeight>();
        await set.RunAsync(Prescriber, id, Weight.FromKilograms(72), new DateOnly(2026, 2, 1), null, Cancellation);
        await set.RunAsync(Prescriber, id, Weight.FromKilograms(71.5m), new DateOnly(2026, 3, 3), "no swelling at the visit", Cancellation);
        await using var db = clinic.OpenDb();
        var summary = await db.PatientSummaries.SingleAsync(Cancellation);
        Assert.Equal((71_500, new DateOnly(2026, 3, 3)), (summary.TargetGrams, summary.TargetFrom));
        Assert.Equal(2, await db.TargetWeights.CountAsync(Cancellation));
    }

    [Theory, BothDatabases]
    public async Task A_target_struck_out_stays_visible_and_the_one_before_holds_again(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var set = clinic.Get<SetTargetWeight>();
        await set.RunAsync(Prescriber, id, Weight.FromKilograms(72), new DateOnly(2026, 2, 1), null, Cancellation);
        var wrong = await set.RunAsync(Prescriber, id, Weight.FromKilograms(27), new DateOnly(2026, 3, 3), null, Cancellation);
        await set.StrikeOutAsync(Prescriber, wrong, "digits swapped", Cancellation);
        await using var db = clinic.OpenDb();
        Assert.Equal(72_000, (await db.PatientSummaries.SingleAsync(Cancellation)).TargetGrams);
        Assert.Equal("digits swapped", (await db.TargetWeights.SingleAsync(t => t.Id == wrong, Cancellation)).StruckOutBecause);
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => set.StrikeOutAsync(Prescriber, wrong, "again", Cancellation));
        await Assert.ThrowsAsync<NotFoundException>(() => set.StrikeOutAsync(Prescriber, 4711, "none", Cancellation));
    }

    [Theory]
    [BothDatabases(24_999, "2026-03-31", "Target")]
    [BothDatabases(300_001, "2026-03-31", "Target")]
    [BothDatabases(70_000, "2026-04-01", "From")]
    public async Task Refuses_what_cannot_be(DatabaseEngine engine, int grams, string from, string field)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var refusal = await Assert.ThrowsAsync<RefusedException>(() =>
            clinic.Get<SetTargetWeight>().RunAsync(Prescriber, id, new Weight(grams), DateOnly.Parse(from, null), null, Cancellation));
        Assert.Equal(field, refusal.Problems.Single().Field);
    }

    [Theory]
    [BothDatabases(25_000)]
    [BothDatabases(300_000)]
    public async Task Takes_the_ends_of_the_range(DatabaseEngine engine, int grams)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.Get<SetTargetWeight>().RunAsync(Prescriber, id, new Weight(grams), new DateOnly(2026, 3, 31), null, Cancellation);
        await using var db = clinic.OpenDb();
        Assert.Equal(grams, (await db.PatientSummaries.SingleAsync(Cancellation)).TargetGrams);
    }
}
