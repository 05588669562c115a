using HfClinic.Clinical.Values;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;

namespace HfClinic.Records.Exchange;

/// <summary>Reads a line of a file of readings by the mapping, and finds everything wrong with it that the line alone can tell.</summary>
internal sealed class ReadingLineParser(FileMapping mapping, ClinicClock clock)
{
    private const int LongestDevice = 60;
    private const decimal LargestNumber = 100_000;

    /// <summary>Whether a field holds something measured.</summary>
    public static bool IsMeasured(ImportField field) =>
        field is ImportField.Weight or ImportField.Systolic or ImportField.Diastolic or ImportField.Pulse or ImportField.Saturation;

    /// <param name="now">The clinic's wall clock.</param>
    public ReadingLine Parse(CsvLine source, DateTime now)
    {
        var line = new ReadingLine(source, Text(source, ImportField.ClinicNumber).ToUpperInvariant());
        if (line.ClinicNumber.Length == 0)
        {
            line.Faults.Add(LineFault.NoNumber);
        }

        ReadTime(line);
        ReadWeight(line);
        line.Systolic = ReadWhole(line, ImportField.Systolic, "systolic");
        line.Diastolic = ReadWhole(line, ImportField.Diastolic, "diastolic");
        line.Pulse = ReadWhole(line, ImportField.Pulse, "pulse");
        line.Saturation = ReadWhole(line, ImportField.Saturation, "saturation");
        ReadDevice(line);
        Check(line, now);
        return line;
    }

    private string Text(CsvLine source, ImportField field) => source.Field(mapping.ColumnOf(field));

    private void ReadTime(ReadingLine line)
    {
        var text = Text(line.Source, ImportField.MeasuredAt);
        var date = DateText.Read(text, mapping.DateOrders.TryGetValue(ImportField.MeasuredAt, out var order) ? order : null);
        var fault = date.Outcome switch
        {
            _ when text.Length == 0 => LineFault.NoDate,
            DateOutcome.NotADate => LineFault.NotADate,
            DateOutcome.NoSuchDate => LineFault.NoSuchDate,
            DateOutcome.Ambiguous => LineFault.EitherDate,
            DateOutcome.TwoDigitYear => LineFault.TwoDigitYear,
            DateOutcome.NoSuchTime => LineFault.NoSuchTime,
            _ => null,
        };
        if (fault is not null)
        {
            line.Faults.Add(fault);
            return;
        }

        var timeText = Text(line.Source, ImportField.MeasuredTime);
        var apart = timeText.Length > 0 ? DateText.ReadTime(timeText) : null;
        if (timeText.Length > 0 && apart is null)
        {
            line.Faults.Add(LineFault.NoSuchTime);
        }
        else if ((apart?.Time ?? date.Time ?? mapping.TimeWhenMissing) is { } time)
        {
            SetTime(line, date.Day.ToDateTime(time), apart is { } given ? given.Offset : date.Offset);
        }
        else
        {
            line.Faults.Add(LineFault.NoTime);
        }
    }

    private void SetTime(ReadingLine line, DateTime wall, TimeSpan? offset)
    {
        line.MeasuredAt = offset is { } fromUtc && wall.Year is > 1 and < 9999
            ? DateTime.SpecifyKind(wall - fromUtc, DateTimeKind.Utc)
            : clock.ToUtc(wall);
        line.LocalTime = clock.ToLocal(line.MeasuredAt);
    }

    private void ReadWeight(ReadingLine line)
    {
        var text = Text(line.Source, ImportField.Weight);
        if (text.Length == 0)
        {
            return;
        }

        var unitText = Text(line.Source, ImportField.Unit);
        var unit = unitText.Length > 0 ? UnitWords.Read(unitText) : mapping.UnitWhenMissing;
        if (unitText.Length == 0 && SplitUnit(text) is { } split)
        {
            (text, unitText, unit) = split;
        }

        if (unit is null)
        {
            line.Faults.Add(unitText.Length > 0 ? LineFault.UnknownUnit : LineFault.NoUnit);
        }

        if (NumberText.Read(text) is not { } number)
        {
            line.Faults.Add(LineFault.NotANumber);
        }
        else if (number > LargestNumber)
        {
            line.Faults.Add(LineFault.WeightRange);
        }
        else if (unit is { } known)
        {
            line.Weight = known == WeightUnit.Pounds ? Weight.FromPounds(number) : Weight.FromKilograms(number);
            line.WeightAsTyped = $"{text} {(unitText.Length > 0 ? unitText : Wording.Symbol(known))}";
        }
    }

    /// <summary>"164.5 lb" in one column.</summary>
    private static (string Number, string UnitText, WeightUnit? Unit)? SplitUnit(string text)
    {
        var from = text.AsSpan().LastIndexOfAnyInRange('0', '9') + 1;
        var tail = text[from..].Trim();
        return from > 0 && UnitWords.Read(tail) is { } unit ? (text[..from], tail, unit) : null;
    }

    private int? ReadWhole(ReadingLine line, ImportField field, string name)
    {
        var text = Text(line.Source, field);
        if (text.Length == 0)
        {
            return null;
        }

        if (NumberText.ReadWhole(text) is { } number)
        {
            return number;
        }

        line.Faults.Add(LineFault.NotWhole(name));
        return null;
    }

    private void ReadDevice(ReadingLine line)
    {
        var text = Text(line.Source, ImportField.Device);
        if (text.Length > LongestDevice)
        {
            line.Faults.Add(LineFault.LongDevice);
        }
        else if (text.Length > 0)
        {
            line.Device = text;
        }
    }

    /// <summary>The checks every reading goes through, with the short reasons of a report.</summary>
    private void Check(ReadingLine line, DateTime now)
    {
        if (!mapping.Columns.Keys.Where(IsMeasured).Any(field => Text(line.Source, field).Length > 0))
        {
            line.Faults.Add(LineFault.Nothing);
            return;
        }

        var pair = CheckPair(line);
        var hasTime = line.LocalTime != default;
        var taken = new TakenReadings
        {
            LocalTime = hasTime ? line.LocalTime : now,
            Weight = line.Weight,
            SystolicPressure = pair ? line.Systolic : null,
            DiastolicPressure = pair ? line.Diastolic : null,
            HeartRate = line.Pulse,
            OxygenSaturation = line.Saturation,
        };
        foreach (var problem in ReadingChecks.Problems(taken, now).Where(problem => problem.Field.Length > 0))
        {
            line.Faults.Add(problem.Field switch
            {
                nameof(TakenReadings.Weight) => LineFault.WeightRange,
                nameof(TakenReadings.LocalTime) => line.LocalTime > now ? LineFault.InTheFuture : LineFault.LongAgo,
                _ => new LineFault(problem.What.TrimEnd('.'), problem.Mend),
            });
        }
    }

    /// <summary>Whether both pressures are there and the upper is above the lower.</summary>
    private static bool CheckPair(ReadingLine line)
    {
        switch (line.Systolic, line.Diastolic)
        {
            case (null, null):
                return false;
            case ({ } systolic, { } diastolic) when systolic > diastolic:
                return true;
            case ({ }, { }):
                line.Faults.Add(LineFault.PressureOrder);
                return false;
            default:
                if (line.Faults.TrueForAll(fault => !fault.Reason.EndsWith("is not a whole number", StringComparison.Ordinal)))
                {
                    line.Faults.Add(LineFault.OnePressure);
                }

                return false;
        }
    }
}
