using HfClinic.Clinical.Values;
using HfClinic.Records.Patients;

namespace HfClinic.Records.Exchange;

/// <summary>Reads a line of a roster by the mapping, and finds everything wrong with it that the line alone can tell.</summary>
internal sealed class RosterLineParser(FileMapping mapping)
{
    private const decimal LargestKilograms = 100_000;

    public RosterLine Parse(CsvLine source, DateOnly today)
    {
        var line = new RosterLine(source);
        line.Details = new PatientDetails
        {
            ClinicNumber = Text(source, ImportField.ClinicNumber),
            FamilyName = Text(source, ImportField.FamilyName),
            GivenName = Text(source, ImportField.GivenName),
            BirthDate = ReadDay(line, ImportField.BirthDate),
            Sex = ReadSex(line),
            HeightCentimetres = ReadHeight(line),
            Phone = TextRules.OrNull(Text(source, ImportField.Phone)),
            EnrolledOn = ReadDay(line, ImportField.EnrolledOn) ?? today,
            WeighsAtHome = ReadYes(line, ImportField.WeighsAtHome),
            Household = TextRules.OrNull(Text(source, ImportField.Household)),
            Note = TextRules.OrNull(Text(source, ImportField.Note)),
        };
        ReadTarget(line, today);
        line.Faults.AddRange(line.Details.Problems(today).Select(problem => new LineFault(problem.What.TrimEnd('.'), problem.Mend)));
        return line;
    }

    /// <summary>Whether the file says anything in this column.</summary>
    public bool Has(ImportField field) => mapping.ColumnOf(field) is not null;

    private string Text(CsvLine source, ImportField field) => source.Field(mapping.ColumnOf(field));

    private DateOnly? ReadDay(RosterLine line, ImportField field)
    {
        var text = Text(line.Source, field);
        if (text.Length == 0)
        {
            return null;
        }

        var date = DateText.Read(text, mapping.DateOrders.TryGetValue(field, out var order) ? order : null);
        if (date.Outcome == DateOutcome.Read)
        {
            return date.Day;
        }

        var fault = date.Outcome switch
        {
            DateOutcome.NoSuchDate => LineFault.NoSuchDate,
            DateOutcome.Ambiguous => LineFault.EitherDate,
            DateOutcome.TwoDigitYear => LineFault.TwoDigitYear,
            _ => LineFault.NotADate,
        };
        line.Faults.Add(fault with { Reason = $"{ImportFields.NameOf(field).ToLowerInvariant()}: {fault.Reason}" });
        return null;
    }

    private Sex ReadSex(RosterLine line)
    {
        var text = Text(line.Source, ImportField.Sex).ToLowerInvariant();
        switch (text)
        {
            case "":
                return default;
            case "f" or "female" or "woman":
                return Sex.Female;
            case "m" or "male" or "man":
                return Sex.Male;
            default:
                line.Faults.Add(new("sex not known", "Write female or male, or leave it empty."));
                return default;
        }
    }

    private int? ReadHeight(RosterLine line)
    {
        var text = Text(line.Source, ImportField.Height);
        if (text.Length == 0)
        {
            return null;
        }

        if (NumberText.Read(text) is { } height and < 1000)
        {
            return (int)decimal.Round(height, MidpointRounding.AwayFromZero);
        }

        line.Faults.Add(new("height is not a number of centimetres", "Write the height in centimetres."));
        return null;
    }

    private bool ReadYes(RosterLine line, ImportField field)
    {
        var text = Text(line.Source, field).ToLowerInvariant();
        switch (text)
        {
            case "yes" or "y" or "true" or "1" or "x":
                return true;
            case "" or "no" or "n" or "false" or "0":
                return false;
            default:
                line.Faults.Add(new($"{ImportFields.NameOf(field).ToLowerInvariant()} is neither yes nor no", "Write yes or no."));
                return false;
        }
    }

    private void ReadTarget(RosterLine line, DateOnly today)
    {
        var text = Text(line.Source, ImportField.TargetWeight);
        var from = ReadDay(line, ImportField.TargetFrom);
        if (text.Length == 0)
        {
            return;
        }

        if (NumberText.Read(text) is not { } kilograms || kilograms > LargestKilograms)
        {
            line.Faults.Add(new("target weight is not a number", "Write it in kilograms."));
            return;
        }

        (line.Target, line.TargetFrom) = (Weight.FromKilograms(kilograms), from ?? today);
        if (line.Target is { IsInEntryRange: false })
        {
            line.Faults.Add(new("target weight outside 25 to 300 kg", "Check the number; it is read as kilograms."));
        }

        if (line.TargetFrom > today)
        {
            line.Faults.Add(new("target weight set in the future", "Correct the date."));
        }
    }
}
