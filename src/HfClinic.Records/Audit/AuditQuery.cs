using HfClinic.Records.Chart;
using HfClinic.Records.Patients;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Audit;

/// <summary>What of the record of access is wanted; empty fields do not narrow it.</summary>
/// <param name="ChangesOnly">Leaves out the openings of charts.</param>
/// <param name="Patient">Words of the patient's name or clinic number.</param>
public sealed record AuditRequest(
    DateTime? From = null, DateTime? Until = null, string Person = "", long? PatientId = null, int Skip = 0, int Take = 100,
    bool ChangesOnly = false, string Patient = "");

/// <summary>A line with the name of the patient it concerns, and the names of the clinic's people for the values in it.</summary>
public sealed record AuditRow(AuditEntry Entry, string? PatientName, IReadOnlyDictionary<Guid, string> People);

/// <summary>Reads the record of access, newest first.</summary>
public sealed class AuditQuery(IDbContextFactory<ClinicDb> databases)
{
    public async Task<IReadOnlyList<AuditRow>> RowsAsync(AuditRequest request, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var people = await db.Users.AsNoTracking().ToDictionaryAsync(user => user.Id, user => user.DisplayName, cancellation);
        var rows = await (from entry in Filtered(db, request).OrderByDescending(entry => entry.Id).Skip(request.Skip).Take(request.Take)
                          join patient in db.Patients on entry.PatientId equals patient.Id into patients
                          from patient in patients.DefaultIfEmpty()
                          orderby entry.Id descending
                          select new { Entry = entry, Name = patient == null ? null : patient.FamilyName + ", " + patient.GivenName })
            .ToListAsync(cancellation);
        return [.. rows.Select(row => new AuditRow(row.Entry, row.Name, people))];
    }

    public async Task<int> CountAsync(AuditRequest request, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Filtered(db, request).CountAsync(cancellation);
    }

    private static IQueryable<AuditEntry> Filtered(ClinicDb db, AuditRequest request)
    {
        var entries = db.AuditEntries.AsNoTracking();
        if (request.From is { } from)
        {
            entries = entries.Where(entry => entry.At >= from);
        }

        if (request.Until is { } until)
        {
            entries = entries.Where(entry => entry.At < until);
        }

        if (request.PatientId is { } patient)
        {
            entries = entries.Where(entry => entry.PatientId == patient);
        }

        foreach (var word in SearchFolding.Fold(request.Patient).Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            entries = entries.Where(entry => db.Patients.Any(patient => patient.Id == entry.PatientId && patient.SearchText.Contains(word)));
        }

        if (request.ChangesOnly)
        {
            entries = entries.Where(entry => entry.What != ChartQuery.Opened);
        }

        return string.IsNullOrWhiteSpace(request.Person)
            ? entries
            : entries.Where(entry => entry.ByName.ToLower().Contains(request.Person.Trim().ToLower()));
    }
}
