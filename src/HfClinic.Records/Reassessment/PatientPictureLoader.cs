using System.Collections.Immutable;
using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Reassessment;

/// <summary>Reads what the rules may see of one patient.</summary>
public sealed class PatientPictureLoader(ClinicClock clock)
{
    /// <summary>Readings older than this many days are not looked at by any rule.</summary>
    public const int ReadingDays = 200;

    /// <summary>The picture as of the end of the given clinic day.</summary>
    public async Task<PatientPicture> LoadAsync(ClinicDb db, Patient patient, DateOnly asOf, CancellationToken cancellation)
    {
        var readings = await ReadingsAsync(db, patient.Id, asOf, cancellation);
        return new PatientPicture
        {
            AsOf = asOf,
            EnrolledOn = patient.EnrolledOn,
            BirthDate = patient.BirthDate,
            Sex = patient.Sex,
            HeightCentimetres = patient.HeightCentimetres,
            WeighsAtHome = patient.WeighsAtHome && patient.LeftOn is null,
            DischargedFromHospitalOn = patient.DischargedFromHospitalOn,
            Weights = [.. readings.Where(reading => reading.Kind == ReadingKind.Weight).Select(ToWeight)],
            Vitals = [.. readings.Where(reading => reading.Kind != ReadingKind.Weight && reading.State == ReadingState.Accepted)
                .Select(reading => new VitalReading(reading.Id, reading.Kind, clock.ToLocal(reading.MeasuredAt), reading.Value))],
            Symptoms = [.. await db.SymptomReports.AsNoTracking()
                .Where(report => report.PatientId == patient.Id && report.StruckOutAt == null && report.Day <= asOf)
                .OrderBy(report => report.Day).ThenBy(report => report.Id)
                .Select(report => new Clinical.Picture.SymptomReport(report.Id, report.Day, report.Symptoms, report.Note)).ToListAsync(cancellation)],
            TargetWeights = [.. await db.TargetWeights.AsNoTracking()
                .Where(target => target.PatientId == patient.Id && target.StruckOutAt == null && target.From <= asOf)
                .OrderBy(target => target.From).ThenBy(target => target.Id)
                .Select(target => new Clinical.Picture.TargetWeight(target.Id, target.From, new Weight(target.Grams), target.ByName, target.Reason))
                .ToListAsync(cancellation)],
            DoseCourses = [.. await db.DoseCourses.AsNoTracking()
                .Where(course => course.PatientId == patient.Id && course.StruckOutAt == null && course.From <= asOf)
                .OrderBy(course => course.From).ThenBy(course => course.Id)
                .Select(course => new DoseCourse(course.Id, course.Medicine, course.DoseMilligrams, course.TimesDaily, course.From, course.Until))
                .ToListAsync(cancellation)],
            BloodTests = [.. (await db.BloodTests.AsNoTracking()
                .Where(test => test.PatientId == patient.Id && test.StruckOutAt == null && test.Day <= asOf)
                .OrderBy(test => test.TakenAt).ThenBy(test => test.Id)
                .Select(test => new { test.Id, test.Analyte, test.TakenAt, test.Value }).ToListAsync(cancellation))
                .Select(test => new BloodResult(test.Id, test.Analyte, clock.ToLocal(test.TakenAt), test.Value))],
            EjectionFractions = [.. await db.EjectionFractions.AsNoTracking()
                .Where(fraction => fraction.PatientId == patient.Id && fraction.StruckOutAt == null && fraction.Day <= asOf)
                .OrderBy(fraction => fraction.Day).ThenBy(fraction => fraction.Id)
                .Select(fraction => new EjectionFraction(fraction.Id, fraction.Day, fraction.Percent, fraction.Method)).ToListAsync(cancellation)],
            OpenFlagRules = (await db.Flags.AsNoTracking()
                .Where(flag => flag.PatientId == patient.Id && flag.State == FlagState.Open)
                .Select(flag => flag.RuleId).ToListAsync(cancellation)).ToImmutableHashSet(),
        };
    }

    private static async Task<List<ReadingRow>> ReadingsAsync(ClinicDb db, long patientId, DateOnly asOf, CancellationToken cancellation)
    {
        var from = asOf.AddDays(-ReadingDays);
        return await db.Readings.AsNoTracking()
            .Where(reading => reading.PatientId == patientId && reading.Day >= from && reading.Day <= asOf
                && (reading.State == ReadingState.Accepted || reading.State == ReadingState.Held))
            .OrderBy(reading => reading.MeasuredAt).ThenBy(reading => reading.Id)
            .Select(reading => new ReadingRow(
                reading.Id, reading.Kind, reading.MeasuredAt, reading.Value, reading.State, reading.HoldReason, reading.RecordedAt))
            .ToListAsync(cancellation);
    }

    private WeightReading ToWeight(ReadingRow row) => new(
        row.Id,
        clock.ToLocal(row.MeasuredAt),
        new Weight(row.Value),
        row.State == ReadingState.Held ? new HeldReading(row.HoldReason ?? HoldReason.Unexplained, clock.ToLocal(row.RecordedAt)) : null);

    private sealed record ReadingRow(
        long Id, ReadingKind Kind, DateTime MeasuredAt, int Value, ReadingState State, HoldReason? HoldReason, DateTime RecordedAt);
}
