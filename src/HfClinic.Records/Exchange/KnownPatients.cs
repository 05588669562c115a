using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Exchange;

/// <summary>A patient as a file of readings needs to know one.</summary>
internal sealed record KnownPatient(long Id, DateOnly? LeftOn);

/// <summary>Finds the patients of a file by clinic number, asking the database once for each number found.</summary>
internal sealed class KnownPatients
{
    private readonly Dictionary<string, KnownPatient> found = [];

    /// <summary>The patients of these numbers; unknown numbers are missing from the answer.</summary>
    public async Task<IReadOnlyDictionary<string, KnownPatient>> FindAsync(
        ClinicDb db, IEnumerable<string> clinicNumbers, CancellationToken cancellation)
    {
        var asked = clinicNumbers.Where(number => number.Length > 0 && !found.ContainsKey(number)).Distinct().ToList();
        if (asked.Count > 0)
        {
            var rows = await db.Patients.AsNoTracking().Where(patient => asked.Contains(patient.ClinicNumber))
                .Select(patient => new { patient.ClinicNumber, patient.Id, patient.LeftOn }).ToListAsync(cancellation);
            foreach (var row in rows)
            {
                found[row.ClinicNumber] = new(row.Id, row.LeftOn);
            }
        }

        return found;
    }
}
