using System.Text.RegularExpressions;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Rules;

public partial class RuleTableTests
{
    [Fact]
    public async Task The_developers_guide_shows_the_rules_as_they_are()
    {
        var cancel = TestContext.Current.CancellationToken;
        var path = Path.Combine(RepositoryRoot(), "DEVELOPERS.md");
        var table = $"<!-- rules -->\n{RuleTable.Markdown(RuleBook.All.Concat(TitrationRules.All), SourceTable.Load())}<!-- /rules -->";
        var text = await File.ReadAllTextAsync(path, cancel);
        if (Environment.GetEnvironmentVariable("HFCLINIC_WRITE_DOCS") == "1")
        {
            text = Block().Replace(text, _ => table);
            await File.WriteAllTextAsync(path, text, cancel);
        }

        Assert.True(
            text.Contains(table, StringComparison.Ordinal),
            "The rule table in DEVELOPERS.md is not up to date: run the tests once with HFCLINIC_WRITE_DOCS=1.");
    }

    private static string RepositoryRoot()
    {
        var folder = new DirectoryInfo(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "HfClinic.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new InvalidOperationException("No HfClinic.sln above the tests.");
    }

    [GeneratedRegex("<!-- rules -->.*<!-- /rules -->", RegexOptions.Singleline)]
    private static partial Regex Block();
}
