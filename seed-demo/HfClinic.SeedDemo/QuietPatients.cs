using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Values;
using HfClinic.SeedDemo.Days;
using HfClinic.SeedDemo.History;
using HfClinic.SeedDemo.Persons;
using HfClinic.SeedDemo.Weights;

namespace HfClinic.SeedDemo;

/// <summary>
/// The people between the stories. Half of them move as patients do (<see cref="WeightModel.Lifelike"/>), half more evenly.
/// In a demo of the usual size each is drawn again until the rules have nothing new to say of the last days, so that the
/// stories stand out; further people are taken as they are drawn.
/// </summary>
internal sealed class QuietPatients(DemoDays days, ClinicProtocol protocol)
{
    /// <summary>Up to this number of patients everybody outside the stories is quiet.</summary>
    public const int UsualSize = 240;

    private const int MostDraws = 200;
    private const string OldTarget = "volume.target-old";

    /// <param name="number">Counted over all patients of the demo.</param>
    /// <param name="place">Counted over the people between the stories.</param>
    public DemoPatient Draw(int number, int place)
    {
        for (var attempt = 0; attempt < MostDraws; attempt++)
        {
            var patient = Draw(Chance.For(number, attempt), place);
            if (number >= UsualSize || IsQuiet(patient))
            {
                return patient;
            }
        }

        throw new InvalidOperationException($"No quiet course was found for patient {number} in {MostDraws} draws.");
    }

    private static DemoPatient Draw(Chance chance, int place)
    {
        var person = PersonDrawing.Draw(chance, place < UnusualNames.All.Length ? UnusualNames.All[place] : null);
        var lifelike = place % 2 == 0;
        var course = WeightCourse.Draw(chance, lifelike ? WeightModel.Lifelike : WeightModel.Even, person.Kilograms);
        var weighed = WeighingDays.Draw(chance, lifelike ? 14 : 22);
        var targetDay = chance.Happens(0.13) ? chance.Between(-170, -95) : chance.Between(-80, -10);
        var target = Weight.FromKilograms(Math.Round((decimal)course.MassOn(targetDay) * 2) / 2);
        var first = Weight.FromKilograms(Math.Round((decimal)course.Mass[0] * 2) / 2);
        var weighs = place % 24 != 7;
        var left = place % 60 == 31;
        return new DemoPatient
        {
            Person = person,
            EnrolledDay = -chance.Between(185, 900),
            WeighsAtHome = weighs,
            LeftDay = left ? -chance.Between(20, 60) : null,
            Readings = weighs && !left ? new HomeReadings(chance, person).Draw(course.Shown, day => weighed[^(1 - day)], target) : [],
            Symptoms = VisitHistory.EarlierSymptoms(chance),
            Targets = [new(-185, first, "At enrolment"), new(targetDay, target, "As seen at the visit")],
            Courses = MedicineHistory.Draw(chance, person),
            Tests = BloodTestHistory.Draw(chance, person),
            Fractions = VisitHistory.Fractions(chance, person),
            Visits = VisitHistory.Visits(chance),
            Calls = VisitHistory.EarlierCalls(chance),
        };
    }

    /// <summary>Whether nothing but an old target weight shows, whatever the time of day and in the days around.</summary>
    private bool IsQuiet(DemoPatient patient) =>
        patient.LeftDay is not null
        || ((int LastReading, int AsOf)[])[(0, 1), (-1, 0), (-2, -1)] is var looks
        && looks.All(look => RuleBook.Assess(PictureOf(patient, look.LastReading, look.AsOf), protocol)
            .All(finding => finding.Outcome != Outcome.Fires || finding.RuleId == OldTarget));

    private PatientPicture PictureOf(DemoPatient patient, int lastReading, int asOf) => new()
    {
        AsOf = days.Date(asOf),
        EnrolledOn = days.Date(patient.EnrolledDay),
        WeighsAtHome = patient.WeighsAtHome,
        Weights =
        [
            .. patient.Readings.Where(reading => reading.Kind == ReadingKind.Weight && reading.Day <= lastReading).Select((reading, i) => new WeightReading(
                i, LocalTime(reading), new Weight(reading.Value), reading.Held is { } reason ? new(reason, LocalTime(reading)) : null)),
        ],
        Vitals =
        [
            .. patient.Readings.Where(reading => reading.Kind != ReadingKind.Weight && reading.Day <= lastReading)
                .Select((reading, i) => new VitalReading(i, reading.Kind, LocalTime(reading), reading.Value)),
        ],
        TargetWeights = [.. patient.Targets.Select((target, i) => new TargetWeight(i, days.Date(target.Day), target.Weight, ""))],
        DoseCourses =
        [
            .. patient.Courses.Select((course, i) => new DoseCourse(
                i, course.Medicine, course.Milligrams, course.TimesDaily, days.Date(course.From), course.Until is { } until ? days.Date(until) : null)),
        ],
    };

    private DateTime LocalTime(Measured reading) => days.Date(reading.Day).ToDateTime(TimeOnly.MinValue).AddMinutes(reading.Minute);
}
