using HfClinic.Records.Access;
using HfClinic.Records.Patients;
using HfClinic.Testing;
using HfClinic.Testing.Databases;

namespace HfClinic.Records.Tests.Patients;

public class PatientSearchTests
{
    private static readonly string Longest = new('y', Patient.NameLength);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory]
    [BothDatabases("obrannach", 1)]
    [BothDatabases("o'brann", 1)]
    [BothDatabases("SILE", 1)]
    [BothDatabases("síle o’brânnach", 1)]
    [BothDatabases("كريم", 1)]
    [BothDatabases("yyyyyyyy", 1)]
    [BothDatabases("sm1", 1)]
    [BothDatabases("sm-1", 1)]
    [BothDatabases("%", 3)]
    [BothDatabases("nobody", 0)]
    public async Task Finds_names_as_people_type_them(DatabaseEngine engine, string typed, int found)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SM-1", FamilyName = "O'Brânnach", GivenName = "Síle" });
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SM-2", FamilyName = "الزهراني", GivenName = "كريم" });
        await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SM-3", FamilyName = Longest, GivenName = Longest });
        var search = clinic.Get<PatientSearch>();
        Assert.Equal(found, await search.CountAsync(typed, PatientsView.All, Cancellation));
        Assert.Equal(found, (await search.RowsAsync(typed, PatientsView.All, 0, 50, Cancellation)).Count);
    }

    [Theory, BothDatabases]
    public async Task Tells_the_enrolled_from_those_who_left_and_pages_by_name(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        foreach (var (number, name) in new[] { ("1", "Calder"), ("2", "Ashwell"), ("3", "Benfleet") })
        {
            await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = number, FamilyName = name });
        }

        var search = clinic.Get<PatientSearch>();
        var rows = await search.RowsAsync("", PatientsView.Enrolled, 0, 50, Cancellation);
        Assert.Equal(["Ashwell", "Benfleet", "Calder"], rows.Select(row => row.FamilyName));
        await clinic.Get<LeaveClinic>().RunAsync(TestClinic.As(ClinicRole.Nurse), rows[0].Id, new DateOnly(2026, 3, 31), "moved", Cancellation);
        Assert.Equal(["Benfleet", "Calder"], (await search.RowsAsync("", PatientsView.Enrolled, 0, 50, Cancellation)).Select(row => row.FamilyName));
        Assert.Equal(["Ashwell"], (await search.RowsAsync("", PatientsView.Left, 0, 50, Cancellation)).Select(row => row.FamilyName));
        Assert.Equal(["Calder"], (await search.RowsAsync("", PatientsView.All, 2, 1, Cancellation)).Select(row => row.FamilyName));
    }
}
