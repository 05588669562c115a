using HfClinic.Clinical.Flags;
using HfClinic.Records.Chart;
using HfClinic.Records.Flags;
using HfClinic.Web.Ui;
using Seen = HfClinic.Records.DailyWeights.WeightStripData;

namespace HfClinic.Web.Chart;

/// <summary>The weight strip of an open chart.</summary>
public static class ChartStrip
{
    public const int Days = 56;

    /// <summary>The weights read, with those that raised an open flag marked.</summary>
    public static WeightStripData Of(PatientChart chart, Seen seen, DateOnly today)
    {
        var raised = chart.Flags.Where(flag => flag.Flag.State == FlagState.Open)
            .SelectMany(flag => EvidenceText.Read(flag.Flag.EvidenceJson))
            .Where(evidence => evidence is { RaisedIt: true, ReadingId: not null }).Select(evidence => evidence.ReadingId!.Value).ToHashSet();
        return new WeightStripData
        {
            From = today.AddDays(1 - Days),
            To = today,
            ExpectedFrom = chart.Patient.EnrolledOn,
            ExpectedTo = today.AddDays(-1),
            Readings =
            [
                .. seen.Days.Select(day => new StripReading(day.Day, day.Weight.Grams, raised.Contains(day.Id))),
                .. seen.Held.Select(held => new StripReading(held.Day, held.Weight.Grams, Held: true)),
            ],
            Targets = [.. seen.Targets.Select(target => new StripTarget(target.From, target.Grams))],
            DiureticChanges = [.. seen.Diuretics.Select(change => new StripChange(change.Day, change.Words))],
        };
    }
}
