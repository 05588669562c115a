using AngleSharp.Html.Dom;
using Bunit;
using HfClinic.Records.Access;
using HfClinic.Records.Exchange;
using HfClinic.Testing;
using HfClinic.Web.ReadingsIn;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Forms;
using Microsoft.Extensions.DependencyInjection;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.ReadingsIn;

public class ReadingsInPageTests
{
    public ReadingsInPageTests() => BunitContext.DefaultWaitTimeout = TimeSpan.FromSeconds(20);

    private const string Good = "clinic number;date;weight;unit\nT-1;2026-03-29 07:00;72,4;kg\nT-1;2026-03-30 07:00;72,6;kg\nT-9;2026-03-30 07:00;80;kg\n";

    [Fact]
    public async Task A_file_is_looked_at_then_read_in_then_its_report_opens()
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var page = bench.Page.Render<ReadingsInPage>();
        page.WaitForAssertion(() => Assert.Contains("No file was read in yet", page.Markup));
        Choose(page, Good);
        page.WaitForAssertion(() => Assert.Contains("3 lines with a heading of 4 columns, separated by semicolons", page.Markup));
        Assert.Equal("2", ((IHtmlSelectElement)page.Find("#column-Weight")).Value);
        Assert.Single(bench.FilesOnDisk);

        await page.Find(".button-main").ClickAsync();
        var navigation = bench.Page.Services.GetRequiredService<NavigationManager>();
        page.WaitForAssertion(() => Assert.Matches("/readings-in/[0-9]+$", navigation.Uri));
        Assert.Empty(bench.FilesOnDisk);

        var id = long.Parse(navigation.Uri.Split('/')[^1], System.Globalization.CultureInfo.InvariantCulture);
        var report = bench.Page.Render<ImportReportPage>(with => with.Add(p => p.ImportId, id));
        report.WaitForAssertion(() => Assert.Contains("Of 3 lines, 2 went in", report.Markup));
        Assert.Contains("Unknown clinic number.", report.Find(".report-lines").TextContent);
        Assert.Equal($"readings-in/{id}?show=refused", report.Find(".sentence a").GetAttribute("href"));
        Assert.EndsWith("report.csv", report.Find("a[download]").GetAttribute("href"));
    }

    [Fact]
    public async Task Dates_that_can_be_read_two_ways_are_asked_about_before_anything_goes_in()
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var page = bench.Page.Render<ReadingsInPage>();
        Choose(page, "clinic number;date;weight kg\nT-1;03/02/2026 07:00;72\nT-1;25/02/2026 07:00;72\n");
        page.WaitForAssertion(() => Assert.Contains("can be read two ways", page.Markup));
        Assert.Contains("such as 25/02/2026 07:00, have the day first", page.Markup);
        await page.Find(".button-main").ClickAsync();
        Assert.Contains("Say whether the day or the month stands first", page.Find("#order-MeasuredAt-problem").TextContent);
        Assert.Empty(bench.Page.Services.GetRequiredService<FilesIn>().UnderWay);

        await page.Find("#order-MeasuredAt").ChangeAsync(new ChangeEventArgs { Value = nameof(DateOrder.DayFirst) });
        Assert.Contains("the day stands first: 03 Feb 2026", page.Find("#order-MeasuredAt").TextContent);
        await page.Find(".button-main").ClickAsync();
        page.WaitForAssertion(() => Assert.Matches("/readings-in/[0-9]+$", bench.Page.Services.GetRequiredService<NavigationManager>().Uri));
    }

    [Fact]
    public async Task A_column_that_is_needed_and_not_found_is_named_beside_its_row()
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var page = bench.Page.Render<ReadingsInPage>();
        Choose(page, "who;date;weight kg\nT-1;2026-02-25 07:00;72\n");
        page.WaitForElement(".button-main");
        await page.Find(".button-main").ClickAsync();
        Assert.Contains("No column is given for: Clinic number", page.Find("#column-ClinicNumber-problem").TextContent);
        await page.Find("#column-ClinicNumber").ChangeAsync(new ChangeEventArgs { Value = "0" });
        Assert.Empty(page.FindAll("#column-ClinicNumber-problem"));
    }

    [Theory]
    [InlineData("", "The file is empty.")]
    [InlineData("%PDF-1.7 and so on", "a PDF")]
    [InlineData("clinic number;weight\n", "no lines")]
    public async Task What_is_no_file_of_lines_is_answered_and_not_kept(string content, string expected)
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var page = bench.Page.Render<ReadingsInPage>();
        Choose(page, content);
        page.WaitForAssertion(() => Assert.Contains(expected, page.Find("#file-problem").TextContent));
        Assert.Empty(bench.FilesOnDisk);
    }

    [Fact]
    public async Task Too_large_a_file_is_answered_before_it_is_sent()
    {
        await using var bench = await ReadingsInBench.StartAsync(new ImportLimits(LargestFile: 20));
        var page = bench.Page.Render<ReadingsInPage>();
        Choose(page, Good);
        page.WaitForAssertion(() => Assert.Contains("MB are taken", page.Find("#file-problem").TextContent));
    }

    [Fact]
    public async Task Leaving_the_page_before_saying_so_keeps_nothing()
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var page = bench.Page.Render<ReadingsInPage>();
        Choose(page, Good);
        page.WaitForElement(".button-main");
        await bench.Page.DisposeComponentsAsync();
        Assert.Empty(bench.FilesOnDisk);
        Assert.Empty(await bench.Clinic.Get<ImportReports>().RunsAsync(5, TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task Leaving_the_page_while_it_is_read_in_does_not_stop_it()
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var page = bench.Page.Render<ReadingsInPage>();
        Choose(page, Good);
        page.WaitForElement(".button-main");
        await page.Find(".button-main").ClickAsync();
        await bench.Page.DisposeComponentsAsync();
        var files = bench.Page.Services.GetRequiredService<FilesIn>();
        for (var tries = 0; files.UnderWay.Count > 0 && tries < 400; tries++)
        {
            await Task.Delay(50, TestContext.Current.CancellationToken);
        }

        var run = Assert.Single(await bench.Clinic.Get<ImportReports>().RunsAsync(5, TestContext.Current.CancellationToken));
        Assert.Equal((ImportState.Done, 2, 1), (run.State, run.Accepted, run.Refused));
    }

    [Fact]
    public async Task A_report_filters_its_lines_and_tells_an_unknown_number()
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var files = bench.Page.Services.GetRequiredService<FilesIn>();
        using var content = new MemoryStream(System.Text.Encoding.UTF8.GetBytes(Good + "T-1;2026-03-30 07:00;72,6;kg\n"));
        var look = await files.ReceiveAsync(content, "a.csv", null, TestContext.Current.CancellationToken);
        var id = await bench.Clinic.Get<ImportFile>().RunAsync(
            TestClinic.As(ClinicRole.Nurse), look, FileMapping.Guess(look), cancellation: TestContext.Current.CancellationToken);

        bench.Page.Services.GetRequiredService<NavigationManager>().NavigateTo($"readings-in/{id}?show=duplicate");
        var report = bench.Page.Render<ImportReportPage>(with => with.Add(p => p.ImportId, id));
        report.WaitForAssertion(() => Assert.Single(report.FindAll(".report-lines tbody tr")));
        Assert.Equal("1 on record already", report.Find(".sentence a[aria-current]").TextContent);
        var none = bench.Page.Render<ImportReportPage>(with => with.Add(p => p.ImportId, 4711));
        none.WaitForAssertion(() => Assert.Contains("No such report", none.Markup));
    }

    [Fact]
    public async Task Files_left_behind_by_a_stopped_program_are_removed_a_day_later()
    {
        await using var bench = await ReadingsInBench.StartAsync();
        var files = bench.Page.Services.GetRequiredService<FilesIn>();
        using var content = new MemoryStream(System.Text.Encoding.UTF8.GetBytes(Good));
        var look = await files.ReceiveAsync(content, "a.csv", null, TestContext.Current.CancellationToken);
        files.RemoveLeftovers(File.GetLastWriteTimeUtc(look.Path).AddHours(23));
        Assert.Single(bench.FilesOnDisk);
        files.RemoveLeftovers(File.GetLastWriteTimeUtc(look.Path).AddHours(25));
        Assert.Empty(bench.FilesOnDisk);
    }

    private static void Choose(IRenderedComponent<ReadingsInPage> page, string content) =>
        page.FindComponent<InputFile>().UploadFiles(InputFileContent.CreateFromText(content, "home.csv"));
}
