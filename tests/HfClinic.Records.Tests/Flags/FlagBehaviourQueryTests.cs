using HfClinic.Clinical.Picture;
using HfClinic.Records.Access;
using HfClinic.Records.Flags;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Flags;

/// <summary>Counts of flags over a period (invented data: the arithmetic only).</summary>
public class FlagBehaviourQueryTests
{
    private const string Gain = "volume.gain-3-days";
    private const string Held = "volume.held-reading";
    private static readonly DateOnly From = new(2026, 3, 2);
    private static readonly DateOnly Until = new(2026, 4, 1);

    [Theory, BothDatabases]
    public async Task Flags_are_counted_by_kind_and_by_how_soon_they_were_answered(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var soon = await clinic.EnrolWithGainAsync();
        var late = await clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "T-101" });
        await clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "T-102" });
        await AnswerAsync(clinic, soon);
        clinic.Clock.Advance(TimeSpan.FromDays(1));
        await AnswerAsync(clinic, late);

        var behaviour = await ReadAsync(clinic, From, Until);

        // Three people over 31 days.
        Assert.Equal(93 / 30.4375m, behaviour.PatientMonths);
        var gain = Assert.Single(behaviour.Kinds, kind => kind.RuleId == Gain);
        Assert.Equal((3, 1, 1, 0), (gain.Raised, gain.AnsweredSameDay, gain.AnsweredLater, gain.ClearedByData));
        Assert.Equal("Gain in 3 days", gain.Title);
        Assert.Equal(98.1855m, gain.Per100PatientMonths!.Value, 4);
        Assert.Equal(0.3333m, gain.ShareAnsweredSameDay!.Value, 4);
        Assert.Equal([Gain, "volume.gain-7-days", "volume.no-weight"], behaviour.Kinds.Select(kind => kind.RuleId));
        Assert.Equal((3, 0, 0, 3), (behaviour.Kinds[2].Raised, behaviour.Kinds[2].AnsweredSameDay, behaviour.Kinds[2].AnsweredLater, behaviour.Kinds[2].ClearedByData));
    }

    [Theory, BothDatabases]
    public async Task The_first_answer_counts_although_the_flag_was_opened_again(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.EnrolWithGainAsync();
        await AnswerAsync(clinic, patient);
        clinic.Clock.Advance(TimeSpan.FromDays(1));
        await clinic.WeighAsync(patient, Until, 77.0m);

        var gain = Assert.Single((await ReadAsync(clinic, From, Until)).Kinds, kind => kind.RuleId == Gain);

        Assert.Equal((1, 1, 0), (gain.Raised, gain.AnsweredSameDay, gain.AnsweredLater));
    }

    [Theory, BothDatabases]
    public async Task Held_weights_are_a_share_of_all_and_a_correction_is_not_counted_again(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var cancellation = TestContext.Current.CancellationToken;
        var patient = await clinic.EnrolAsync();
        foreach (var day in Enumerable.Range(2, 3))
        {
            await clinic.WeighAsync(patient, new DateOnly(2026, 3, day), 72.0m);
        }

        var held = await clinic.HoldWeightAsync(patient, new DateOnly(2026, 3, 31), 158.7m, HoldReason.PoundsTakenAsKilograms);
        await clinic.Get<DecideReading>().CorrectAsync(TestClinic.As(ClinicRole.Nurse), held, 72_000, "158.7 lb", "read off in pounds", cancellation);

        var behaviour = await ReadAsync(clinic, From, Until);

        Assert.Equal((4, 1, 0.25m), (behaviour.Weights, behaviour.HeldWeights, behaviour.ShareHeld));
        Assert.Equal(1, Assert.Single(behaviour.Kinds, kind => kind.RuleId == Held).ClearedByData);
    }

    [Theory, BothDatabases]
    public async Task Time_and_flags_outside_the_period_do_not_count(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var left = await clinic.EnrolWithGainAsync();
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-101", EnrolledOn = new DateOnly(2026, 3, 22) });
        await clinic.Get<LeaveClinic>().RunAsync(TestClinic.As(ClinicRole.Nurse), left, new DateOnly(2026, 3, 31), "moved", TestContext.Current.CancellationToken);

        var before = await ReadAsync(clinic, new(2026, 3, 1), new(2026, 3, 30));
        var during = await ReadAsync(clinic, new(2026, 3, 31), new(2026, 4, 9));

        Assert.Equal((30 + 9) / 30.4375m, before.PatientMonths);
        Assert.Empty(before.Kinds);
        Assert.Equal(1, before.Weights);
        Assert.Equal(10 / 30.4375m, during.PatientMonths);
        Assert.Contains(during.Kinds, kind => kind.RuleId == Gain);
    }

    [Theory, BothDatabases]
    public async Task An_empty_clinic_has_no_rates(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);

        var behaviour = await ReadAsync(clinic, From, Until);

        Assert.Equal((0m, 0), (behaviour.PatientMonths, behaviour.Weights));
        Assert.Null(behaviour.ShareHeld);
        Assert.Empty(behaviour.Kinds);
        Assert.Null(new FlagKind(Gain, "", 0, 0, 0, 0, 0).Per100PatientMonths);
        await Assert.ThrowsAsync<ArgumentException>(() => ReadAsync(clinic, Until, From));
    }

    private static Task<FlagBehaviour> ReadAsync(TestClinic clinic, DateOnly from, DateOnly until) =>
        clinic.Get<FlagBehaviourQuery>().ReadAsync(from, until, TestContext.Current.CancellationToken);

    private static async Task AnswerAsync(TestClinic clinic, long patient)
    {
        await using var db = clinic.OpenDb();
        var flag = await db.Flags.Where(f => f.PatientId == patient && f.RuleId == Gain).Select(f => f.Id).SingleAsync(TestContext.Current.CancellationToken);
        await clinic.Get<AnswerFlag>().RunAsync(TestClinic.As(ClinicRole.Nurse), flag, "spoken with her", TestContext.Current.CancellationToken);
    }
}
