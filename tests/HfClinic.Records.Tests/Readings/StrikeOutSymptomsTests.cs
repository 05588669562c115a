using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Readings;

public class StrikeOutSymptomsTests
{
    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task The_report_stays_visible_and_no_longer_holds_its_flag_as_met(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        foreach (var symptoms in new[] { Symptoms.AnkleSwelling, Symptoms.BreathlessAtRest })
        {
            await clinic.Get<RecordReadings>().RunAsync(
                Nurse, id, new TakenReadings { LocalTime = new DateTime(2026, 3, 31, 8, 0, 0), Symptoms = symptoms }, Cancellation);
        }

        await using var db = clinic.OpenDb();
        var report = await db.SymptomReports.AsNoTracking().SingleAsync(r => r.Symptoms == Symptoms.BreathlessAtRest, Cancellation);
        var raised = await db.Flags.AsNoTracking().SingleAsync(flag => flag.RuleId == "volume.symptoms" && flag.Urgency == Urgency.Today, Cancellation);
        Assert.Equal((FlagState.Open, null), (raised.State, raised.NoLongerMetOn));

        var strike = clinic.Get<StrikeOutSymptoms>();
        await Assert.ThrowsAsync<RefusedException>(() => strike.RunAsync(Nurse, report.Id, " ", Cancellation));
        await strike.RunAsync(Nurse, report.Id, "told by another person", Cancellation);
        Assert.Equal("told by another person", (await db.SymptomReports.AsNoTracking().SingleAsync(r => r.Id == report.Id, Cancellation)).StruckOutBecause);
        Assert.Equal(clinic.Get<ClinicClock>().Today, (await db.Flags.AsNoTracking().SingleAsync(flag => flag.Id == raised.Id, Cancellation)).NoLongerMetOn);
        await Assert.ThrowsAsync<ChangedMeanwhileException>(() => strike.RunAsync(Nurse, report.Id, "again", Cancellation));
        await Assert.ThrowsAsync<NotFoundException>(() => strike.RunAsync(Nurse, 4711, "none", Cancellation));
    }
}
