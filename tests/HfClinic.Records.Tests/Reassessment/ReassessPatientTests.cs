using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Records.Access;
using HfClinic.Records.Flags;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Reassessment;

/// <summary>From a reading to the list, in one transaction (invented data: behaviour only).</summary>
public class ReassessPatientTests
{
    private const string Gain = "volume.gain-3-days";

    [Theory, BothDatabases]
    public async Task A_gain_raises_a_flag_with_its_evidence_and_stands_on_the_summary(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(patient, 80.0m, 80.1m, 80.0m, 82.2m);

        await using var db = clinic.OpenDb();
        var flag = await db.Flags.SingleAsync(f => f.RuleId == Gain, TestContext.Current.CancellationToken);
        Assert.Equal(Urgency.Today, flag.Urgency);
        Assert.StartsWith("Gained 2.2 kg in 3 days", flag.Statement);
        Assert.Contains(EvidenceText.Read(flag.EvidenceJson), evidence => evidence.RaisedIt && evidence.Day == PatientsAtHome.Today);
        var summary = await db.PatientSummaries.SingleAsync(TestContext.Current.CancellationToken);
        Assert.Equal(Urgency.Today, summary.WorstUrgency);
        Assert.Contains("Gained 2.2 kg", summary.Why);
    }

    [Theory, BothDatabases]
    public async Task A_flag_stays_when_the_weight_falls_again_and_says_since_when(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(patient, 80.0m, 80.1m, 80.0m, 82.2m);
        clinic.Clock.Advance(TimeSpan.FromDays(1));
        await clinic.WeighAsync(patient, PatientsAtHome.Today.AddDays(1), 80.1m);

        await using var db = clinic.OpenDb();
        var flag = await db.Flags.SingleAsync(f => f.RuleId == Gain, TestContext.Current.CancellationToken);
        Assert.Equal(FlagState.Open, flag.State);
        Assert.Equal(PatientsAtHome.Today.AddDays(1), flag.NoLongerMetOn);
        Assert.Equal([FlagStepKind.Raised, FlagStepKind.NoLongerMet],
            await db.FlagSteps.Where(s => s.FlagId == flag.Id).OrderBy(s => s.Id).Select(s => s.Kind).ToListAsync(TestContext.Current.CancellationToken));
    }

    [Theory, BothDatabases]
    public async Task An_answered_flag_leaves_the_list_and_what_was_shown_stays(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(patient, 80.0m, 80.1m, 80.0m, 82.2m);
        await using var db = clinic.OpenDb();
        foreach (var open in await db.Flags.Where(f => f.State == FlagState.Open).Select(f => f.Id).ToListAsync(TestContext.Current.CancellationToken))
        {
            await clinic.Get<AnswerFlag>().RunAsync(TestClinic.As(ClinicRole.Nurse), open, "spoken, diuretic as prescribed", TestContext.Current.CancellationToken);
        }

        var summary = await db.PatientSummaries.SingleAsync(TestContext.Current.CancellationToken);
        Assert.Null(summary.WorstUrgency);
        Assert.Equal("", summary.Why);
        var raised = await db.FlagSteps.Where(s => s.Kind == FlagStepKind.Raised).Select(s => s.Statement).ToListAsync(TestContext.Current.CancellationToken);
        Assert.Contains(raised, statement => statement.StartsWith("Gained 2.2 kg in 3 days", StringComparison.Ordinal));
    }

    [Theory, BothDatabases]
    public async Task A_flag_put_off_comes_back_on_its_day(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighDailyAsync(patient, 80.0m, 80.1m, 80.0m, 82.2m);
        await using var db = clinic.OpenDb();
        var flag = await db.Flags.AsNoTracking().SingleAsync(f => f.RuleId == Gain, TestContext.Current.CancellationToken);
        await clinic.Get<PutOffFlag>().RunAsync(
            TestClinic.As(ClinicRole.Nurse), flag.Id, PatientsAtHome.Today.AddDays(2), "visit tomorrow", TestContext.Current.CancellationToken);
        Assert.Equal(1, (await db.PatientSummaries.AsNoTracking().SingleAsync(TestContext.Current.CancellationToken)).PutOffFlags);

        clinic.Clock.Advance(TimeSpan.FromDays(2));
        await clinic.Get<Records.Reassessment.MorningSweep>().RunIfDueAsync(TestContext.Current.CancellationToken);
        var summary = await db.PatientSummaries.AsNoTracking().SingleAsync(TestContext.Current.CancellationToken);
        Assert.Equal(0, summary.PutOffFlags);
        Assert.Equal(Urgency.Today, summary.WorstUrgency);
    }

    [Theory, BothDatabases]
    public async Task A_correction_changes_today_and_keeps_what_was_shown(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolAtHomeAsync();
        await clinic.WeighAsync(patient, PatientsAtHome.Today.AddDays(-2), 80.0m);
        await clinic.WeighAsync(patient, PatientsAtHome.Today.AddDays(-1), 80.1m);
        var typed = await clinic.WeighAsync(patient, PatientsAtHome.Today, 82.2m);
        await clinic.Get<DecideReading>().CorrectAsync(
            TestClinic.As(ClinicRole.Nurse), typed, 80_200, "80.2 kg", "read out again on the phone", TestContext.Current.CancellationToken);

        await using var db = clinic.OpenDb();
        var rows = await db.Readings.Where(r => r.PatientId == patient).OrderBy(r => r.Id).ToListAsync(TestContext.Current.CancellationToken);
        Assert.Equal(ReadingState.Superseded, rows.Single(r => r.Value == 82_200).State);
        Assert.Equal(typed, rows.Single(r => r.Value == 80_200).SupersedesId);
        Assert.Equal(80_200, (await db.PatientSummaries.SingleAsync(TestContext.Current.CancellationToken)).LastGrams);
        var flag = await db.Flags.SingleAsync(f => f.RuleId == Gain, TestContext.Current.CancellationToken);
        Assert.Equal(PatientsAtHome.Today, flag.NoLongerMetOn);
        Assert.StartsWith("Gained 2.2 kg", (await db.FlagSteps.FirstAsync(
            s => s.FlagId == flag.Id && s.Kind == FlagStepKind.Raised, TestContext.Current.CancellationToken)).Statement);
    }
}
