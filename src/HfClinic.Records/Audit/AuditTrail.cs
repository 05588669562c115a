using System.Security.Cryptography;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.ChangeTracking;

namespace HfClinic.Records.Audit;

/// <summary>Turns the changes of one piece of work into lines of the record of access, chained by hash.</summary>
internal static class AuditTrail
{
    private static readonly JsonSerializerOptions Plain = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    /// <summary>Notes what is about to be saved, with the values before. To be called before the save.</summary>
    public static IReadOnlyList<AuditedChange> Collect(ClinicDb db)
    {
        db.ChangeTracker.DetectChanges();
        return [.. db.ChangeTracker.Entries()
            .Where(entry => entry.State is EntityState.Added or EntityState.Modified or EntityState.Deleted
                && AuditWords.Audited.ContainsKey(entry.Metadata.ClrType))
            .Select(AuditedChange.From)];
    }

    /// <summary>Adds the lines; the row lock on the chain's end keeps them in one order over all servers.</summary>
    public static async Task WriteAsync(WorkScope scope, CancellationToken cancellation)
    {
        var lines = scope.Changes.Select(change => (change.PatientId(), change.What, Json(change.Before), Json(change.After())))
            .Concat(scope.Notes.Select(note => (note.PatientId, note.What, (string?)null, note.Detail))).ToList();
        if (lines.Count == 0)
        {
            return;
        }

        var db = scope.Db;
        await db.AuditHeads.ExecuteUpdateAsync(set => set.SetProperty(head => head.LastId, head => head.LastId), cancellation);
        var end = await db.AuditHeads.AsNoTracking().SingleAsync(cancellation);
        foreach (var (patientId, what, before, after) in lines)
        {
            var entry = new AuditEntry
            {
                Id = ++end.LastId,
                At = scope.Now,
                ById = scope.Actor.UserId,
                ByName = scope.Actor.Name,
                PatientId = patientId,
                What = what,
                Before = before,
                After = after,
                Hash = "",
            };
            entry.Hash = HashOf(entry, end.LastHash);
            end.LastHash = entry.Hash;
            db.AuditEntries.Add(entry);
        }

        await db.SaveChangesAsync(cancellation);
        await db.AuditHeads.ExecuteUpdateAsync(
            set => set.SetProperty(head => head.LastId, end.LastId).SetProperty(head => head.LastHash, end.LastHash), cancellation);
    }

    /// <summary>SHA-256 over the hash before and every field of the line.</summary>
    public static string HashOf(AuditEntry entry, string hashBefore)
    {
        var content = JsonSerializer.Serialize(new object?[]
        {
            hashBefore, entry.Id, entry.At.Ticks, entry.ById, entry.ByName, entry.PatientId, entry.What, entry.Before, entry.After,
        }, Plain);
        return Convert.ToHexStringLower(SHA256.HashData(Encoding.UTF8.GetBytes(content)));
    }

    private static string? Json(IReadOnlyDictionary<string, object?>? values) =>
        values is null || values.Count == 0 ? null : JsonSerializer.Serialize(values, Plain);
}

/// <summary>One row about to be saved.</summary>
internal sealed record AuditedChange(EntityEntry Entry, string What, EntityState State, IReadOnlyDictionary<string, object?>? Before, IReadOnlyList<string> Changed)
{
    public static AuditedChange From(EntityEntry entry)
    {
        var word = AuditWords.Audited[entry.Metadata.ClrType];
        var (what, changed) = entry.State switch
        {
            EntityState.Added => ($"{word} added", entry.Properties.Where(property => property.CurrentValue is not null)),
            EntityState.Modified => ($"{word} changed", entry.Properties.Where(property => property.IsModified && !Equals(property.OriginalValue, property.CurrentValue))),
            _ => ($"{word} removed", entry.Properties),
        };
        var names = changed.Select(property => property.Metadata.Name).ToList();
        var before = entry.State == EntityState.Added
            ? null
            : names.ToDictionary(name => name, name => Shown(entry.Property(name).OriginalValue));
        return new(entry, what, entry.State, before, names);
    }

    /// <summary>The patient it concerns; read after the save, when new rows have their number.</summary>
    public long? PatientId() => Entry.Entity is Patients.Patient patient
        ? patient.Id
        : Entry.Metadata.FindProperty("PatientId") is null ? null : (long?)Entry.Property("PatientId").CurrentValue;

    /// <summary>The values after the save, with the row's number.</summary>
    public IReadOnlyDictionary<string, object?>? After()
    {
        if (State == EntityState.Deleted)
        {
            return null;
        }

        var after = Changed.ToDictionary(name => name, name => Shown(Entry.Property(name).CurrentValue));
        after["Id"] = Entry.Property("Id").CurrentValue;
        return after;
    }

    private static object? Shown(object? value) => value is Enum ? value.ToString() : value;
}
