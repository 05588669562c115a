using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// A step was done and potassium or creatinine are not yet back: due on day 7 and late after day 14; for an MRA due on days 7, 28, 56 and
/// 84, then every 120 days, late at 180. Sources: Postgraduate Medical Journal review tables, NHS Specialist Pharmacy Service; the
/// intervals are a default of this program.
/// </summary>
public sealed class StepDoneLabDue : TitrationRule
{
    public override string Id => "titration.lab-due";

    public override string Title => "Blood test due after a step";

    public override ImmutableArray<string> SourceKeys { get; } = ["pmj-review", "sps-monitoring", "clinic-default"];

    public override IEnumerable<Finding> Read(TitrationAssessment assessment, PatientPicture picture, ClinicProtocol protocol) =>
        assessment.Classes.Where(reading => reading.Taken is not null).Select(reading => Read(reading, picture, protocol));

    private Finding Read(ClassTitration reading, PatientPicture picture, ClinicProtocol protocol)
    {
        var taken = reading.Taken!;
        if (LabSchedule.For(taken.Match.Class!.Value) is not { } schedule || !IsAfter(schedule.Only, reading))
        {
            return Clear(reading);
        }

        var tested = LastTested(picture);
        return DueDay(schedule, taken.Since, tested, picture.AsOf, protocol) is not { } due ? Clear(reading)
            : Fires(
                reading,
                due.Late ? Urgency.ThisWeek : Urgency.NextVisit,
                Statement(taken, due.On, due.Late, tested),
                $"due {Wording.Day(due.On)}, {Why(schedule, taken)}");
    }

    /// <summary>The day a test is due that has not been met; null when there is none.</summary>
    private static (DateOnly On, bool Late)? DueDay(LabSchedule schedule, DateOnly step, DateOnly? tested, DateOnly asOf, ClinicProtocol protocol)
    {
        var number = schedule.DueDays.Count(due => step.AddDays(due) <= asOf);
        if (number > 0 && !(tested >= CountsFrom(schedule, number - 1, step)))
        {
            var passed = step.AddDays(schedule.DueDays[number - 1]);
            return (passed, protocol["labs.late-after-due-days"].IsMetBy(asOf.DayNumber - passed.DayNumber));
        }

        var allPassed = number == schedule.DueDays.Length;
        var age = asOf.DayNumber - tested.GetValueOrDefault(asOf).DayNumber;
        return allPassed && schedule.ThenStable && protocol["labs.stable-due-days"].IsMetBy(age)
            ? (tested!.Value.AddDays((int)protocol["labs.stable-due-days"].Value), protocol["labs.stable-late-days"].IsMetBy(age))
            : null;
    }

    /// <summary>A test serves the due day it is nearest to; the first due day only from that day on.</summary>
    private static DateOnly CountsFrom(LabSchedule schedule, int due, DateOnly step) => step.AddDays(
        due == 0 ? schedule.DueDays[0] : (schedule.DueDays[due - 1] + schedule.DueDays[due] + 1) / 2);

    /// <summary>The last day up to which both potassium and creatinine (or eGFR) are known.</summary>
    private static DateOnly? LastTested(PatientPicture picture)
    {
        var potassium = Last(picture, "potassium");
        var renal = new[] { Last(picture, "creatinine"), Last(picture, "egfr") }.Max();
        return potassium is null || renal is null ? null : potassium < renal ? potassium : renal;
    }

    private static DateOnly? Last(PatientPicture picture, string analyte) => picture.BloodTests
        .Where(test => test.Analyte == analyte && test.Day <= picture.AsOf)
        .Max(test => (DateOnly?)test.Day);

    private static bool IsAfter(LabAfter only, ClassTitration reading) =>
        only == LabAfter.EachStep || reading.Taken!.IsStart || reading.State == TitrationState.AtTarget;

    private static string Statement(TakenMedicine taken, DateOnly due, bool late, DateOnly? tested)
    {
        var last = tested is { } day ? $"last on {Wording.Day(day)}" : "none on record";
        return $"Potassium and creatinine {(late ? "late" : "due")} since {Wording.Day(due)}: {taken.Words} since {Wording.Day(taken.Since)}; {last}";
    }

    private static string Why(LabSchedule schedule, TakenMedicine taken) =>
        $"after {(taken.IsStart ? "the start" : "the step")} on {Wording.Day(taken.Since)} (days {string.Join(", ", schedule.DueDays)}{(schedule.ThenStable ? ", then at intervals" : "")})";
}
