using System.Globalization;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Records.Reassessment;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Reassessment;

/// <summary>
/// The reference series typed in day by day, stored, read back and filtered: the same figures as the two independent codings
/// (R and Python) of the robust three-state filter, to 1e-8, on both databases.
/// </summary>
public class GoldenTrendTests
{
    private const double Tolerance = 1e-8;

    /// <summary>The reference keeps the personal scale at 1; here it is learnt, and differs from this day on.</summary>
    private const int PersonalScaleFrom = 28;
    private static readonly DateOnly First = new(2026, 1, 5);

    [Theory, BothDatabases]
    public async Task The_reference_series_comes_back_to_its_digits(DatabaseEngine engine)
    {
        var golden = await File.ReadAllLinesAsync(Path.Combine(AppContext.BaseDirectory, "Files", "golden", "threecomp_robust_golden.csv"), TestContext.Current.CancellationToken);
        var columns = golden[0].Split(',');
        var rows = golden.Skip(1).Select(line => line.Split(',')).ToList();
        await using var clinic = await TestClinic.StartAsync(engine);
        var patientId = await clinic.EnrolAsync(ClinicSteps.Someone with { EnrolledOn = First });
        await clinic.Get<SetTargetWeight>().RunAsync(
            TestClinic.As(ClinicRole.Prescriber), patientId, new Weight(80_000), First, "reference", TestContext.Current.CancellationToken);
        foreach (var (day, row) in rows.Index())
        {
            if (row[1].Length > 0)
            {
                await clinic.Get<RecordReadings>().RunAsync(TestClinic.As(ClinicRole.Nurse), patientId, new TakenReadings
                {
                    LocalTime = First.AddDays(day).ToDateTime(new TimeOnly(7, 0)),
                    Weight = Weight.FromKilograms(decimal.Parse(row[1], CultureInfo.InvariantCulture)),
                }, TestContext.Current.CancellationToken);
            }
        }

        await using var db = clinic.OpenDb();
        var patient = await db.Patients.SingleAsync(p => p.Id == patientId, TestContext.Current.CancellationToken);
        var picture = await clinic.Get<PatientPictureLoader>().LoadAsync(db, patient, First.AddDays(rows.Count - 1), TestContext.Current.CancellationToken);
        Assert.Equal(rows.Count(row => row[2] == "1"), picture.Weights.Count(weight => weight.Held is not null));
        foreach (var (day, row) in rows.Index())
        {
            var found = picture.Trend.On(First.AddDays(day))!.Value;
            Check("M", found.State.Mass);
            Check("Fluid", found.State.Fluid);
            Check("excess", found.Excess!.Value);
            Check("se_excess", found.ExcessError);
            if (day < PersonalScaleFrom)
            {
                Check("zF", found.FluidScore);
            }

            void Check(string column, double value)
            {
                var expected = double.Parse(row[Array.IndexOf(columns, column)], CultureInfo.InvariantCulture);
                Assert.True(Math.Abs(expected - value) < Tolerance, $"Day {day + 1}, {column}: expected {expected}, found {value}.");
            }
        }
    }
}
