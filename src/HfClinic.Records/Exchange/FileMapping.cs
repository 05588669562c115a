using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.Records.Exchange;

/// <summary>What the person says about a file: what it holds, which column is what, and how to read what a file leaves open.</summary>
public sealed record FileMapping
{
    public required ImportKind Kind { get; init; }

    /// <summary>The column of each field, counted from 0. A field without an entry is not in the file.</summary>
    public ImmutableDictionary<ImportField, int> Columns { get; init; } = ImmutableDictionary<ImportField, int>.Empty;

    /// <summary>How dates that can be read two ways are read, by field.</summary>
    public ImmutableDictionary<ImportField, DateOrder> DateOrders { get; init; } = ImmutableDictionary<ImportField, DateOrder>.Empty;

    /// <summary>The unit of a weight that has none beside it.</summary>
    public WeightUnit? UnitWhenMissing { get; init; }

    /// <summary>The time of day of a reading that has none.</summary>
    public TimeOnly? TimeWhenMissing { get; init; }

    /// <summary>The column of a field, or null.</summary>
    public int? ColumnOf(ImportField field) => Columns.TryGetValue(field, out var at) ? at : null;

    /// <summary>A first guess from the headings. Nothing is guessed about dates that can be read two ways, nor about a missing unit or time.</summary>
    public static FileMapping Guess(FileLook look)
    {
        var roster = Guess(look, ImportKind.Roster);
        return roster.Columns.ContainsKey(ImportField.FamilyName) ? roster : Guess(look, ImportKind.HomeReadings);
    }

    /// <summary>A first guess from the headings for a file of this kind.</summary>
    public static FileMapping Guess(FileLook look, ImportKind kind)
    {
        var columns = ImmutableDictionary.CreateBuilder<ImportField, int>();
        foreach (var info in ImportFields.Of(kind))
        {
            var at = look.Columns.ToList().FindIndex(column => ImportFields.Means(info, column.Heading));
            if (at >= 0 && !columns.ContainsValue(at))
            {
                columns.Add(info.Field, at);
            }
        }

        var inHeading = columns.TryGetValue(ImportField.Weight, out var weight) ? ImportFields.UnitInHeading(look.Columns[weight].Heading) : null;
        return new FileMapping { Kind = kind, Columns = columns.ToImmutable(), UnitWhenMissing = inHeading };
    }

    /// <summary>What the person still has to say, by field name; empty when the file can be read in.</summary>
    public IReadOnlyList<Problem> Problems(FileLook look)
    {
        var problems = new List<Problem>();
        foreach (var info in ImportFields.Of(Kind).Where(info => info.Required && ColumnOf(info.Field) is null))
        {
            problems.Add(new(info.Field.ToString(), $"No column is given for: {info.Name}.", "Choose the column that holds it."));
        }

        foreach (var twice in Columns.GroupBy(entry => entry.Value).Where(group => group.Count() > 1))
        {
            problems.Add(new(twice.Last().Key.ToString(),
                $"The column “{look.Columns[twice.Key].Heading}” is given to {string.Join(" and ", twice.Select(entry => ImportFields.NameOf(entry.Key)))}.",
                "Give each its own column."));
        }

        if (Kind == ImportKind.HomeReadings && !Columns.Keys.Any(ReadingLineParser.IsMeasured))
        {
            problems.Add(new(nameof(ImportField.Weight), "No column holds a weight, a pressure, a pulse or a saturation.", "Choose at least one."));
        }

        problems.AddRange(OpenDates(look).Select(open => new Problem(open.Field.ToString(),
            $"Dates such as {open.Column.EitherWayExample} can be read two ways.", "Say whether the day or the month stands first.")));
        return problems;
    }

    /// <summary>The date columns whose order nobody has said yet.</summary>
    public IEnumerable<(ImportField Field, ColumnLook Column)> OpenDates(FileLook look) =>
        AskedDates(look).Where(asked => !DateOrders.ContainsKey(asked.Field));

    /// <summary>The date columns whose order has to be said, answered or not.</summary>
    public IEnumerable<(ImportField Field, ColumnLook Column)> AskedDates(FileLook look) =>
        from info in ImportFields.Of(Kind)
        where info.IsDate && ColumnOf(info.Field) is not null
        let column = look.Columns[ColumnOf(info.Field)!.Value]
        where column.NeedsOrder
        select (info.Field, column);
}
