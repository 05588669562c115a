using Bunit;
using HfClinic.Records.Access;
using HfClinic.Records.Flags;
using HfClinic.Testing;
using HfClinic.Web.FlagsInUse;
using HfClinic.Web.Shell;
using HfClinic.Web.Tests.Pages;
using HfClinic.Web.Ui;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Web.Tests.FlagsInUse;

public class FlagsInUsePageTests
{
    private static CancellationToken Cancellation => Xunit.TestContext.Current.CancellationToken;

    [Fact]
    public async Task Tells_by_kind_how_often_flags_stood_and_how_soon_they_were_answered()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Coordinator);
        await pages.Clinic.EnrolWithGainAsync();
        await using (var db = pages.Clinic.OpenDb())
        {
            var gain = await db.Flags.Where(flag => flag.RuleId == "volume.gain-3-days").Select(flag => flag.Id).SingleAsync(Cancellation);
            await pages.Clinic.Get<AnswerFlag>().RunAsync(TestClinic.As(ClinicRole.Nurse), gain, "spoken with her", Cancellation);
        }

        pages.Navigation.NavigateTo("flag-behaviour?from=01%20Mar%202026&to=31%20Mar%202026");
        var page = pages.Render<FlagsInUsePage>();

        page.WaitForElement("tbody tr");
        page.Says("01 Mar 2026 to 31 Mar 2026.");
        page.Says("0 of 2 weights, 0 %, were held at entry until a person decided.");
        page.Says("It does not say whether a flag was right, or what was missed.");
        var row = page.FindAll("tbody tr").Single(line => line.QuerySelector("th")!.TextContent == "Gain in 3 days");

        // One flag in 31 days of one person: 100 × 30.4375 / 31.
        Assert.Equal(["1", "98.2", "1 (100 %)", "0", "0", "0"], row.QuerySelectorAll("td").Select(cell => cell.TextContent));
    }

    [Fact]
    public async Task Shows_the_last_thirteen_weeks_unless_other_days_are_asked_for()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { WeighsAtHome = false });
        var page = pages.Render<FlagsInUsePage>();

        page.Says("31 Dec 2025 to 31 Mar 2026.");
        page.Says("No flag was raised in these days");
        page.Says("That does not mean that nothing was wrong.");
        Assert.Equal("last 13 weeks", page.Find(".sentence a[aria-current]").TextContent);
        Assert.Equal("31 Dec 2025", page.Typed("flags-from"));

        await page.TypeAsync("flags-from", "2026-03-30");
        await page.SendAsync("flags-from");

        page.Says("30 Mar 2026 to 31 Mar 2026.");
        Assert.Contains("from=2026-03-30", pages.Navigation.Uri, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("02/03/26", "31 Mar 2026", "flags-from", "02/03/26")]
    [InlineData("31 Mar 2026", "01 Mar 2026", "flags-until", "before the first")]
    public async Task A_period_that_cannot_be_read_is_asked_about_and_kept(string from, string until, string field, string problem)
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        pages.Navigation.NavigateTo($"flag-behaviour?from={Uri.EscapeDataString(from)}&to={Uri.EscapeDataString(until)}");
        var page = pages.Render<FlagsInUsePage>();

        page.WaitForAssertion(() => Assert.Contains(problem, page.Problem(field), StringComparison.Ordinal));
        Assert.Equal((from, until), (page.Typed("flags-from"), page.Typed("flags-until")));
        Assert.Empty(page.FindAll("table"));
    }

    [Fact]
    public async Task Says_when_the_database_does_not_answer()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        await pages.Clinic.EnrolWithGainAsync();
        await pages.BreakAsync("FlagSteps");
        var page = pages.Render<FlagsInUsePage>();
        page.Says(DatabaseAway.WhileReading);
        await pages.BreakAsync("FlagSteps", mend: true);
        await page.Button("Try again").ClickAsync();
        page.WaitForElement("tbody tr");
    }

    [Theory]
    [InlineData(ClinicRole.Nurse, false)]
    [InlineData(ClinicRole.Prescriber, true)]
    [InlineData(ClinicRole.Coordinator, true)]
    [InlineData(ClinicRole.Administrator, false)]
    public void Stands_among_the_pages_of_those_who_may_read_it(ClinicRole role, bool stands) =>
        Assert.Equal(stands, MainNav.PlacesFor(TestClinic.As(role)).Any(place => place.Href == FlagPeriod.Page));

    [Theory]
    [InlineData(0, "0 %")]
    [InlineData(0.0004, "0.04 %")]
    [InlineData(0.0098, "1 %")]
    [InlineData(0.625, "63 %")]
    [InlineData(1, "100 %")]
    public void Few_are_not_shown_as_none(double share, string expected) => Assert.Equal(expected, FlagFigures.Share((decimal)share));
}
