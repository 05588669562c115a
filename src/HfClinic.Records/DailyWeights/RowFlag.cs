using System.Collections.Immutable;
using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Records.Flags;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>What a row needs to know of an open flag: its words, and the very values that raised it.</summary>
/// <param name="IsMet">Whether the data still meet the limit.</param>
public sealed record RowFlag(string RuleId, string Statement, bool IsMet, DateOnly? PutOffUntil, ImmutableArray<Evidence> Evidence)
{
    /// <summary>The open flags of each patient, the most urgent first, then the longest standing.</summary>
    internal static async Task<ILookup<long, RowFlag>> ReadAsync(ClinicDb db, IReadOnlyCollection<long> patients, CancellationToken cancellation) =>
        (await db.Flags.AsNoTracking()
            .Where(flag => patients.Contains(flag.PatientId) && flag.State == FlagState.Open)
            .OrderByDescending(flag => flag.Urgency).ThenBy(flag => flag.RaisedAt).ThenBy(flag => flag.Id)
            .Select(flag => new { flag.PatientId, flag.RuleId, flag.Statement, flag.NoLongerMetOn, flag.PutOffUntil, flag.EvidenceJson })
            .ToListAsync(cancellation))
            .ToLookup(row => row.PatientId, row => new RowFlag(
                row.RuleId, row.Statement, row.NoLongerMetOn is null, row.PutOffUntil, EvidenceText.Read(row.EvidenceJson)));
}
