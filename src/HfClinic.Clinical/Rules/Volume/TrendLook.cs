using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>The individual trend on the latest day that has an accepted weight, with its words.</summary>
/// <param name="Latest">The weight of that day.</param>
/// <param name="Day">The trend at its end.</param>
public sealed record TrendLook(PatientPicture Picture, WeightReading Latest, TrendDay Day)
{
    /// <summary>Fluid against the person's own baseline, in kg.</summary>
    public double Fluid => Day.State.Fluid;

    /// <summary>The weight with the scatter taken out, less the target that holds now, in kg; null without a target.</summary>
    public double? Excess => Day.State.Expected - (Picture.TargetWeight?.Weight.Grams / 1000.0);

    /// <summary>The day on which the fluid part last stood on the other side of the baseline, or else the first day.</summary>
    public DateOnly LastAtBaseline
    {
        get
        {
            var day = Latest.Day;
            while (day > Picture.Trend.FirstDay && Math.Sign(Picture.Trend.On(day)!.Value.State.Fluid) == Math.Sign(Fluid))
            {
                day = day.AddDays(-1);
            }

            return day;
        }
    }

    /// <summary>
    /// The weight the person is compared with, and its day: the scatter-free weight when the fluid last stood at the baseline,
    /// or today's body mass where that lies further off (a baseline that moves the other way).
    /// </summary>
    private (double Kilograms, DateOnly Day) Baseline
    {
        get
        {
            var then = Picture.Trend.On(LastAtBaseline)!.Value.State.Expected;
            return Math.Sign(Fluid) * (Day.State.Expected - then) < Math.Abs(Fluid) ? (Day.State.Mass, Latest.Day) : (then, LastAtBaseline);
        }
    }

    /// <summary>"4.1 kg above own baseline over 6 days; day-to-day scatter 0.5 kg".</summary>
    public string FluidWords(ClinicProtocol protocol)
    {
        var days = Latest.Day.DayNumber - LastAtBaseline.DayNumber;
        var side = Fluid > 0 ? "above" : "below";
        var until = Latest.Day == Picture.AsOf ? "" : $" up to {Wording.ShortDay(Latest.Day)}";
        var step = Enumerable.Range(0, days + 1).Select(back => Latest.Day.AddDays(-back))
            .Where(day => Picture.Trend.On(day)?.Use == DayUse.Step)
            .Select(day => $"; in one step on {Wording.ShortDay(day)}: another scale or a true change")
            .FirstOrDefault();
        return $"{Size(Day.State.Expected - Baseline.Kilograms, protocol)} {side} own baseline over {Wording.Days(days)}{until}; day-to-day scatter {Scatter(protocol)}{step}";
    }

    /// <summary>What the fluid part is compared with, in words.</summary>
    public string FluidLimit(Threshold limit, ClinicProtocol protocol) => string.Create(
        CultureInfo.InvariantCulture,
        $"more than {Size((double)limit.Value * Picture.Trend.UsualFluidOn(Latest.Day) ?? 0, protocol)} of fluid, {limit.Value:0.0#} times this person's usual coming and going");

    /// <summary>The own baseline, the trend and its scatter as evidence, beside the weight that raised it.</summary>
    public IEnumerable<Evidence> FluidEvidence(ClinicProtocol protocol, Evidence weight)
    {
        var unit = protocol.WeightUnit;
        yield return new Evidence("Own baseline", Wording.Weight(Grams(Baseline.Kilograms), unit), Baseline.Day);
        yield return weight;
        yield return new Evidence("Weight with the scatter taken out", Wording.Weight(Grams(Day.State.Expected), unit), Latest.Day);
        yield return new Evidence("Of it counted as fluid", $"{Wording.Change(Grams(Fluid), unit)} {Wording.Symbol(unit)}", Latest.Day);
        yield return new Evidence("Day-to-day scatter", Scatter(protocol), Latest.Day);
        yield return Slope(protocol);
    }

    /// <summary>The slope in kg or lb per week, with its 95 % interval, as evidence.</summary>
    public Evidence Slope(ClinicProtocol protocol)
    {
        var (perWeek, low, high) = Day.WeeklySlope;
        var unit = protocol.WeightUnit;
        var words = $"{Change(perWeek)} {Wording.Symbol(unit)} (95 % interval {Change(low)} to {Change(high)})";
        return new Evidence("Change per week", words, Latest.Day);

        string Change(double kilograms) => Wording.Change(Grams(kilograms), unit);
    }

    /// <summary>An amount without its sign: "1.8 kg".</summary>
    public static string Size(double kilograms, ClinicProtocol protocol) => Wording.Weight(Grams(Math.Abs(kilograms)), protocol.WeightUnit);

    private string Scatter(ClinicProtocol protocol) => Size(Picture.Trend.ScatterOn(Latest.Day) ?? 0, protocol);

    /// <summary>Kilograms rounded to whole grams.</summary>
    public static Weight Grams(double kilograms) => new((int)Math.Round(kilograms * 1000));
}
