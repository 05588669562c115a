using Bunit;
using HfClinic.Clinical.Rules;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;

namespace HfClinic.Web.Tests.Ui;

public class LeafTests : BunitContext
{
    [Theory]
    [InlineData(Urgency.Today, "Today", "urgency-today")]
    [InlineData(Urgency.ThisWeek, "This week", "urgency-week")]
    [InlineData(Urgency.NextVisit, "Next visit", "urgency-visit")]
    [InlineData(Urgency.ForInformation, "For information", "urgency-information")]
    public void Urgency_is_a_word_with_its_weight(Urgency urgency, string word, string style)
    {
        var mark = Render<UrgencyMark>(p => p.Add(x => x.Urgency, urgency)).Find(".urgency");
        Assert.Equal(word, mark.TextContent);
        Assert.Contains(style, mark.ClassList);
    }

    [Fact]
    public void Putting_off_is_said_with_its_day() =>
        Assert.Equal("put off until 05 Dec 2026", Render<UrgencyMark>(p => p.Add(x => x.PutOffUntil, new DateOnly(2026, 12, 5))).Find(".urgency-put-off").TextContent);

    [Fact]
    public void No_urgency_says_nothing() => Assert.Equal("", Render<UrgencyMark>().Markup.Trim());

    [Fact]
    public void An_unknown_change_is_not_a_zero() => Assert.Contains("not known", Render<ChangeCell>().Markup, StringComparison.Ordinal);

    [Fact]
    public void The_change_that_raised_a_flag_is_said_in_words_too()
    {
        var cell = Render<ChangeCell>(p => p.Add(x => x.Grams, 3_100).Add(x => x.Raised, true));
        Assert.Equal("+3.1", cell.Find(".signal").TextContent);
        Assert.Equal(" raised the flag", cell.Find(".unseen").TextContent);
    }

    [Fact]
    public void A_sentence_reads_on_with_its_counts_as_links()
    {
        var sentence = Render<SentenceFilter>(p => p.Add(x => x.Parts,
            [new("212 people. "), new("9 for today", "?show=today", Chosen: true), new(", "), new("14 this week", "?show=week")]));

        Assert.Equal("212 people. 9 for today, 14 this week", string.Join(' ', sentence.Find("p").TextContent.Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries)).Replace(" ,", ",", StringComparison.Ordinal));
        Assert.Equal(["true", null], sentence.FindAll("a").Select(a => a.GetAttribute("aria-current")));
    }

    [Fact]
    public void Evidence_names_value_day_limit_and_source()
    {
        var rows = Render<EvidenceTable>(p => p
            .Add(x => x.Evidence, [new Evidence("Today", "74.5 kg", new DateOnly(2026, 12, 1), RaisedIt: true)])
            .Add(x => x.Limit, "more than 2.0 kg in 3 days")
            .Add(x => x.Sources, ["First source", "Second source"])).FindAll("tr");

        Assert.Equal(["Today", "Limit", "Source"], rows.Select(r => r.QuerySelector("th")!.TextContent));
        Assert.Contains("01 Dec 2026", rows[0].TextContent, StringComparison.Ordinal);
        Assert.Contains("raised the flag", rows[0].TextContent, StringComparison.Ordinal);
        Assert.Equal("First source; Second source", rows[2].QuerySelector("td")!.TextContent);
    }

    [Fact]
    public void A_failed_load_says_why_and_can_be_tried_again()
    {
        var tries = 0;
        var failed = Render<LoadFailed>(p => p.Add(x => x.What, "The daily weights").Add(x => x.Message, "The database did not answer.")
            .Add(x => x.OnRetry, EventCallback.Factory.Create(this, () => tries++)));

        Assert.Contains("The database did not answer.", failed.Find("[role=alert]").TextContent, StringComparison.Ordinal);
        failed.Find("button").Click();
        Assert.Equal(1, tries);
    }

    [Fact]
    public void A_fault_in_one_part_is_kept_there_and_can_be_tried_again()
    {
        var broken = true;
        var panel = Render<ErrorPanel>(p => p.Add(x => x.What, "panel").AddChildContent(b =>
        {
            if (broken)
            {
                throw new InvalidOperationException("unexpected");
            }

            b.AddContent(0, "mended");
        }));

        Assert.Contains("This panel could not be shown", panel.Markup, StringComparison.Ordinal);
        Assert.DoesNotContain("unexpected fault: unexpected", panel.Markup, StringComparison.Ordinal);
        broken = false;
        panel.Find("button").Click();
        Assert.Equal("mended", panel.Markup.Trim());
    }

    [Fact]
    public void A_field_without_a_problem_shows_none()
    {
        Assert.Equal("", Render<FieldProblem>(p => p.Add(x => x.Id, "w")).Markup.Trim());
        Assert.Equal("w", Render<FieldProblem>(p => p.Add(x => x.Id, "w").Add(x => x.Message, "Type a weight.")).Find("[role=alert]").Id);
    }

    [Fact]
    public void The_caution_is_word_for_word() => Assert.Equal(
        "Decision support for trained staff. The prescriber decides; follow local protocol. Not for emergencies.",
        Render<Caution>().Find("footer").TextContent);

    [Fact]
    public void Every_printed_page_carries_the_same_caution() => Assert.Contains(
        $"@bottom-left {{ content: \"{Caution.Text}\"",
        File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Files", "clinic.css")),
        StringComparison.Ordinal);
}
