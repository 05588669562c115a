using Bunit;
using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Records.Access;
using HfClinic.Records.Chart;
using HfClinic.Records.Contacts;
using HfClinic.Records.Patients;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Web.Chart;
using HfClinic.Web.Tests.Pages;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Chart;

public class ChartPageTests
{
    private static readonly DateOnly Today = new(2026, 3, 31);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Fact]
    public async Task Says_that_it_is_loading()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        Assert.Contains("Loading the chart", pages.RenderWaiting<ChartPage>(p => p.Add(x => x.Id, 1)).Text());
    }

    [Fact]
    public async Task An_unknown_number_gives_a_plain_page()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        pages.Render<ChartPage>(p => p.Add(x => x.Id, 4711)).Says("There is no patient with the number 4711");
    }

    [Fact]
    public async Task An_empty_chart_says_so_part_by_part()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var page = Open(pages, await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { WeighsAtHome = false }));
        foreach (var words in new[]
        {
            "No flag is open. That does not mean that nothing is wrong.", "No reading is on record.", "No target weight is set.", "No medicine is on record.",
            "No blood test is on record.", "No visit and no ejection fraction is on record.", "No symptom report is on record.", "No contact is on record.", "Nothing has been asked.",
        })
        {
            page.Says(words);
        }
    }

    [Fact]
    public async Task Shows_the_person_and_the_flag_with_evidence_limit_and_source_and_notes_one_opening()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var page = Open(pages, await pages.Clinic.EnrolWithGainAsync());
        page.Says("77 years, woman · T-100");
        page.Says("Gained 2.6 kg in 3 days");
        page.Says("more than 2.0 kg in 3 days");
        Assert.Contains("ESC", page.Find("#flags .source").TextContent);
        Assert.Contains("highest 74.6 kg", page.Find(".chart-strip svg").GetAttribute("aria-label"));
        await using var db = pages.Clinic.OpenDb();
        Assert.Equal(1, await db.AuditEntries.CountAsync(entry => entry.What == ChartQuery.Opened, Cancellation));
    }

    [Fact]
    public async Task A_nurse_corrects_a_reading_in_place_and_a_refusal_keeps_what_was_typed()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var page = Open(pages, await pages.Clinic.EnrolWithGainAsync());
        page.WaitForElements("#readings tbody tr", 2);
        await page.Button("Correct 74.6 kg").ClickAsync();
        var value = page.Find("#readings input[id^=value-]").Id!;
        await page.TypeAsync(value, "721");
        await page.SendAsync(value);
        Assert.Contains("The reason is missing", page.Problem(value.Replace("value", "reason")));
        Assert.Equal("721", page.Typed(value));

        await page.TypeAsync(value.Replace("value", "reason"), "misheard");
        await page.SendAsync(value);
        page.WaitForAssertion(() => Assert.Contains("outside 25 to 300 kg", page.Problem(value)));
        await page.TypeAsync(value, "72,1");
        await page.SendAsync(value);
        page.WaitForElements("#readings tbody tr", 3);
        page.Says("corrected by Test Nurse, 31 Mar 2026 09:00: misheard");
        Assert.Equal("74.6 kg", page.Find("#readings s").TextContent);
        page.Says("72.1 kg on 31 Mar 2026");
    }

    [Fact]
    public async Task A_held_reading_is_shown_with_its_likely_reason_and_can_be_confirmed()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var id = await pages.Clinic.EnrolAsync();
        await pages.Clinic.HoldWeightAsync(id, Today, 155.0m, HoldReason.PoundsTakenAsKilograms);
        var page = Open(pages, id);
        page.Says("held: 155.0 kg looks like pounds");
        await page.Button("Confirm 155.0 kg").ClickAsync();
        var reason = page.Find("#readings input[id^=reason-]").Id!;
        await page.TypeAsync(reason, "weighed again");
        await page.SendAsync(reason);
        page.Says("confirmed by Test Nurse");
    }

    [Fact]
    public async Task What_a_role_may_not_do_is_absent_and_a_sentence_says_who_can()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var page = Open(pages, await pages.Clinic.EnrolWithGainAsync());
        page.Says("Only a prescriber sets or strikes out a target weight.");
        page.Says("Only a prescriber starts, changes or stops a medicine.");
        page.Says("Only a prescriber sets a threshold for one patient.");
        Assert.Empty(page.FindAll("#target form, #medicines form, #thresholds form"));
    }

    [Fact]
    public async Task A_coordinator_reads_but_does_not_decide_about_readings()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Coordinator);
        var page = Open(pages, await pages.Clinic.EnrolWithGainAsync());
        page.Says("Only a nurse or a prescriber confirms, corrects or strikes out a reading.");
        page.WaitForElements("#readings tbody tr", 2);
        Assert.Empty(page.FindAll("#readings tbody button"));
    }

    [Fact]
    public async Task A_prescriber_sets_a_target_and_strikes_it_out_with_a_reason()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        var page = Open(pages, await pages.Clinic.EnrolWithGainAsync());
        page.WaitForElement("#target-weight");
        await page.TypeAsync("target-weight", "many");
        await page.SendAsync("target-weight");
        Assert.Contains("is not a weight", page.Problem("target-weight"));
        Assert.Equal("many", page.Typed("target-weight"));
        await page.TypeAsync("target-weight", "71.5");
        await page.SendAsync("target-weight");
        page.Says("target 71.5 kg since 31 Mar 2026");
        await page.Button("Strike out the target of 71.5 kg").ClickAsync();
        var strike = page.Find("#target input[id^=strike-target]").Id!;
        await page.TypeAsync(strike, "wrong person");
        await page.SendAsync(strike);
        page.Says("struck out: wrong person");
        page.Says("no target weight");
    }

    [Fact]
    public async Task A_prescriber_changes_the_loop_diuretic_and_sets_a_threshold()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        var page = Open(pages, await pages.Clinic.EnrolAsync());
        page.WaitForElement("#dose-medicine");
        await page.TypeAsync("dose-medicine", "Furosemide");
        await page.SendAsync("dose-medicine");
        Assert.Contains("The dose is missing", page.Problem("dose-milligrams"));
        await page.TypeAsync("dose-milligrams", "40");
        await page.Find("#dose-times").ChangeAsync(new ChangeEventArgs { Value = "2" });
        await page.SendAsync("dose-medicine");
        page.Says("furosemide 40 mg twice daily");

        await page.Find("#threshold-key").ChangeAsync(new ChangeEventArgs { Value = "weight.gain-3-days" });
        await page.TypeAsync("threshold-value", "9 kg");
        await page.TypeAsync("threshold-reason", "swings");
        await page.SendAsync("threshold-value");
        page.WaitForAssertion(() => Assert.Contains("outside the safe range", page.Problem("threshold-value")));
        await page.TypeAsync("threshold-value", "3 kg");
        await page.SendAsync("threshold-value");
        page.Says("Test Prescriber, 31 Mar 2026: swings");
        page.Says("more than 3.0 kg");
    }

    [Fact]
    public async Task A_call_settles_the_flags_ticked_and_needs_words_for_it()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var page = Open(pages, await pages.Clinic.EnrolWithGainAsync());
        page.WaitForElement("#contact-note");
        await page.Find("#contacts fieldset input").ChangeAsync(new ChangeEventArgs { Value = true });
        await page.SendAsync("contact-note");
        Assert.Contains("settled with a word", page.Problem("contact-note"));
        await page.TypeAsync("contact-note", "ate out; weighs again tomorrow");
        await page.SendAsync("contact-note");
        page.Says("Settled by Test Nurse on 31 Mar 2026: ate out; weighs again tomorrow");
        await using var db = pages.Clinic.OpenDb();
        Assert.True(await db.Flags.AnyAsync(flag => flag.State == FlagState.Answered, Cancellation));
        Assert.Equal(ContactOutcome.Spoke, (await db.Contacts.SingleAsync(Cancellation)).Outcome);
    }

    [Fact]
    public async Task Follows_what_others_record_without_losing_what_is_being_typed()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var id = await pages.Clinic.EnrolAsync();
        var page = Open(pages, id);
        page.WaitForElement("#contact-note");
        await page.TypeAsync("contact-note", "half a sen");
        await pages.Services.GetRequiredService<RecordReadings>().RunAsync(TestClinic.As(ClinicRole.Nurse), id,
            new TakenReadings { LocalTime = Today.ToDateTime(new TimeOnly(8, 0)), Weight = Weight.FromKilograms(73.3m) }, Cancellation);
        page.Says("73.3 kg on 31 Mar 2026");
        Assert.Equal("half a sen", page.Typed("contact-note"));
        await using var db = pages.Clinic.OpenDb();
        Assert.Equal(1, await db.AuditEntries.CountAsync(entry => entry.What == ChartQuery.Opened, Cancellation));
    }

    [Fact]
    public async Task Ends_and_resumes_care()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var page = Open(pages, await pages.Clinic.EnrolAsync());
        page.WaitForElement("#leave-reason");
        await page.SendAsync("leave-reason");
        Assert.Contains("The reason is missing", page.Problem("leave-reason"));
        await page.TypeAsync("leave-reason", "moved away");
        await page.SendAsync("leave-reason");
        page.Says("Left the clinic’s care on 31 Mar 2026: moved away");
        await page.Button("Take back").ClickAsync();
        page.WaitForElement("#leave-reason");
        await page.Button("Expect no more weights").ClickAsync();
        page.Says("Does not weigh at home");
    }

    [Fact]
    public async Task Shows_who_changed_what_on_asking()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var id = await pages.Clinic.EnrolAsync();
        await pages.Clinic.Get<EditPatient>().RunAsync(TestClinic.As(ClinicRole.Coordinator), id, 0, ClinicSteps.Someone with { GivenName = "Odá" }, Cancellation);
        var page = Open(pages, id);
        page.WaitForElement("#changes button");
        await page.Button("Show who changed what").ClickAsync();
        page.Says("Patient changed");
        page.Says("Given name: Oda → Odá");
    }

    [Fact]
    public async Task Says_when_the_database_does_not_answer_and_tries_again()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var id = await pages.Clinic.EnrolAsync();
        await pages.BreakAsync("DoseCourses");
        var page = Open(pages, id);
        page.Says(DatabaseAway.WhileReading);
        await pages.BreakAsync("DoseCourses", mend: true);
        await page.Button("Try again").ClickAsync();
        page.Says("Elsmere, Oda");
    }

    private static IRenderedComponent<ChartPage> Open(ClinicPages pages, long id) => pages.Render<ChartPage>(p => p.Add(x => x.Id, id));
}
