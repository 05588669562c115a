using HfClinic.Clinical.Values;
using HfClinic.Records.Readings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>Reads what was measured and told beside the weight: weight alone finds only a part of those who get worse.</summary>
internal static class BesideQuery
{
    private const int DaysBack = 7;

    /// <summary>The latest pressure, pulse and saturation, and the symptoms of the last week, newest first.</summary>
    public static async Task<IReadOnlyList<WhyBeside>> ReadAsync(ClinicDb db, long patientId, DateOnly today, CancellationToken cancellation)
    {
        var from = today.AddDays(-DaysBack);
        var vitals = await db.Readings.AsNoTracking()
            .Where(r => r.PatientId == patientId && r.Kind != ReadingKind.Weight && r.State == ReadingState.Accepted && r.Day >= from && r.Day <= today)
            .OrderByDescending(r => r.MeasuredAt).Select(r => new { r.Kind, r.MeasuredAt, r.Day, r.Value }).ToListAsync(cancellation);
        var lines = new List<WhyBeside>();
        if (vitals.Find(v => v.Kind == ReadingKind.SystolicPressure) is { } systolic)
        {
            var diastolic = vitals.Find(v => v.Kind == ReadingKind.DiastolicPressure && v.MeasuredAt == systolic.MeasuredAt);
            lines.Add(new(systolic.Day, diastolic is null ? $"systolic {systolic.Value} mmHg" : $"BP {systolic.Value}/{diastolic.Value} mmHg"));
        }

        if (vitals.Find(v => v.Kind == ReadingKind.HeartRate) is { } pulse)
        {
            lines.Add(new(pulse.Day, $"pulse {pulse.Value} per minute"));
        }

        if (vitals.Find(v => v.Kind == ReadingKind.OxygenSaturation) is { } saturation)
        {
            lines.Add(new(saturation.Day, $"oxygen saturation {saturation.Value} %"));
        }

        var told = await db.SymptomReports.AsNoTracking()
            .Where(s => s.PatientId == patientId && s.StruckOutAt == null && s.Day >= from && s.Day <= today)
            .OrderByDescending(s => s.Day).ThenByDescending(s => s.Id).ToListAsync(cancellation);
        lines.AddRange(told.Select(report => new WhyBeside(report.Day,
            (report.Symptoms == Symptoms.None ? "asked, no symptoms" : SymptomWords.List(report.Symptoms)) + (string.IsNullOrWhiteSpace(report.Note) ? "" : $" (“{report.Note}”)"))));
        return lines;
    }
}
