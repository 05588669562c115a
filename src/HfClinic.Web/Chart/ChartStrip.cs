using HfClinic.Clinical.Flags;
using HfClinic.Records.Chart;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Flags;
using HfClinic.Web.DailyWeights;
using HfClinic.Web.Ui;

namespace HfClinic.Web.Chart;

/// <summary>The weight strip of an open chart.</summary>
public static class ChartStrip
{
    public const int Days = 56;

    /// <summary>The weights read, with those that raised an open flag marked.</summary>
    public static WeightStripData Of(PatientChart chart, StripContent seen, DateOnly today)
    {
        var raised = chart.Flags.Where(flag => flag.Flag.State == FlagState.Open)
            .SelectMany(flag => EvidenceText.Read(flag.Flag.EvidenceJson))
            .Where(evidence => evidence is { RaisedIt: true, ReadingId: not null }).Select(evidence => evidence.ReadingId!.Value).ToHashSet();
        return StripDrawing.Of(seen, raised, chart.Patient.EnrolledOn, today.AddDays(1 - Days), today);
    }
}
