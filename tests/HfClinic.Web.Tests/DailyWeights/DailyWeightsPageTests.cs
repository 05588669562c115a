using Bunit;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Settings;
using HfClinic.Testing;
using HfClinic.Web.DailyWeights;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Web.Tests.DailyWeights;

public class DailyWeightsPageTests : PageTest
{
    private static readonly decimal[] Gaining = [.. Enumerable.Range(0, 20).Select(day => day % 2 == 0 ? 80.2m : 79.8m), 80.2m, 80.9m, 81.7m, 82.4m];

    [Fact]
    public async Task Rows_stand_by_urgency_and_say_why()
    {
        await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "QUIET", FamilyName = "Adler" });
        await Clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "GAIN", FamilyName = "Zeller" });

        var page = OpenPage();

        var first = page.FindAll("tr[data-key-row]")[0];
        Assert.Contains("Zeller, Oda", first.TextContent, StringComparison.Ordinal);
        Assert.Contains("Gained 2.6 kg in 3 days", first.TextContent, StringComparison.Ordinal);
        Assert.Contains("no loop diuretic · no contact on record", first.TextContent, StringComparison.Ordinal);
        Assert.Equal("Today", first.QuerySelector(".urgency")!.TextContent);
        Assert.Equal(("74.6", "07:00"), (first.QuerySelector(".weight-today")!.TextContent, first.QuerySelector(".cell-weight .sub")!.TextContent));
        Assert.Contains("+2.6", first.QuerySelectorAll(".signal").Select(value => value.TextContent));
    }

    [Fact]
    public async Task The_view_lives_in_the_address_and_its_link_is_marked()
    {
        await Clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "GAIN" });
        await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "OTHER" });

        var page = OpenPage("daily-weights?view=today");

        Assert.Single(page.FindAll("tr[data-key-row]"));
        Assert.Equal("1 for today", page.Find(".sentence a[aria-current]").TextContent);
        Assert.Contains("1 person shown", page.Markup, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_typed_search_goes_into_the_address_and_finds_without_accents()
    {
        await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-1", FamilyName = "Ó Briain" });
        await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-2", FamilyName = "Moss" });
        var page = OpenPage("daily-weights?sort=name");

        await page.Find("input[type=search]").InputAsync("o briain");
        Clinic.Clock.Advance(TimeSpan.FromSeconds(1));

        page.WaitForAssertion(() => Assert.Single(page.FindAll("tr[data-key-row]")));
        Assert.EndsWith("daily-weights?q=o%20briain&sort=name", Services.GetRequiredService<NavigationManager>().Uri, StringComparison.Ordinal);
        Assert.Equal("o briain", page.Find("input[type=search]").GetAttribute("value"));
    }

    [Fact]
    public void Nobody_yet_says_where_to_begin() => Assert.Contains("Nobody is on home weighing yet", OpenPage().Markup, StringComparison.Ordinal);

    [Fact]
    public async Task Nobody_in_a_filter_leads_back_and_promises_nothing()
    {
        await Clinic.EnrolAsync();
        var page = OpenPage("daily-weights?view=to-check");
        Assert.Contains("Nobody matches this filter", page.Markup, StringComparison.Ordinal);
        Assert.Equal("daily-weights", page.Find(".state a").GetAttribute("href"));
    }

    [Fact]
    public async Task A_database_away_is_said_and_a_retry_brings_the_list()
    {
        await Clinic.EnrolAsync();
        Database.IsAway = true;
        var page = OpenPage();
        Assert.Contains("The daily weights could not be loaded", page.Find("[role=alert]").TextContent, StringComparison.Ordinal);

        Database.IsAway = false;
        await page.Find("[role=alert] button").ClickAsync();

        page.WaitForAssertion(() => Assert.Single(page.FindAll("tr[data-key-row]")));
    }

    [Fact]
    public async Task News_appear_by_themselves_and_neither_selection_nor_typed_text_is_lost()
    {
        var patient = await Clinic.EnrolAsync();
        var page = OpenPage();
        OpenRow(page, patient);
        await page.Find("#quick-weight").InputAsync("70");

        await Clinic.WeighAsync(patient, Today, 71.2m);
        Clinic.Clock.Advance(TimeSpan.FromSeconds(1));

        page.WaitForAssertion(() => Assert.Contains("71.2", page.Find(".cell-weight .weight-today").TextContent, StringComparison.Ordinal));
        Assert.Equal("true", page.Find("tr[data-key-row]").GetAttribute("aria-selected"));
        Assert.Equal("70", page.Find("#quick-weight").GetAttribute("value"));
    }

    [Fact]
    public async Task A_list_that_cannot_be_read_again_stays_and_says_as_of_when()
    {
        var patient = await Clinic.EnrolAsync();
        var page = OpenPage();
        await Clinic.WeighAsync(patient, Today, 71.2m);
        Database.IsAway = true;
        Clinic.Clock.Advance(TimeSpan.FromSeconds(1));

        page.WaitForAssertion(() => Assert.Contains("shows what stood at 09:00", page.Find(".notice").TextContent, StringComparison.Ordinal));
        Assert.Single(page.FindAll("tr[data-key-row]"));
    }

    [Fact]
    public async Task The_silent_and_the_held_say_so_and_show_no_changes()
    {
        var silent = await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "SILENT" });
        await Clinic.WeighAsync(silent, Today.AddDays(-6), 70.0m);
        var held = await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "HELD" });
        await Clinic.WeighAsync(held, Today.AddDays(-1), 64.2m);
        await Clinic.HoldWeightAsync(held, Today, 141.6m, HoldReason.PoundsTakenAsKilograms);

        var page = OpenPage();

        Assert.Equal(["none25 Mar", "held07:00"], new[] { silent, held }.Select(id => page.Find($"tr[data-key-row='{id}'] .cell-weight").TextContent));
        Assert.All(page.FindAll("td.cell-change"), cell => Assert.Contains("not known", cell.TextContent, StringComparison.Ordinal));
    }

    [Fact]
    public async Task A_person_without_flags_is_given_no_word_of_reassurance()
    {
        var patient = await Clinic.EnrolAsync();
        await Clinic.WeighAsync(patient, Today, 71.2m);
        var page = OpenPage();
        OpenRow(page, patient);

        Assert.Empty(page.FindAll("td .urgency"));
        Assert.Contains("No flag does not mean no fluid.", page.Find(".panel").TextContent, StringComparison.Ordinal);
        var row = page.Find("td.cell-why").TextContent;
        Assert.Contains("trend still learning (1 of 7 weights in 14 days)", row, StringComparison.Ordinal);
        Assert.Contains("gain in 3 days not known", row, StringComparison.Ordinal);
        Assert.DoesNotContain("symptom", row, StringComparison.Ordinal);
        Assert.Contains("Not asked about symptoms in the last 3 days", page.Find(".panel").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_row_states_two_flags_of_different_kinds_and_leaves_the_others_to_the_panel_and_paper()
    {
        var patient = await Clinic.EnrolAtHomeAsync();
        await Clinic.WeighDailyAsync(patient, Gaining);
        var page = OpenPage();
        OpenRow(page, patient);

        var shown = page.Find("td.cell-why .why.unprinted").TextContent;
        Assert.Matches(@"^Gained 2\.\d kg in 3 days\. \d\.\d kg above own baseline over \d days\.$", shown);
        Assert.Contains("And 2 more", page.Find("td.cell-why .sub").TextContent, StringComparison.Ordinal);
        Assert.Equal(4, page.FindAll(".panel .why-flag").Count);
        var paper = page.Find("td.cell-why .printed").TextContent;
        Assert.All(["Gained 2.6 kg in 7 days", "Above target by"], words => Assert.Contains(words, paper, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Sixty_rows_come_at_a_time()
    {
        await using (var db = Clinic.OpenDb())
        {
            await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-0" });
            for (var at = 1; at <= 64; at++)
            {
                db.Patients.Add(new() { ClinicNumber = $"T-{at}", FamilyName = $"Number {at}", GivenName = "Oda", SearchText = $"number {at}", EnrolledOn = Today.AddDays(-30), WeighsAtHome = true });
            }

            await db.SaveChangesAsync(Token);
            db.PatientSummaries.AddRange((await db.Patients.Where(p => p.ClinicNumber != "T-0").Select(p => p.Id).ToListAsync(Token)).Select(id => new Records.Flags.PatientSummary { PatientId = id, OnDailyWeights = true, AsOf = Today }));
            await db.SaveChangesAsync(Token);
        }

        var page = OpenPage();
        Assert.Equal(DailyWeightsPage.RowsAtATime, page.FindAll("tr[data-key-row]").Count);
        Assert.Contains("60 of 65 shown", page.Markup, StringComparison.Ordinal);

        await page.Find(".list-end button").ClickAsync();

        page.WaitForAssertion(() => Assert.Equal(65, page.FindAll("tr[data-key-row]").Count));
    }

    [Fact]
    public async Task A_clinic_that_weighs_in_pounds_reads_pounds()
    {
        await using (var db = Clinic.OpenDb())
        {
            (await db.Settings.SingleAsync(Token)).WeightUnit = WeightUnit.Pounds;
            await db.SaveChangesAsync(Token);
            await Clinic.Get<CurrentSettings>().RefreshAsync(db, Token);
        }

        await Clinic.EnrolWithGainAsync();
        AddAuthorization().SetAuthorized("nurse").SetRoles(nameof(ClinicRole.Nurse))
            .SetClaims(new System.Security.Claims.Claim(System.Security.Claims.ClaimTypes.NameIdentifier, Guid.Empty.ToString()));
        var page = Render<CascadingValue<WeightUnit>>(p => p.Add(x => x.Value, WeightUnit.Pounds).AddChildContent<DailyWeightsPage>());

        page.WaitForAssertion(() => Assert.Equal("164.5", page.Find(".weight-today").TextContent));
        Assert.Contains("Weight, lb", page.Find("thead").TextContent, StringComparison.Ordinal);
        Assert.Contains("last 164.5 lb", page.Find("svg.strip").GetAttribute("aria-label")!, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_keys_of_the_page_all_press_something()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);

        foreach (var key in new[] { PanelKeys.Call, PanelKeys.Ask, PanelKeys.PutOff, PanelKeys.QuickLine, "/", "Escape" })
        {
            Assert.NotEmpty(page.FindAll($"[data-key='{key}']"));
        }
    }
}
