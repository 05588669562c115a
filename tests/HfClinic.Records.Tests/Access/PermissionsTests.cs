using HfClinic.Records.Access;
using HfClinic.Records.Chart;
using HfClinic.Records.Contacts;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Protocol;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Records.Tests.Access;

/// <summary>Each verb, asked by each role about a patient that does not exist: a role that may not is turned away before anything is looked up.</summary>
public class PermissionsTests
{
    private static readonly DateOnly Day = new(2026, 3, 31);

    private static readonly Dictionary<string, (Capability Needed, Func<IServiceProvider, Actor, Task> Run)> Verbs = new()
    {
        ["open a chart"] = (Capability.ReadCharts, (s, a) => s.GetRequiredService<ChartQuery>().OpenAsync(a, 0)),
        ["mark flags seen"] = (Capability.ReadCharts, (s, a) => s.GetRequiredService<MarkFlagsSeen>().RunAsync(a, 0)),
        ["record readings"] = (Capability.RecordReadings, (s, a) => s.GetRequiredService<RecordReadings>().RunAsync(a, 0,
            new TakenReadings { LocalTime = Day.ToDateTime(default), HeartRate = 70 })),
        ["confirm a reading"] = (Capability.DecideReadings, (s, a) => s.GetRequiredService<DecideReading>().ConfirmAsync(a, 0, "x")),
        ["correct a reading"] = (Capability.DecideReadings, (s, a) => s.GetRequiredService<DecideReading>().CorrectAsync(a, 0, 70_000, null, "x")),
        ["strike out a reading"] = (Capability.DecideReadings, (s, a) => s.GetRequiredService<DecideReading>().StrikeOutAsync(a, 0, "x")),
        ["strike out symptoms"] = (Capability.DecideReadings, (s, a) => s.GetRequiredService<StrikeOutSymptoms>().RunAsync(a, 0, "x")),
        ["edit a patient"] = (Capability.EnrolPatients, (s, a) => s.GetRequiredService<EditPatient>().RunAsync(a, 0, 0, ClinicSteps.Someone)),
        ["discharge"] = (Capability.EnrolPatients, (s, a) => s.GetRequiredService<LeaveClinic>().RunAsync(a, 0, Day, "x")),
        ["take back"] = (Capability.EnrolPatients, (s, a) => s.GetRequiredService<LeaveClinic>().ReturnAsync(a, 0)),
        ["record a contact"] = (Capability.RecordContacts, (s, a) => s.GetRequiredService<RecordContact>().RunAsync(a, 0, ContactOutcome.Spoke, "x", [])),
        ["answer a flag"] = (Capability.AnswerFlags, (s, a) => s.GetRequiredService<AnswerFlag>().RunAsync(a, 0, "x")),
        ["put a flag off"] = (Capability.AnswerFlags, (s, a) => s.GetRequiredService<PutOffFlag>().RunAsync(a, 0, Day.AddDays(1), "x")),
        ["ask"] = (Capability.AskQuestions, (s, a) => s.GetRequiredService<AskQuestion>().RunAsync(a, 0, "x")),
        ["note an answer as read"] = (Capability.AskQuestions, (s, a) => s.GetRequiredService<AnswerQuestion>().MarkSeenAsync(a, 0)),
        ["answer a question"] = (Capability.AnswerQuestions, (s, a) => s.GetRequiredService<AnswerQuestion>().RunAsync(a, 0, "x")),
        ["set a target weight"] = (Capability.SetTargetWeight, (s, a) => s.GetRequiredService<SetTargetWeight>().RunAsync(a, 0, new(70_000), Day, null)),
        ["strike out a target weight"] = (Capability.SetTargetWeight, (s, a) => s.GetRequiredService<SetTargetWeight>().StrikeOutAsync(a, 0, "x")),
        ["set a threshold"] = (Capability.SetThresholds, (s, a) => s.GetRequiredService<SetPatientThreshold>().RunAsync(a, 0, "silence.days", 5, true, "x")),
        ["remove a threshold"] = (Capability.SetThresholds, (s, a) => s.GetRequiredService<SetPatientThreshold>().RemoveAsync(a, 0, "silence.days")),
        ["set a dose"] = (Capability.ChangeMedicines, (s, a) => s.GetRequiredService<MedicineCourses>().SetAsync(a, 0, new("furosemide", 40, 1), Day, null)),
        ["stop a medicine"] = (Capability.ChangeMedicines, (s, a) => s.GetRequiredService<MedicineCourses>().StopAsync(a, 0, "furosemide", Day, "x")),
        ["strike out a dose"] = (Capability.ChangeMedicines, (s, a) => s.GetRequiredService<MedicineCourses>().StrikeOutAsync(a, 0, "x")),
        ["set roles"] = (Capability.ManagePeople, (s, a) => s.GetRequiredService<People>().SetRolesAsync(a, Guid.Empty, [ClinicRole.Nurse])),
        ["switch a person off"] = (Capability.ManagePeople, (s, a) => s.GetRequiredService<People>().SetActiveAsync(a, Guid.Empty, false)),
        ["set a password"] = (Capability.ManagePeople, (s, a) => s.GetRequiredService<People>().SetPasswordAsync(a, Guid.Empty, "x")),
    };

    /// <summary>Who may do what, as the clinic agreed it: written out here, so that the table in the program cannot change unseen.</summary>
    private static readonly Dictionary<Capability, ClinicRole[]> Agreed = new()
    {
        [Capability.ReadCharts] = [ClinicRole.Nurse, ClinicRole.Prescriber, ClinicRole.Coordinator],
        [Capability.RecordReadings] = [ClinicRole.Nurse, ClinicRole.Prescriber],
        [Capability.DecideReadings] = [ClinicRole.Nurse, ClinicRole.Prescriber],
        [Capability.EnrolPatients] = [ClinicRole.Nurse, ClinicRole.Prescriber, ClinicRole.Coordinator],
        [Capability.RecordContacts] = [ClinicRole.Nurse, ClinicRole.Prescriber, ClinicRole.Coordinator],
        [Capability.AnswerFlags] = [ClinicRole.Nurse, ClinicRole.Prescriber],
        [Capability.AskQuestions] = [ClinicRole.Nurse, ClinicRole.Prescriber, ClinicRole.Coordinator],
        [Capability.AnswerQuestions] = [ClinicRole.Prescriber],
        [Capability.SetTargetWeight] = [ClinicRole.Prescriber],
        [Capability.SetThresholds] = [ClinicRole.Prescriber],
        [Capability.ChangeMedicines] = [ClinicRole.Prescriber],
        [Capability.ManagePeople] = [ClinicRole.Administrator],
        [Capability.ReadClinicFigures] = [ClinicRole.Prescriber, ClinicRole.Coordinator],
    };

    [Fact]
    public void Each_capability_is_held_by_the_agreed_roles_and_no_other() => Assert.All(Agreed, agreed =>
        Assert.Equal(agreed.Value, Enum.GetValues<ClinicRole>().Where(role => Permissions.Allow([role], agreed.Key))));

    [Theory, BothDatabases]
    public async Task Each_verb_lets_in_the_agreed_roles_and_no_other(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var scope = clinic.Services.CreateAsyncScope();
        var wrong = new List<string>();
        foreach (var (verb, (needed, run)) in Verbs)
        {
            foreach (var role in Enum.GetValues<ClinicRole>())
            {
                var outcome = await Record.ExceptionAsync(() => run(scope.ServiceProvider, TestClinic.As(role)));
                var letIn = outcome is NotFoundException;
                if (letIn != Agreed[needed].Contains(role) || (!letIn && outcome is not NotAllowedException))
                {
                    wrong.Add($"{verb} by {role}: {outcome?.GetType().Name ?? "done"}");
                }
            }
        }

        Assert.Empty(wrong);
    }
}
