using HfClinic.Clinical.Values;
using HfClinic.Records.Contacts;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Protocol;
using HfClinic.Records.Questions;
using HfClinic.Records.Readings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.SeedDemo.Telling;

/// <summary>The things that happen in stories.</summary>
internal static class Then
{
    private static readonly TimeOnly Morning = new(8, 20);

    /// <summary>The rules read the record in the morning.</summary>
    public static Moment Look(int day) => new(day, Morning, desk => desk.LookAsync());

    /// <summary>The rules read the record on each of these mornings.</summary>
    public static IEnumerable<Moment> LookDaily(int from, int until) => Enumerable.Range(from, until - from + 1).Select(Look);

    /// <summary>The nurse rings.</summary>
    public static Moment Call(int day, TimeOnly at, ContactOutcome outcome, string note) => new(day, at, desk =>
        desk.Verb<RecordContact>().RunAsync(desk.Nurse, desk.PatientId, outcome, note, [], desk.Cancellation));

    /// <summary>The nurse rings, and that settles every open flag.</summary>
    public static Moment CallAndSettle(int day, TimeOnly at, string note) => new(day, at, async desk =>
        await desk.Verb<RecordContact>().RunAsync(
            desk.Nurse, desk.PatientId, ContactOutcome.Spoke, note, await desk.OpenFlagsAsync(), desk.Cancellation));

    /// <summary>The nurse puts a flag off.</summary>
    public static Moment PutOff(int day, TimeOnly at, string ruleId, int until, string reason) => new(day, at, async desk =>
        await desk.Verb<PutOffFlag>().RunAsync(
            desk.Nurse, await desk.FlagAsync(ruleId), desk.Days.Date(until), reason, desk.Cancellation));

    /// <summary>The nurse looks at the open flags.</summary>
    public static Moment SeeFlags(int day, TimeOnly at) => new(day, at, desk =>
        desk.Verb<MarkFlagsSeen>().RunAsync(desk.Nurse, desk.PatientId, desk.Cancellation));

    /// <summary>The nurse asks the prescribers about a flag.</summary>
    public static Moment Ask(int day, TimeOnly at, string ruleId, string question) => new(day, at, async desk =>
        await desk.Verb<AskQuestion>().RunAsync(
            desk.Nurse, desk.PatientId, question, await desk.FlagAsync(ruleId), desk.Cancellation));

    /// <summary>The cardiologist answers the open question.</summary>
    public static Moment Answer(int day, TimeOnly at, string answer) => new(day, at, async desk =>
        await desk.Verb<AnswerQuestion>().RunAsync(desk.Cardiologist, await desk.OpenQuestionAsync(), answer, desk.Cancellation));

    /// <summary>The patient calls in symptoms.</summary>
    public static Moment Tells(int day, TimeOnly at, Symptoms symptoms, string note) => new(day, at, desk =>
        desk.Verb<RecordReadings>().RunAsync(
            desk.Nurse,
            desk.PatientId,
            new TakenReadings { LocalTime = desk.Days.Date(day).ToDateTime(at), Symptoms = symptoms, Note = note },
            desk.Cancellation));

    /// <summary>The cardiologist sets a dose.</summary>
    public static Moment Dose(int day, TimeOnly at, string medicine, decimal milligrams, decimal timesDaily, string reason) => new(day, at, desk =>
        desk.Verb<MedicineCourses>().SetAsync(
            desk.Cardiologist, desk.PatientId, new(medicine, milligrams, timesDaily), desk.Days.Date(day), reason, desk.Cancellation));

    /// <summary>The cardiologist sets a target weight.</summary>
    public static Moment TargetWeight(int day, TimeOnly at, decimal kilograms, string reason) => new(day, at, desk =>
        desk.Verb<SetTargetWeight>().RunAsync(
            desk.Cardiologist, desk.PatientId, Weight.FromKilograms(kilograms), desk.Days.Date(day), reason, desk.Cancellation));

    /// <summary>The cardiologist sets a threshold for this patient.</summary>
    public static Moment OwnThreshold(int day, TimeOnly at, string key, decimal value, string reason) => new(day, at, desk =>
        desk.Verb<SetPatientThreshold>().RunAsync(
            desk.Cardiologist, desk.PatientId, key, value, isOn: true, reason, desk.Cancellation));

    /// <summary>The nurse notes a discharge from hospital on the day before.</summary>
    public static Moment DischargeNoted(int day, TimeOnly at) => new(day, at, async desk =>
    {
        var patient = await desk.ReadAsync(db => db.Patients.AsNoTracking().SingleAsync(p => p.Id == desk.PatientId, desk.Cancellation));
        var details = PatientDetails.Of(patient) with { DischargedFromHospitalOn = desk.Days.Date(day - 1) };
        await desk.Verb<EditPatient>().RunAsync(desk.Nurse, desk.PatientId, patient.Version, details, desk.Cancellation);
    });

    /// <summary>The nurse corrects the held reading.</summary>
    public static Moment Correct(int day, TimeOnly at, Weight weight, string asTyped, string reason) => new(day, at, async desk =>
        await desk.Verb<DecideReading>().CorrectAsync(
            desk.Nurse, await desk.HeldReadingAsync(), weight.Grams, asTyped, reason, desk.Cancellation));

    /// <summary>The nurse strikes the held reading out.</summary>
    public static Moment StrikeOut(int day, TimeOnly at, string reason) => new(day, at, async desk =>
        await desk.Verb<DecideReading>().StrikeOutAsync(desk.Nurse, await desk.HeldReadingAsync(), reason, desk.Cancellation));
}
