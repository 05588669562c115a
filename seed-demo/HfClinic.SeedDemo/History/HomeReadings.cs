using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.SeedDemo.Days;
using HfClinic.SeedDemo.Persons;

namespace HfClinic.SeedDemo.History;

/// <summary>What a person's devices at home send, day by day. Every weight passes the same screen as a typed one.</summary>
internal sealed class HomeReadings(Chance chance, Person person)
{
    private const int MinutesPerDay = 24 * 60;
    private double pressureMood;

    /// <summary>Minutes around the usual time at which the person weighs (standard deviation).</summary>
    public double Punctuality { get; init; } = 14;

    /// <summary>The latest minute of a weight.</summary>
    public int NotAfterMinute { get; init; } = 660;

    /// <summary>mmHg added to the usual systolic pressure on a day.</summary>
    public Func<int, int> SystolicShift { get; init; } = _ => 0;

    /// <summary>Entries that are not the person's weight as the scale showed it, by day.</summary>
    public ImmutableDictionary<int, Weight> Entries { get; init; } = ImmutableDictionary<int, Weight>.Empty;

    /// <summary>Weights of others who use the same scale.</summary>
    public ImmutableArray<Weight> Household { get; init; } = [];

    /// <param name="shown">Kilograms for each day; the last entry is day 0.</param>
    /// <param name="weighs">Whether the person weighs on a day.</param>
    /// <param name="target">The target weight the screen knows.</param>
    public ImmutableArray<Measured> Draw(double[] shown, Func<int, bool> weighs, Weight target)
    {
        var screen = new ReadingScreen(target);
        var measured = ImmutableArray.CreateBuilder<Measured>(shown.Length * 4);
        for (var i = 0; i < shown.Length; i++)
        {
            var day = i - shown.Length + 1;
            var minute = Math.Clamp(person.WeighsAtMinute + (int)chance.Normal(0, Punctuality), 190, NotAfterMinute);
            pressureMood = (0.8 * pressureMood) + chance.Normal(0, 3);
            if (weighs(day))
            {
                measured.Add(WeightOf(day, minute, shown[i], screen));
                Vitals(measured, day, minute + 2);
            }
        }

        return measured.ToImmutable();
    }

    private Measured WeightOf(int day, int minute, double kilograms, ReadingScreen screen)
    {
        var (weight, typed) = Entries.TryGetValue(day, out var entry)
            ? (entry, Wording.Weight(entry, WeightUnit.Kilograms))
            : AsShown(kilograms);
        var time = DateTime.MinValue.AddDays(DemoDays.History + day).AddMinutes(minute);
        var screened = screen.Take(time, weight, Household);
        return new(ReadingKind.Weight, day, minute, weight.Grams, typed, screened.Verdict == ScreenVerdict.Held
            ? screened.Reason ?? HoldReason.Unexplained
            : null);
    }

    private (Weight Weight, string Typed) AsShown(double kilograms)
    {
        if (!person.ScaleInPounds)
        {
            var shown = Math.Round((decimal)kilograms, 1);
            return (Weight.FromKilograms(shown), shown.ToString("0.0", CultureInfo.InvariantCulture) + " kg");
        }

        var pounds = Math.Round((decimal)kilograms * 1000 / Weight.GramsPerPound, 1);
        return (Weight.FromPounds(pounds), pounds.ToString("0.0", CultureInfo.InvariantCulture) + " lb");
    }

    private void Vitals(ImmutableArray<Measured>.Builder measured, int day, int minute)
    {
        Pressure(measured, day, minute, 0);
        measured.Add(new(ReadingKind.HeartRate, day, minute, Limited(person.Pulse, 4, 46, 110)));
        if (person.HasOximeter)
        {
            measured.Add(new(ReadingKind.OxygenSaturation, day, minute, Limited(96, 1.2, 90, 99)));
        }

        if (person.MeasuresInTheEvening && day < 0)
        {
            var evening = Math.Min(1140 + chance.Below(90), MinutesPerDay - 1);
            Pressure(measured, day, evening, 4);
            measured.Add(new(ReadingKind.HeartRate, day, evening, Limited(person.Pulse + 3, 4, 46, 112)));
        }
    }

    private void Pressure(ImmutableArray<Measured>.Builder measured, int day, int minute, int higher)
    {
        var systolic = Limited(person.Systolic + higher + SystolicShift(day) + pressureMood, 4, 70, 185);
        measured.Add(new(ReadingKind.SystolicPressure, day, minute, systolic));
        measured.Add(new(ReadingKind.DiastolicPressure, day, minute, Limited(systolic * 0.61, 3, 42, systolic - 15)));
    }

    private int Limited(double mean, double deviation, int lowest, int highest) =>
        (int)Math.Clamp(Math.Round(chance.Normal(mean, deviation)), lowest, highest);
}
