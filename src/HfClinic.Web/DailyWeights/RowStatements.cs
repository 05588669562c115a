using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Volume;
using HfClinic.Records.DailyWeights;

namespace HfClinic.Web.DailyWeights;

/// <summary>What a row says of its open flags.</summary>
/// <param name="Shown">At most <see cref="Most"/> statements of flags, and every check that failed.</param>
/// <param name="More">How many flags are left to the panel.</param>
public sealed record RowStatements(IReadOnlyList<string> Shown, int More)
{
    /// <summary>How many flags a row states.</summary>
    public const int Most = 2;

    private const string Scatter = "day-to-day scatter ";
    private const string Failed = " could not be checked";

    /// <summary>The first flag of the row, and the next that says something of another kind: several limits on one gain say nearly the same.</summary>
    public static RowStatements Of(DailyListRow row, DateOnly today)
    {
        var flags = row.Flags.Where(flag => !(flag.PutOffUntil > today)).ToList();
        var first = flags.Take(1).ToList();
        var next = flags.Skip(1).FirstOrDefault(flag => KindOf(flag) != KindOf(first[0])) ?? flags.ElementAtOrDefault(1);
        List<RowFlag> shown = next is null ? first : [.. first, next];
        var failed = row.Person.Summary.CheckFailed
            ? row.Person.Summary.Why.Split("; ").Where(statement => statement.EndsWith(Failed, StringComparison.Ordinal))
            : [];
        return new([.. shown.Select(flag => InShort(flag.Statement)), .. failed], flags.Count - shown.Count);
    }

    /// <summary>Without the size of the scatter, which stands in the panel.</summary>
    private static string InShort(string statement) =>
        string.Join("; ", statement.Split("; ").Where(clause => !clause.StartsWith(Scatter, StringComparison.Ordinal)));

    private static string KindOf(RowFlag flag) => RuleBook.Find(flag.RuleId) switch
    {
        WeightChangeRule or AboveTarget => "limit on weights",
        TrendRule => "trend",
        _ => flag.RuleId,
    };
}
