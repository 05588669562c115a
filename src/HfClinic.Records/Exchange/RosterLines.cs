using HfClinic.Records.Patients;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Exchange;

/// <summary>
/// Takes lines of a roster in: enrols people who are new, with their target weight. Somebody enrolled already is never overwritten;
/// the report names what differs.
/// </summary>
internal sealed class RosterLines(FileMapping mapping) : ILineTaker
{
    private readonly RosterLineParser parser = new(mapping);

    /// <summary>Small, because each person enrolled is assessed within the piece of work.</summary>
    public int BatchSize => 50;

    public IReadOnlyCollection<long> Owed => [];

    public void Forget()
    {
        // Nothing is carried from batch to batch.
    }

    public async Task<IReadOnlyList<LineOutcome>> TakeAsync(
        WorkScope scope, long importId, IReadOnlyList<CsvLine> lines, CancellationToken cancellation)
    {
        var parsed = lines.Select(line => parser.Parse(line, scope.Today)).ToList();
        var numbers = parsed.Select(line => line.Details.ClinicNumber.ToUpperInvariant()).Distinct().ToList();
        var enrolled = await scope.Db.Patients.AsNoTracking().Where(patient => numbers.Contains(patient.ClinicNumber))
            .ToDictionaryAsync(patient => patient.ClinicNumber, PatientDetails.Of, cancellation);
        var outcomes = new List<LineOutcome>();
        foreach (var line in parsed)
        {
            outcomes.Add(await TakeAsync(scope, line, enrolled, cancellation));
        }

        return outcomes;
    }

    private async Task<LineOutcome> TakeAsync(
        WorkScope scope, RosterLine line, Dictionary<string, PatientDetails> enrolled, CancellationToken cancellation)
    {
        if (line.Faults.Count > 0)
        {
            return new(line.Source, ImportLineOutcome.Refused, LineFault.Joined(line.Faults));
        }

        var number = line.Details.ClinicNumber.ToUpperInvariant();
        if (enrolled.TryGetValue(number, out var standing))
        {
            return new(line.Source, ImportLineOutcome.Duplicate, Difference(line.Details, standing));
        }

        var id = await EnrolPatient.AddAsync(scope, line.Details, cancellation);
        if (line.Target is { } target)
        {
            await SetTargetWeight.AddAsync(scope, id, target, line.TargetFrom!.Value, "From the roster file.", cancellation);
        }

        enrolled.Add(number, line.Details);
        return new(line.Source, ImportLineOutcome.Accepted, null);
    }

    /// <summary>What the file says otherwise than the record, of the columns it has.</summary>
    private LineFault Difference(PatientDetails inFile, PatientDetails standing)
    {
        (ImportField Field, bool Differs)[] all =
        [
            (ImportField.FamilyName, inFile.FamilyName != standing.FamilyName),
            (ImportField.GivenName, inFile.GivenName != standing.GivenName),
            (ImportField.BirthDate, inFile.BirthDate != standing.BirthDate),
            (ImportField.Sex, inFile.Sex != standing.Sex),
            (ImportField.Height, inFile.HeightCentimetres != standing.HeightCentimetres),
            (ImportField.Phone, inFile.Phone != standing.Phone),
            (ImportField.EnrolledOn, inFile.EnrolledOn != standing.EnrolledOn),
            (ImportField.WeighsAtHome, inFile.WeighsAtHome != standing.WeighsAtHome),
            (ImportField.Household, inFile.Household != standing.Household),
        ];
        var words = all.Where(field => field.Differs && parser.Has(field.Field))
            .Select(field => ImportFields.NameOf(field.Field).ToLowerInvariant()).ToList();
        return words.Count == 0
            ? new("enrolled already", "")
            : new($"enrolled already; differs in {string.Join(", ", words)}", "The record was left as it is. Edit the person in Patients if the file is right.");
    }
}
