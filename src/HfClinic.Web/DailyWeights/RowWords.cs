using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.DailyWeights;

namespace HfClinic.Web.DailyWeights;

/// <summary>A row of the list in words and figures.</summary>
/// <param name="today">The clinic day.</param>
public sealed class RowWords(DailyListRow row, DateOnly today, WeightUnit unit, Func<DateTime, DateTime> toLocal)
{
    private static readonly Dictionary<int, string[]> GainRules = new()
    {
        [1] = [new GainInOneDayTwoPounds().Id, new GainInOneDayThreePounds().Id],
        [3] = [new GainInThreeDays().Id],
        [7] = [new GainInSevenDays().Id],
    };

    private static readonly string Loss = new LossInSevenDays().Id;
    private static readonly string Above = new AboveTarget().Id;

    private DailyWeightRow Person => row.Person;

    /// <summary>A reading of today that is set aside, while no other stands for today.</summary>
    private WeightReading? HeldToday => Person.Summary.LastWeightDay == today ? null : row.Strip.Held.LastOrDefault(held => held.Day == today);

    /// <summary>Whether the figures are of today.</summary>
    public bool IsOfToday => Person.Summary.LastWeightDay == today;

    /// <summary>The weight, or why there is none.</summary>
    public string Weight => HeldToday is not null ? "held"
        : Person.Summary.IsSilent || Person.Summary.LastGrams is not { } grams ? "none"
        : Wording.WeightNumber(new Weight(grams), unit);

    /// <summary>The time of today's weight, or the day of the last one.</summary>
    public string When => HeldToday is { } held ? Wording.Time(held.LocalTime)
        : Person.Summary is { LastWeightAt: { } at, LastWeightDay: { } day } ? day == today ? Wording.Time(toLocal(at)) : Wording.ShortDay(day)
        : "never";

    /// <summary>Whether changes can be shown: not for those silent, nor while today's reading is set aside.</summary>
    public bool HasChanges => HeldToday is null && !Person.Summary.IsSilent;

    /// <summary>The change over 1, 3 or 7 days in grams, and whether it raised an open flag. A loss that raised one is shown as measured by its rule.</summary>
    public (int? Grams, bool Raised) Change(int days)
    {
        if (!HasChanges)
        {
            return (null, false);
        }

        if (days == 7 && Met(Loss) is not null && Lost is { } lost)
        {
            return (lost, true);
        }

        var grams = days switch { 1 => Person.Summary.Gain1Day, 3 => Person.Summary.Gain3Days, _ => Person.Summary.Gain7Days };
        return (grams, grams is not null && GainRules[days].Any(rule => Met(rule) is not null));
    }

    /// <summary>The latest weight against the highest of the 7 days before, as the rule about loss measures it.</summary>
    private int? Lost => WeightSummary.Of(new PatientPicture { AsOf = today, EnrolledOn = Person.EnrolledOn, Weights = [.. row.Strip.Days] }).Loss(7)?.Difference.Grams;

    /// <summary>Grams from target, and whether that raised an open flag.</summary>
    public (int? Grams, bool Raised) ToTarget => HasChanges ? (Person.ToTarget, Met(Above) is not null) : (null, false);

    /// <summary>The readings that raised the open flags.</summary>
    public IReadOnlySet<long> RaisedReadings => row.Flags
        .SelectMany(flag => flag.Evidence).Where(seen => seen.RaisedIt).Select(seen => seen.ReadingId).OfType<long>().ToHashSet();

    /// <summary>The first day on which a flag that was put off comes back; null when none is put off.</summary>
    public DateOnly? PutOffUntil => row.Flags.Where(flag => flag.PutOffUntil > today).Min(flag => flag.PutOffUntil);

    /// <summary>"furosemide 40 mg daily · spoken 29 Nov".</summary>
    public string Beside =>
        $"{Or(Person.Summary.LoopDiuretic, "no loop diuretic")} · {Or(Person.Summary.LastContact, "no contact on record")}" +
        (Person.Summary.OpenQuestions > 0 ? $" · {Wording.Count(Person.Summary.OpenQuestions, "open question", "open questions")}" : "");

    /// <summary>"trend still learning (3 of 7 weights in 14 days) · gain in 3 days not known"; empty when there is nothing the row does not say already.</summary>
    public string NotKnownBeside => string.Join(" · ", Soft());

    /// <summary>The statements a row has room for; the panel and paper have them all.</summary>
    public RowStatements Statements => RowStatements.Of(row, today);

    private RowFlag? Met(string ruleId) => row.Flags.FirstOrDefault(flag => flag.RuleId == ruleId && flag.IsMet && !(flag.PutOffUntil > today));

    private IEnumerable<string> Soft()
    {
        if (new OwnTrendWords(Person.Summary, row.Strip, today, unit).Learning is { } learning)
        {
            yield return $"trend still learning ({learning})";
        }

        foreach (var missing in NotKnown.Of(Person.Summary).Where(missing => missing.OnRow).Select(missing => missing.InShort).Distinct())
        {
            yield return missing;
        }
    }

    private static string Or(string text, string otherwise) => text.Length == 0 ? otherwise : text;
}
