using System.Collections.Immutable;
using HfClinic.SeedDemo.Persons;

namespace HfClinic.SeedDemo.History;

/// <summary>Invented dose histories; the ladders are ordinary tablet strengths (common practice, no source).</summary>
internal static class MedicineHistory
{
    /// <summary>A dose of a loop diuretic changed since this day would put the person under close watch.</summary>
    private const int LastDiureticChange = -22;

    private static readonly ImmutableArray<ImmutableArray<(string Medicine, decimal Milligrams, decimal Times)>> Loops =
    [
        [("furosemide", 20, 1), ("furosemide", 40, 1), ("furosemide", 40, 2), ("furosemide", 80, 2)],
        [("bumetanide", 0.5m, 1), ("bumetanide", 1, 1), ("bumetanide", 1, 2), ("bumetanide", 2, 2)],
        [("torasemide", 5, 1), ("torasemide", 10, 1), ("torasemide", 20, 1), ("torasemide", 40, 1)],
    ];

    private static readonly ImmutableArray<(string Medicine, decimal Times, ImmutableArray<decimal> Ladder)> BetaBlockers =
    [
        ("bisoprolol", 1, [1.25m, 2.5m, 3.75m, 5, 7.5m, 10]),
        ("carvedilol", 2, [3.125m, 6.25m, 12.5m, 25]),
        ("metoprolol succinate", 1, [25, 50, 100, 200]),
    ];

    private static readonly ImmutableArray<(string Medicine, decimal Times, ImmutableArray<decimal> Ladder)> ReninInhibitors =
    [
        ("ramipril", 2, [1.25m, 2.5m, 5]),
        ("enalapril", 2, [2.5m, 5, 10]),
        ("candesartan", 1, [4, 8, 16, 32]),
        ("sacubitril/valsartan", 2, [50, 100, 200]),
    ];

    public static ImmutableArray<Course> Draw(Chance chance, Person person)
    {
        var courses = ImmutableArray.CreateBuilder<Course>();
        Loop(chance, courses);
        var reduced = person.EjectionFraction <= 40;
        if (chance.Happens(reduced ? 0.9 : 0.5))
        {
            Climb(chance, courses, chance.Pick(BetaBlockers));
        }

        if (chance.Happens(reduced ? 0.9 : 0.5))
        {
            Climb(chance, courses, chance.Pick(ReninInhibitors));
        }

        Single(chance, courses, reduced ? 0.7 : 0.35, chance.Happens(0.6) ? "spironolactone" : "eplerenone", 25);
        Single(chance, courses, reduced ? 0.75 : 0.6, chance.Happens(0.5) ? "dapagliflozin" : "empagliflozin", 10);
        Single(chance, courses, person.HasAtrialFibrillation ? 0.3 : 0.05, "digoxin", chance.Happens(0.4) ? 0.0625m : 0.125m);
        return courses.ToImmutable();
    }

    private static void Loop(Chance chance, ImmutableArray<Course>.Builder courses)
    {
        var ladder = chance.Pick(Loops);
        var rung = chance.Below(3);
        var first = ladder[rung];
        var from = chance.Between(-420, -190);
        if (!chance.Happens(0.5))
        {
            courses.Add(new(first.Medicine, first.Milligrams, first.Times, from));
            return;
        }

        var changed = chance.Between(-150, LastDiureticChange);
        var second = ladder[chance.Happens(0.6) ? rung + 1 : Math.Max(0, rung - 1)];
        courses.Add(new(first.Medicine, first.Milligrams, first.Times, from, changed));
        courses.Add(new(second.Medicine, second.Milligrams, second.Times, changed, Reason: "As agreed at the visit"));
    }

    private static void Climb(
        Chance chance, ImmutableArray<Course>.Builder courses, (string Medicine, decimal Times, ImmutableArray<decimal> Ladder) medicine)
    {
        var from = chance.Between(-360, -150);
        var rungs = chance.Between(1, medicine.Ladder.Length);
        for (var rung = 0; rung < rungs; rung++)
        {
            var until = from + chance.Between(14, 60);
            var isLast = rung == rungs - 1 || until > LastDiureticChange;
            courses.Add(new(medicine.Medicine, medicine.Ladder[rung], medicine.Times, from, isLast ? null : until, rung == 0 ? null : "Next step"));
            if (isLast)
            {
                return;
            }

            from = until;
        }
    }

    private static void Single(Chance chance, ImmutableArray<Course>.Builder courses, double probability, string medicine, decimal milligrams)
    {
        var from = chance.Between(-360, -40);
        if (chance.Happens(probability))
        {
            courses.Add(new(medicine, milligrams, 1, from));
        }
    }
}
