using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Records.Visits;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Visits;

/// <summary>Both engines hold the same range, 5 to 90 percent: a choice of this program.</summary>
public class EjectionFractionTests
{
    [Theory]
    [BothDatabases(4.9, false)]
    [BothDatabases(5.0, true)]
    [BothDatabases(35.0, true)]
    [BothDatabases(90.0, true)]
    [BothDatabases(90.1, false)]
    public async Task The_database_keeps_the_range(DatabaseEngine engine, double percent, bool accepted)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var patient = await clinic.Get<EnrolPatient>().RunAsync(
            TestClinic.As(ClinicRole.Nurse),
            new PatientDetails { ClinicNumber = "T-1", FamilyName = "Test", GivenName = "One", EnrolledOn = new DateOnly(2026, 1, 1) },
            TestContext.Current.CancellationToken);
        await using var db = clinic.OpenDb();
        db.EjectionFractions.Add(new EjectionFraction
        {
            PatientId = patient,
            Day = new DateOnly(2026, 2, 1),
            Percent = (decimal)percent,
            Method = "echocardiography",
            RecordedAt = new DateTime(2026, 2, 1, 9, 0, 0, DateTimeKind.Utc),
            ByName = "Test Prescriber",
        });
        var refusal = await Record.ExceptionAsync(() => db.SaveChangesAsync(TestContext.Current.CancellationToken));
        Assert.Equal(accepted, refusal is null);
        Assert.True(accepted || refusal is DbUpdateException);
    }
}
