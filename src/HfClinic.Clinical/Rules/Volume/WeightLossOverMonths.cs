using System.Collections.Immutable;
using System.Globalization;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// 5 % or more of body weight lost over 6 months with poor appetite told in the last 60 days: a question of wasting, apart
/// from fluid, and so not asked while a loss has signs of over-diuresis beside it. Medians of a fortnight are compared, of
/// at least 3 weights each. Source: an article for patients; the days are a default of this program.
/// </summary>
public sealed class WeightLossOverMonths : VolumeRule
{
    private const string LossKey = "wasting.loss-percent";
    private const string AppetiteKey = "wasting.appetite-days";
    private const int HalfYear = 182;
    private const int Fortnight = 14;
    private const int FewestWeights = 3;

    public override string Id => "volume.loss-6-months";

    public override string Title => "Loss of weight over months";

    public override ImmutableArray<string> SourceKeys { get; } = ["weight-loss-article", "clinic-default"];

    /// <summary>A month: a default of this program.</summary>
    public override int JoinDays => 30;

    public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        if (!HasWeights(picture) || !protocol[LossKey].IsOn || !protocol[AppetiteKey].IsOn)
        {
            return [];
        }

        var told = picture.Symptoms.LastOrDefault(report => report.Symptoms.HasFlag(Symptoms.PoorAppetite)
            && protocol[AppetiteKey].IsMetBy(picture.AsOf.DayNumber - report.Day.DayNumber));
        if (told is null)
        {
            return [Answer(Outcome.Clear)];
        }

        return Median(picture, 0) is not { } now ? [CannotTell($"fewer than {FewestWeights} weights in the last {Wording.Days(Fortnight)}")]
            : Median(picture, HalfYear) is not { } then ? [CannotTell("no weights of 6 months ago")]
            : [Compare(then, now, told, picture, protocol)];
    }

    private Finding Compare(Weight then, Weight now, SymptomReport told, PatientPicture picture, ClinicProtocol protocol)
    {
        var unit = protocol.WeightUnit;
        var lost = then - now;
        var percent = 100m * lost.Grams / then.Grams;
        var fires = protocol[LossKey].IsMetBy(percent) && !FluidLoss.IsPossibleOverDiuresis(picture, protocol);
        return Answer(fires ? Outcome.Fires : Outcome.Clear) with
        {
            Urgency = Urgency.NextVisit,
            Statement = fires
                ? string.Create(
                    CultureInfo.InvariantCulture,
                    $"Lost {Wording.Weight(lost, unit)} ({percent:0.#} %) over 6 months, poor appetite reported {Wording.ShortDay(told.Day)}: a question of wasting, apart from fluid")
                : "",
            Limit = string.Create(CultureInfo.InvariantCulture, $"{protocol[LossKey].Value:0.##} % or more over 6 months, with poor appetite"),
            Magnitude = lost.Grams,
            Evidence =
            [
                new Evidence("Usual weight 6 months ago", Wording.Weight(then, unit), picture.AsOf.AddDays(-HalfYear)),
                new Evidence("Usual weight now", Wording.Weight(now, unit), picture.AsOf, RaisedIt: fires),
                new Evidence("Reported", SymptomWords.List(Symptoms.PoorAppetite), told.Day),
            ],
        };
    }

    /// <summary>The median of the fortnight that ends so many days back; the one of 6 months ago has a fortnight on either side.</summary>
    private static Weight? Median(PatientPicture picture, int back)
    {
        var middle = picture.AsOf.AddDays(-back);
        double[] grams =
        [
            .. DaySeries.From(picture.Weights)
                .Where(weight => weight.Day > middle.AddDays(-Fortnight) && weight.Day < middle.AddDays(back == 0 ? 1 : Fortnight))
                .Select(weight => (double)weight.Grams),
        ];
        return grams.Length < FewestWeights ? null : new Weight((int)Math.Round(SampleMedian.Of(grams)));
    }
}
