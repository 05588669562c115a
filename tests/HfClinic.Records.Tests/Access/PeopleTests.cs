using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.AspNetCore.Identity;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Records.Tests.Access;

public class PeopleTests
{
    private const string Secret = "correct horse battery";

    private static readonly Actor Administrator = TestClinic.As(ClinicRole.Administrator);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task A_person_added_can_sign_in_and_the_password_is_in_no_line_of_the_record_of_access(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var scope = clinic.Services.CreateAsyncScope();
        var id = await scope.ServiceProvider.GetRequiredService<People>().AddAsync(
            Administrator, new("m.okafor", "Mo O'Kafor", Secret, [ClinicRole.Nurse, ClinicRole.Coordinator]), Cancellation);
        Assert.True(await HasPasswordAsync(clinic, id, Secret));
        await using var db = clinic.OpenDb();
        var line = await db.AuditEntries.SingleAsync(entry => entry.What == "Person added" && entry.ByName == "Test Administrator", Cancellation);
        Assert.Contains("Mo O'Kafor", line.After);
        Assert.DoesNotContain(await db.AuditEntries.ToListAsync(Cancellation), entry => $"{entry.Before}{entry.After}".Contains(Secret));
    }

    [Theory, BothDatabases]
    public async Task Lists_the_active_first_with_their_roles(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var scope = clinic.Services.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<People>();
        var coordinator = (await people.ListAsync(Cancellation)).Single(person => person.UserName == "coordinator");
        await people.SetActiveAsync(Administrator, coordinator.Id, false, Cancellation);
        await people.SetRolesAsync(Administrator, coordinator.Id, [ClinicRole.Nurse], Cancellation);
        var last = (await people.ListAsync(Cancellation))[^1];
        Assert.Equal(("coordinator", false), (last.UserName, last.IsActive));
        Assert.Equal([ClinicRole.Nurse], last.Roles);
    }

    [Theory, BothDatabases]
    public async Task A_new_password_replaces_the_old_and_ends_a_lock_out(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var scope = clinic.Services.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<People>();
        var nurse = (await people.ListAsync(Cancellation)).Single(person => person.UserName == "nurse");
        await using (var db = clinic.OpenDb())
        {
            await db.Users.Where(user => user.Id == nurse.Id)
                .ExecuteUpdateAsync(set => set.SetProperty(user => user.LockoutEnd, clinic.Clock.GetUtcNow().AddMinutes(10)), Cancellation);
        }

        Assert.True((await people.ListAsync(Cancellation)).Single(person => person.Id == nurse.Id).IsLockedOut);
        await people.SetPasswordAsync(Administrator, nurse.Id, Secret, Cancellation);
        Assert.False((await people.ListAsync(Cancellation)).Single(person => person.Id == nurse.Id).IsLockedOut);
        Assert.True(await HasPasswordAsync(clinic, nurse.Id, Secret));
        Assert.False(await HasPasswordAsync(clinic, nurse.Id, Templates.Password));
    }

    [Theory, BothDatabases]
    public async Task A_password_too_short_leaves_the_old_one(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var scope = clinic.Services.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<People>();
        var nurse = (await people.ListAsync(Cancellation)).Single(person => person.UserName == "nurse");
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => people.SetPasswordAsync(Administrator, nurse.Id, "elevenchars", Cancellation));
        Assert.Equal("Password", refusal.Problems.Single().Field);
        Assert.True(await HasPasswordAsync(clinic, nurse.Id, Templates.Password));
    }

    [Theory, BothDatabases]
    public async Task The_last_administrator_stays(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var scope = clinic.Services.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<People>();
        var only = (await people.ListAsync(Cancellation)).Single(person => person.UserName == "administrator");
        await Assert.ThrowsAsync<RefusedException>(() => people.SetActiveAsync(Administrator, only.Id, false, Cancellation));
        await Assert.ThrowsAsync<RefusedException>(() => people.SetRolesAsync(Administrator, only.Id, [ClinicRole.Nurse], Cancellation));
        await people.AddAsync(Administrator, new("second", "Second", Secret, [ClinicRole.Administrator]), Cancellation);
        await people.SetActiveAsync(Administrator, only.Id, false, Cancellation);
        Assert.False((await people.ListAsync(Cancellation)).Single(person => person.Id == only.Id).IsActive);
    }

    [Theory]
    [BothDatabases("nurse", "Other", Secret, true, "UserName")]
    [BothDatabases(" ", "Other", Secret, true, "UserName")]
    [BothDatabases("other", " ", Secret, true, "DisplayName")]
    [BothDatabases("other", "Other", "short", true, "Password")]
    [BothDatabases("other", "Other", Secret, false, "Roles")]
    public async Task Refuses_a_person_and_names_the_field(
        DatabaseEngine engine, string userName, string displayName, string password, bool hasRole, string field)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await using var scope = clinic.Services.CreateAsyncScope();
        var people = scope.ServiceProvider.GetRequiredService<People>();
        var refusal = await Assert.ThrowsAsync<RefusedException>(() => people.AddAsync(
            Administrator, new(userName, displayName, password, hasRole ? [ClinicRole.Nurse] : []), Cancellation));
        Assert.Equal(field, refusal.Problems[0].Field);
        Assert.Equal(4, (await people.ListAsync(Cancellation)).Count);
    }

    private static async Task<bool> HasPasswordAsync(TestClinic clinic, Guid id, string password)
    {
        await using var scope = clinic.Services.CreateAsyncScope();
        var users = scope.ServiceProvider.GetRequiredService<UserManager<ClinicUser>>();
        return await users.CheckPasswordAsync((await users.FindByIdAsync(id.ToString()))!, password);
    }
}
