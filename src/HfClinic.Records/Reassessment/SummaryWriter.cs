using System.Globalization;
using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;
using HfClinic.Records.Contacts;
using HfClinic.Records.Flags;
using HfClinic.Records.Medicines;
using HfClinic.Records.Patients;
using HfClinic.Records.Settings;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Reassessment;

/// <summary>Writes the one stored row that the lists show of a patient.</summary>
public sealed class SummaryWriter(ClinicClock clock)
{
    private const string Between = "; ";
    private const int LongestText = 2000;

    /// <summary>Writes the summary from the picture just assessed and the flags as they stand after it.</summary>
    public async Task WriteAsync(
        WorkScope scope, Patient patient, PatientPicture picture, IReadOnlyCollection<Finding> findings, IReadOnlyCollection<Flag> flags,
        CancellationToken cancellation)
    {
        var db = scope.Db;
        var summary = await db.PatientSummaries.SingleAsync(row => row.PatientId == patient.Id, cancellation);
        summary.OnDailyWeights = patient.WeighsAtHome && patient.LeftOn is null;
        summary.AsOf = scope.Today;
        WriteWeights(summary, picture);
        WriteTrend(summary, picture);
        WriteFlags(summary, flags, findings, scope.Today);
        summary.LoopDiuretic = LoopDiureticOn(picture);
        await WriteContactsAsync(db, summary, patient.Id, cancellation);
        await db.SaveChangesAsync(cancellation);
    }

    private void WriteWeights(PatientSummary summary, PatientPicture picture)
    {
        var weights = WeightSummary.Of(picture);
        summary.LastGrams = weights.Latest?.Weight.Grams;
        summary.LastWeightDay = weights.Latest?.Day;
        summary.LastWeightAt = weights.Latest is { } latest ? clock.ToUtc(latest.LocalTime) : null;
        summary.Gain1Day = weights.Gain(1)?.Difference.Grams;
        summary.Gain3Days = weights.Gain(3)?.Difference.Grams;
        summary.Gain7Days = weights.Gain(7)?.Difference.Grams;
        summary.TargetGrams = picture.TargetWeight?.Weight.Grams;
        summary.TargetFrom = picture.TargetWeight?.From;
        summary.HeldReadings = picture.Weights.Count(weight => weight.Held is not null);
    }

    private static void WriteTrend(PatientSummary summary, PatientPicture picture)
    {
        var latest = WeightSummary.Of(picture).Latest?.Day;
        var day = latest is { } known ? picture.Trend.On(known) : null;
        var usable = day is { Learning: false } ? day : null;
        var (perWeek, low, high) = usable?.WeeklySlope ?? default;
        summary.IsLearning = day is { Learning: true };
        summary.TrendDay = usable is null ? null : latest;
        summary.ExcessGrams = Grams(usable?.State.Expected) - picture.TargetWeight?.Weight.Grams;
        summary.ExcessErrorGrams = Grams(usable?.ExcessError);
        summary.SlopeGramsPerWeek = usable is null ? null : Grams(perWeek);
        summary.SlopeBandGramsPerWeek = usable is null ? null : Grams(high - perWeek);
        summary.FluidGrams = Grams(usable?.State.Fluid);
        summary.FluidBandGrams = Grams(usable?.FluidBand);
        summary.FluidScore = usable is { } trend ? decimal.Round((decimal)trend.FluidScore, 3) : null;
        summary.ScatterGrams = usable is null ? null : Grams(picture.Trend.ScatterOn(latest!.Value));
        summary.IsRising = low > 0;
        summary.IsFalling = high < 0;
        summary.TrendLine = TrendLine.Write(picture);
    }

    private static int? Grams(double? kilograms) => kilograms is { } known ? (int)Math.Round(known * 1000) : null;

    private static void WriteFlags(
        PatientSummary summary, IReadOnlyCollection<Flag> flags, IReadOnlyCollection<Finding> findings, DateOnly today)
    {
        var open = flags.Where(flag => flag.State == FlagState.Open).ToList();
        var onList = open.Where(flag => flag.PutOffUntil is null || flag.PutOffUntil <= today)
            .OrderByDescending(flag => flag.Urgency).ThenBy(flag => flag.RaisedAt).ThenBy(flag => flag.Id).ToList();
        var failed = findings.Where(finding => finding.Outcome == Outcome.CouldNotBeChecked).ToList();
        summary.CheckFailed = failed.Count > 0;
        summary.OpenFlags = onList.Count;
        summary.PutOffFlags = open.Count - onList.Count;
        summary.OpenRules = string.Join(' ', onList.Select(flag => flag.RuleId));
        summary.IsSilent = onList.Exists(flag => flag.RuleId == NoWeight.RuleId);
        summary.Why = Cut(string.Join(Between, onList.Select(flag => flag.Statement).Concat(failed.Select(finding => finding.Statement))));
        summary.NotChecked = Cut(string.Join(Between, findings
            .Where(finding => finding.Outcome is Outcome.CannotTell or Outcome.CouldNotBeChecked)
            .GroupBy(finding => finding.Missing, StringComparer.Ordinal)
            .Select(missing => $"{Wording.List([.. missing.Select(finding => RuleBook.TitleOf(finding.RuleId)).Distinct()])}: {missing.Key}")));
        var worst = onList.Select(flag => (Urgency?)flag.Urgency).Concat(failed.Select(_ => (Urgency?)Urgency.ThisWeek)).Max();
        summary.WorstUrgency = worst;
        summary.WorstSince = onList.Where(flag => flag.Urgency == worst).Select(flag => (DateTime?)flag.RaisedAt).Min();
    }

    private static string LoopDiureticOn(PatientPicture picture) => string.Join(", ", picture.DoseCourses
        .Where(course => LoopDiuretics.Includes(course.Medicine) && course.HoldsOn(picture.AsOf))
        .Select(course => DoseWords.Of(course.Medicine, course.DoseMilligrams, course.TimesDaily)));

    private static async Task WriteContactsAsync(ClinicDb db, PatientSummary summary, long patientId, CancellationToken cancellation)
    {
        var last = await db.Contacts.AsNoTracking().Where(contact => contact.PatientId == patientId)
            .OrderByDescending(contact => contact.At).ThenByDescending(contact => contact.Id).FirstOrDefaultAsync(cancellation);
        summary.LastContactDay = last?.Day;
        summary.LastContact = last is null
            ? ""
            : $"{ContactWords.Of(last.Outcome)} {last.Day.ToString("dd MMM", CultureInfo.InvariantCulture)}";
        summary.OpenQuestions = await db.Questions.CountAsync(question => question.PatientId == patientId && question.AnsweredAt == null, cancellation);
    }

    private static string Cut(string text) => text.Length <= LongestText ? text : text[..(LongestText - 1)] + "…";
}
