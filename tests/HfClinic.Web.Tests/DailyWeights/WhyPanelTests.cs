using Bunit;
using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Records.Access;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Web.DailyWeights;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Web.Tests.DailyWeights;

public class WhyPanelTests : PageTest
{
    [Fact]
    public async Task It_says_what_was_seen_against_which_limit_from_which_source_and_marks_it_seen()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);

        var words = page.Find(".panel").TextContent;
        foreach (var expected in new[] { "Gained 2.6 kg in 3 days.", "Lowest of the 3 days before", "72.0 kg", "28 Mar 2026", "more than 2.0 kg in 3 days (default protocol)", "ESC", "555-0184", "woman" })
        {
            Assert.Contains(expected, words, StringComparison.Ordinal);
        }

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.All(db.Flags.AsNoTracking().Where(flag => flag.State == FlagState.Open).ToList(), flag => Assert.Equal("Test Nurse", flag.SeenByName)));
    }

    [Fact]
    public async Task The_own_trend_is_told_in_amounts_with_their_doubt_and_never_as_a_score()
    {
        var patient = await Clinic.EnrolAtHomeAsync();
        await Clinic.WeighDailyAsync(patient, [.. Enumerable.Range(0, 20).Select(day => day % 2 == 0 ? 80.2m : 79.8m), 80.3m, 80.8m, 81.2m, 81.6m, 82.0m, 82.3m]);
        var page = OpenPage();
        OpenRow(page, patient);

        var words = page.Find(".panel").TextContent;
        Assert.Matches(@"Own trend\s*\d\.\d kg of fluid above own baseline, give or take \d\.\d kg", words);
        Assert.Matches(@"Against target\s*\d\.\d kg above with the scatter taken out, give or take \d\.\d kg", words);
        Assert.Matches(@"Change per week\s*\+\d\.\d kg, give or take \d\.\d kg", words);
        Assert.DoesNotContain("standard deviation", words, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_trend_that_still_learns_says_how_far_it_is()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);

        Assert.Contains(
            "still learning this person’s own scatter: 2 of 7 weights in 14 days. Until then only the plain limits are read.",
            page.Find(".panel").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_call_settles_the_ticked_flags_and_the_work_goes_on_at_the_next_row()
    {
        var first = await Clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "A" });
        var second = await Clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "B" });
        var page = OpenPage();
        OpenRow(page, first);

        await page.Find("[data-key=c]").ClickAsync();
        await page.Find("#call-note").InputAsync("Well, salty meal; will weigh tomorrow.");
        await page.Find(".panel-form").SubmitAsync();

        page.WaitForAssertion(() => Assert.Equal("true", page.Find($"tr[data-key-row='{second}']").GetAttribute("aria-selected")));
        Assert.Contains("Call recorded and", page.Find(".said").TextContent, StringComparison.Ordinal);
        await using var db = Clinic.OpenDb();
        Assert.All(await db.Flags.Where(flag => flag.PatientId == first && flag.State != FlagState.Cleared).ToListAsync(Token), flag => Assert.Equal((FlagState.Answered, "Test Nurse"), (flag.State, flag.AnsweredByName)));
        Assert.Equal("Well, salty meal; will weigh tomorrow.", (await db.Contacts.SingleAsync(Token)).Note);
    }

    [Fact]
    public async Task An_unticked_flag_stays_open()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);
        await page.Find("[data-key=c]").ClickAsync();
        await page.Find("#call-note").InputAsync("Will come on Thursday.");
        await page.FindAll(".ticks input")[0].ChangeAsync(false);
        await page.Find(".panel-form").SubmitAsync();

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.NotEmpty(db.Contacts.AsNoTracking().ToList()));
        Assert.Equal(1, await db.Flags.CountAsync(flag => flag.State == FlagState.Open && flag.RuleId == "volume.gain-3-days", Token));
    }

    [Fact]
    public async Task A_message_left_settles_nothing_by_itself()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);
        await page.Find("[data-key=c]").ClickAsync();
        await page.Find("#call-outcome").ChangeAsync("LeftMessage");
        await page.Find(".panel-form").SubmitAsync();

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.NotEmpty(db.Contacts.AsNoTracking().ToList()));
        Assert.Equal(0, await db.Flags.CountAsync(flag => flag.State == FlagState.Answered, Token));
    }

    [Fact]
    public async Task A_refusal_stands_beside_its_field_and_keeps_what_was_chosen()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);
        await page.Find("[data-key=c]").ClickAsync();
        await page.Find("#call-outcome").ChangeAsync("SpokeWithRelative");
        await page.Find(".panel-form").SubmitAsync();

        page.WaitForAssertion(() => Assert.Contains("word on what came of the call", page.Find("#call-note-problem").TextContent, StringComparison.Ordinal));
        Assert.Equal("true", page.Find("#call-note").GetAttribute("aria-invalid"));
        Assert.Equal("SpokeWithRelative", page.Find("#call-outcome").GetAttribute("value"));
    }

    [Fact]
    public async Task With_the_database_away_the_typed_text_stays_and_can_be_saved_later()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);
        await page.Find("[data-key=a]").ClickAsync();
        await page.Find("#ask-text").InputAsync("Double the dose for three days?");
        Database.IsAway = true;
        await page.Find(".panel-form").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("The database does not answer", page.Find(".panel-form [role=alert]").TextContent, StringComparison.Ordinal));
        Assert.Equal("Double the dose for three days?", page.Find("#ask-text").GetAttribute("value"));

        Database.IsAway = false;
        await page.Find(".panel-form").SubmitAsync();

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.Equal(["Double the dose for three days?"], db.Questions.AsNoTracking().Select(question => question.Text).ToList()));
    }

    [Fact]
    public async Task Typed_text_waits_while_another_row_is_looked_at()
    {
        var first = await Clinic.EnrolWithGainAsync(ClinicSteps.Someone with { ClinicNumber = "A" });
        var second = await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "B" });
        var page = OpenPage();
        OpenRow(page, first);
        await page.Find("[data-key=a]").ClickAsync();
        await page.Find("#ask-text").InputAsync("Half a question");
        OpenRow(page, second);
        page.WaitForAssertion(() => Assert.Empty(page.FindAll("#ask-text")));
        OpenRow(page, first);

        page.WaitForAssertion(() => Assert.Equal("Half a question", page.Find("#ask-text").GetAttribute("value")));
    }

    [Fact]
    public async Task Putting_off_needs_a_day_and_a_reason_and_then_leaves_the_urgency()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        var page = OpenPage();
        OpenRow(page, patient);
        await page.Find("[data-key=p]").ClickAsync();
        await page.Find("#put-off-reason").InputAsync("Visit booked for Thursday");
        await page.Find(".panel-form").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("The day is missing", page.Find("#put-off-until-problem").TextContent, StringComparison.Ordinal));
        Assert.Equal("Visit booked for Thursday", page.Find("#put-off-reason").GetAttribute("value"));

        await page.Find("#put-off-until").ChangeAsync("2026-04-02");
        await page.Find(".panel-form").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("put off until 02 Apr 2026", page.Find(".said").TextContent, StringComparison.Ordinal));
        Clinic.Clock.Advance(TimeSpan.FromSeconds(1));

        page.WaitForAssertion(() => Assert.Contains("put off until 02 Apr 2026", page.Find("td.cell-when").TextContent, StringComparison.Ordinal));
        Assert.Empty(page.FindAll("td.cell-when .urgency"));
    }

    [Fact]
    public async Task What_a_role_may_not_do_is_not_offered()
    {
        var patient = await Clinic.EnrolWithGainAsync();
        await Clinic.HoldWeightAsync(patient, Today, 164.5m, HoldReason.PoundsTakenAsKilograms);
        var page = OpenPage(role: ClinicRole.Coordinator);
        OpenRow(page, patient);

        Assert.Empty(page.FindAll("[data-key=p]"));
        Assert.Empty(page.FindAll(".held button"));
        Assert.Empty(page.FindAll(".quick-line"));
        Assert.NotEmpty(page.FindAll("[data-key=c]"));
        await page.Find("[data-key=c]").ClickAsync();
        Assert.Empty(page.FindAll(".ticks"));
    }

    [Theory]
    [InlineData(0, ReadingState.Accepted)]
    [InlineData(2, ReadingState.StruckOut)]
    public async Task A_held_reading_is_decided_with_a_reason(int button, ReadingState expected)
    {
        var patient = await Clinic.EnrolAsync();
        var reading = await Clinic.HoldWeightAsync(patient, Today, 141.6m, HoldReason.PoundsTakenAsKilograms);
        var page = OpenPage();
        OpenRow(page, patient);
        Assert.Contains("141.6 kg looks like pounds.", page.Find(".held").TextContent, StringComparison.Ordinal);
        await page.FindAll(".held button")[button].ClickAsync();
        await page.Find(".held form").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("The reason is missing", page.Find($"#held-{reading}-reason-problem").TextContent, StringComparison.Ordinal));

        await page.Find($"#held-{reading}-reason").InputAsync("Read back on the phone");
        await page.Find(".held form").SubmitAsync();

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.Equal(expected, db.Readings.AsNoTracking().Single(r => r.Id == reading).State));
    }

    [Fact]
    public async Task A_correction_offers_the_mended_weight_and_keeps_the_wrong_one()
    {
        var patient = await Clinic.EnrolAsync();
        await Clinic.HoldWeightAsync(patient, Today, 141.6m, HoldReason.PoundsTakenAsKilograms);
        var page = OpenPage();
        OpenRow(page, patient);
        await page.FindAll(".held button")[1].ClickAsync();
        Assert.Equal("64.2 kg", page.Find(".held form input").GetAttribute("value"));
        await page.FindAll(".held form input")[1].InputAsync("Scale set to pounds");
        await page.Find(".held form").SubmitAsync();

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.Equal(
            [(141_600, ReadingState.Superseded), (64_200, ReadingState.Accepted)],
            db.Readings.AsNoTracking().OrderBy(r => r.Id).Select(r => new { r.Value, r.State }).AsEnumerable().Select(r => (r.Value, r.State))));
    }
}
