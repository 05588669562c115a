using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Benchmarks.Trend;

/// <summary>One day of a simulated person as the rules see it.</summary>
/// <param name="Raw">Grams as entered.</param>
/// <param name="Screened">Grams if accepted at entry.</param>
internal readonly record struct SimulatedDay(int? Raw, int? Screened, TrendDay Trend)
{
    /// <summary>
    /// Runs a person through entry checks and trend. The target weight is the start weight and is set to the filtered weight
    /// every 90 days.
    /// </summary>
    public static SimulatedDay[] Run(SimulatedPatient patient)
    {
        var start = Weight.FromKilograms((decimal)patient.StartKilograms);
        var screen = new ReadingScreen(start);
        var model = TrendModel.For(start);
        var state = TrendState.Start(model);
        double target = model.ReferenceKilograms;
        var time = new DateTime(2026, 1, 5, 7, 0, 0);
        var days = new SimulatedDay[patient.Entered.Length];
        for (int day = 0; day < days.Length; day++, time = time.AddDays(1))
        {
            if (day > 0 && day % 90 == 0)
            {
                target = days[day - 1].Trend.State.NextDay(model).Expected;
            }

            int? entered = patient.Entered[day];
            int? accepted = entered is int grams && screen.Take(time, new Weight(grams), []).Verdict <= ScreenVerdict.AcceptedAsStep ? entered : null;
            days[day] = new SimulatedDay(entered, accepted, state.Advance(model, accepted, target));
        }

        return days;
    }
}
