using HfClinic.Clinical.Flags;
using HfClinic.Records.Access;
using HfClinic.Records.Protocol;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Protocol;

public class SetPatientThresholdTests
{
    private const string Key = "weight.gain-3-days";

    private static readonly Actor Prescriber = TestClinic.As(ClinicRole.Prescriber);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory]
    [BothDatabases(2_599, true)]
    [BothDatabases(2_600, false)]
    [BothDatabases(2_601, false)]
    public async Task The_patients_own_threshold_decides_for_this_patient(DatabaseEngine engine, int grams, bool raised)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        await clinic.Get<SetPatientThreshold>().RunAsync(Prescriber, id, Key, grams, true, "large frame, swings by 2 kg", Cancellation);
        await clinic.WeighAsync(id, new DateOnly(2026, 3, 28), 72.0m);
        await clinic.WeighAsync(id, new DateOnly(2026, 3, 31), 74.6m);
        await using var db = clinic.OpenDb();
        Assert.Equal(raised, await db.Flags.AnyAsync(flag => flag.RuleId == "volume.gain-3-days" && flag.State == FlagState.Open, Cancellation));
    }

    [Theory, BothDatabases]
    public async Task A_new_one_ends_the_one_before_and_the_clinics_can_come_back(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var set = clinic.Get<SetPatientThreshold>();
        await set.RunAsync(Prescriber, id, Key, 2500, true, "first", Cancellation);
        await set.RunAsync(Prescriber, id, Key, 3000, true, "second", Cancellation);
        await using var db = clinic.OpenDb();
        Assert.Equal(3000m, (await clinic.Get<ProtocolInForce>().ForAsync(db, id, Cancellation))[Key].Value);
        await set.RemoveAsync(Prescriber, id, Key, Cancellation);
        Assert.Equal(2000m, (await clinic.Get<ProtocolInForce>().ForAsync(db, id, Cancellation))[Key].Value);
        Assert.Equal(2, await db.PatientThresholds.CountAsync(threshold => threshold.EndedAt != null, Cancellation));
    }

    [Theory]
    [BothDatabases(Key, 499, "Value")]
    [BothDatabases(Key, 5001, "Value")]
    [BothDatabases("weight.no-such", 2000, "Key")]
    public async Task Refuses_outside_the_safe_range(DatabaseEngine engine, string key, int value, string field)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        var refusal = await Assert.ThrowsAsync<RefusedException>(() =>
            clinic.Get<SetPatientThreshold>().RunAsync(Prescriber, id, key, value, true, "reason", Cancellation));
        Assert.Equal(field, refusal.Problems.Single().Field);
    }
}
