using System.Collections.Immutable;
using HfClinic.Clinical.Values;
using HfClinic.Records.Medicines;
using HfClinic.SeedDemo.History;
using HfClinic.SeedDemo.Persons;
using HfClinic.SeedDemo.Weights;

namespace HfClinic.SeedDemo.Stories;

/// <summary>Makes a patient of a story: an ordinary past, and the story in the last three weeks.</summary>
internal static class StoryTelling
{
    /// <summary>People of stories have weighed themselves before the demo's morning is done.</summary>
    private const int LatestMinute = 430;

    public static DemoPatient Tell(Story story, int number)
    {
        var chance = Chance.For(number);
        var person = PersonOf(story, chance);
        var course = WeightCourse.Draw(chance, WeightModel.Still, story.Kilograms);
        var days = WeighingDays.Draw(chance, care: 14);
        var shown = course.Shown.Select((kilograms, i) => kilograms + story.Extra(i - course.Shown.Length + 1)).ToArray();
        var target = Weight.FromKilograms(Math.Round((decimal)(story.Kilograms + story.TargetAbove), 1));
        var readings = new HomeReadings(chance, person)
        {
            Punctuality = 6,
            NotAfterMinute = LatestMinute,
            SystolicShift = story.SystolicShift,
            Entries = story.Entries,
            Household = story.OthersOnScale,
        };
        return new DemoPatient
        {
            Person = person,
            Household = story.Household,
            Readings = readings.Draw(shown, day => day >= Story.Begins ? story.Weighs(day) : days[^(1 - day)], target),
            Symptoms = VisitHistory.EarlierSymptoms(chance),
            Targets = [new(story.TargetDay, target, "As seen at the visit")],
            Courses = CoursesOf(chance, person),
            Tests = BloodTestHistory.Draw(chance, person),
            Fractions = VisitHistory.Fractions(chance, person),
            Visits = VisitHistory.Visits(chance),
            Calls = VisitHistory.EarlierCalls(chance),
        };
    }

    private static Person PersonOf(Story story, Chance chance)
    {
        var person = PersonDrawing.Draw(chance, (story.FamilyName, story.GivenName, story.Sex), story.Kilograms);
        return person with
        {
            ScaleInPounds = story.ScaleInPounds,
            WeighsAtMinute = chance.Between(375, 415),
            Systolic = story.Systolic ?? Math.Max(person.Systolic, 106),
        };
    }

    /// <summary>Everybody in a story takes the same loop diuretic, so that its change can be told.</summary>
    private static ImmutableArray<Course> CoursesOf(Chance chance, Person person) =>
    [
        new("furosemide", 40, 1, -250),
        .. MedicineHistory.Draw(chance, person).Where(course => !LoopDiuretics.Includes(course.Medicine)),
    ];
}
