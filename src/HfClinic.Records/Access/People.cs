using HfClinic.Records.Work;
using Microsoft.AspNetCore.Identity;
using Microsoft.AspNetCore.Identity.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Records.Access;

/// <summary>A person who signs in, as the People page shows it.</summary>
public sealed record Person(Guid Id, string UserName, string DisplayName, bool IsActive, bool IsLockedOut, IReadOnlyList<ClinicRole> Roles);

/// <summary>What is typed to add a person.</summary>
public sealed record NewPerson(string UserName, string DisplayName, string Password, IReadOnlyCollection<ClinicRole> Roles);

/// <summary>The people who sign in and their roles. Every change is in the record of access; a password never is.</summary>
public sealed class People(ClinicWork work, IDbContextFactory<ClinicDb> databases, IServiceProvider services, TimeProvider time)
{
    /// <summary>Everybody, active people first, by name.</summary>
    public async Task<IReadOnlyList<Person>> ListAsync(CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var users = await db.Users.AsNoTracking().OrderByDescending(user => user.IsActive).ThenBy(user => user.DisplayName).ToListAsync(cancellation);
        var roles = await (from link in db.UserRoles
                           join role in db.Roles on link.RoleId equals role.Id
                           select new { link.UserId, role.Name }).ToListAsync(cancellation);
        var byUser = roles.ToLookup(row => row.UserId, row => Enum.Parse<ClinicRole>(row.Name!));
        var now = time.GetUtcNow();
        return [.. users.Select(user => new Person(
            user.Id, user.UserName!, user.DisplayName, user.IsActive, user.LockoutEnd > now, [.. byUser[user.Id].Order()]))];
    }

    /// <summary>Adds a person.</summary>
    /// <exception cref="RefusedException">The name is taken, the password too weak, or something is missing.</exception>
    public Task<Guid> AddAsync(Actor actor, NewPerson person, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.ManagePeople, scope => AddAsync(scope, person), cancellation);

    /// <summary>Replaces a person's roles. The last active administrator keeps that role.</summary>
    public Task SetRolesAsync(Actor actor, Guid userId, IReadOnlyCollection<ClinicRole> roles, CancellationToken cancellation = default) =>
        ChangeAsync(actor, userId, async (scope, users, user) =>
        {
            RequireRoles(roles);
            if (!roles.Contains(ClinicRole.Administrator))
            {
                await KeepOneAdministratorAsync(scope, user, cancellation);
            }

            var before = await users.GetRolesAsync(user);
            Check(await users.RemoveFromRolesAsync(user, before));
            Check(await users.AddToRolesAsync(user, roles.Distinct().Select(ClinicRoles.NameOf)));
            Check(await users.UpdateSecurityStampAsync(user));
            scope.Note("Roles changed", detail: $"{user.DisplayName}: {string.Join(", ", before)} → {string.Join(", ", roles)}");
        }, cancellation);

    /// <summary>Lets a person sign in no more, or again.</summary>
    public Task SetActiveAsync(Actor actor, Guid userId, bool isActive, CancellationToken cancellation = default) =>
        ChangeAsync(actor, userId, async (scope, users, user) =>
        {
            if (!isActive)
            {
                await KeepOneAdministratorAsync(scope, user, cancellation);
            }

            user.IsActive = isActive;
            Check(await users.UpdateAsync(user));
            Check(await users.UpdateSecurityStampAsync(user));
            scope.Note(isActive ? "Person may sign in again" : "Person may sign in no more", detail: user.DisplayName);
        }, cancellation);

    /// <summary>Gives a person a new password and ends a lock-out.</summary>
    public Task SetPasswordAsync(Actor actor, Guid userId, string password, CancellationToken cancellation = default) =>
        ChangeAsync(actor, userId, async (scope, users, user) =>
        {
            Check(await users.RemovePasswordAsync(user));
            Check(await users.AddPasswordAsync(user, password));
            Check(await users.SetLockoutEndDateAsync(user, null));
            Check(await users.ResetAccessFailedCountAsync(user));
            scope.Note("Password set anew", detail: user.DisplayName);
        }, cancellation);

    internal async Task<Guid> AddAsync(WorkScope scope, NewPerson person)
    {
        var displayName = TextRules.Required(nameof(NewPerson.DisplayName), "The name", person.DisplayName, ClinicUser.DisplayNameLength);
        var userName = TextRules.Required(nameof(NewPerson.UserName), "The sign-in name", person.UserName, 60);
        RequireRoles(person.Roles);
        var users = UsersOf(scope.Db);
        var user = new ClinicUser { Id = Guid.CreateVersion7(), UserName = userName, DisplayName = displayName, LockoutEnabled = true };
        Check(await users.CreateAsync(user, person.Password));
        Check(await users.AddToRolesAsync(user, person.Roles.Distinct().Select(ClinicRoles.NameOf)));
        scope.Note("Person added", detail: $"{displayName} ({userName}): {string.Join(", ", person.Roles)}");
        return user.Id;
    }

    private Task ChangeAsync(
        Actor actor, Guid userId, Func<WorkScope, UserManager<ClinicUser>, ClinicUser, Task> change, CancellationToken cancellation) =>
        work.RunAsync(actor, Capability.ManagePeople, async scope =>
        {
            var users = UsersOf(scope.Db);
            var user = await users.FindByIdAsync(userId.ToString()) ?? throw new NotFoundException("There is no such person.");
            await change(scope, users, user);
        }, cancellation);

    private static async Task KeepOneAdministratorAsync(WorkScope scope, ClinicUser user, CancellationToken cancellation)
    {
        var others = await (from link in scope.Db.UserRoles
                            join role in scope.Db.Roles on link.RoleId equals role.Id
                            join other in scope.Db.Users on link.UserId equals other.Id
                            where role.Name == nameof(ClinicRole.Administrator) && other.IsActive && other.Id != user.Id
                            select other.Id).AnyAsync(cancellation);
        if (!others)
        {
            throw new RefusedException(new Problem("Roles", "This is the last administrator.", "Make somebody else an administrator first."));
        }
    }

    private static void RequireRoles(IReadOnlyCollection<ClinicRole> roles)
    {
        if (roles.Count == 0)
        {
            throw new RefusedException(new Problem(nameof(NewPerson.Roles), "No role is chosen.", "Choose at least one."));
        }
    }

    private static void Check(IdentityResult result)
    {
        if (!result.Succeeded)
        {
            throw new RefusedException([.. result.Errors.Select(error => new Problem(
                error.Code.StartsWith("Password", StringComparison.Ordinal) ? nameof(NewPerson.Password) : nameof(NewPerson.UserName), error.Description))]);
        }
    }

    private UserManager<ClinicUser> UsersOf(ClinicDb db) => ActivatorUtilities.CreateInstance<UserManager<ClinicUser>>(
        services, new UserStore<ClinicUser, IdentityRole<Guid>, ClinicDb, Guid>(db));
}
