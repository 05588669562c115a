using System.Globalization;
using System.Text;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Rules;

/// <summary>The rules as a table for people, generated so that it cannot fall behind the code.</summary>
public static class RuleTable
{
    /// <summary>One line for each rule, in Markdown.</summary>
    public static string Markdown(IEnumerable<IRule> rules, SourceTable sources)
    {
        var text = new StringBuilder();
        text.Append("| Rule | On screen | Version | Stays until answered | Sources |\n");
        text.Append("|---|---|---|---|---|\n");
        foreach (var rule in rules)
        {
            var titles = string.Join("; ", rule.SourceKeys.Select(key => sources[key].Title));
            text.Append(
                CultureInfo.InvariantCulture,
                $"| `{rule.Id}` ({rule.GetType().Name}) | {rule.Title} | {rule.Version} | {(rule.Latches ? "yes" : "no")} | {titles} |\n");
        }

        return text.ToString();
    }
}
