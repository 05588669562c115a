using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Audit;

/// <summary>What checking the chain of the record of access found.</summary>
/// <param name="Lines">Lines checked.</param>
/// <param name="Fault">The first fault in words, or null when the chain holds.</param>
public sealed record AuditVerdict(long Lines, string? Fault);

/// <summary>Walks the record of access from its first line and checks each link.</summary>
public sealed class AuditVerification(IDbContextFactory<ClinicDb> databases)
{
    /// <summary>Checks every line; stops at the first that does not fit.</summary>
    public async Task<AuditVerdict> RunAsync(CancellationToken cancellation)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var hash = "";
        long last = 0;
        await foreach (var entry in db.AuditEntries.AsNoTracking().OrderBy(entry => entry.Id).AsAsyncEnumerable().WithCancellation(cancellation))
        {
            if (entry.Id != last + 1)
            {
                return new(last, $"Line {last + 1} is missing.");
            }

            var expected = AuditTrail.HashOf(entry, hash);
            if (entry.Hash != expected)
            {
                return new(last, $"Line {entry.Id} ({entry.What}) was changed after it was written.");
            }

            (last, hash) = (entry.Id, expected);
        }

        var head = await db.AuditHeads.AsNoTracking().SingleAsync(cancellation);
        return head.LastId == last && head.LastHash == hash
            ? new(last, null)
            : new(last, $"The last line should be {head.LastId}, but the record ends at {last}.");
    }
}
