using AngleSharp.Dom;
using Bunit;
using HfClinic.Clinical.Values;
using HfClinic.Records.Readings;
using HfClinic.Testing;
using HfClinic.Web.DailyWeights;
using Microsoft.AspNetCore.Components.Web;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Web.Tests.DailyWeights;

public class QuickLineTests : PageTest
{
    [Fact]
    public async Task A_line_is_recorded_and_said_and_the_next_can_begin()
    {
        await Clinic.EnrolAsync();
        var page = OpenPage();
        await TypeAsync(page, "elsmere", "164.5 lb", "118/72", "88", "ankles, dizzy");
        Assert.Equal("164.5 lb = 74.6 kg", page.Find("output[for=quick-weight]").TextContent);
        Assert.Equal("ankles swollen and dizzy", page.Find("output[for=quick-symptoms]").TextContent);

        await page.Find(".quick-line").SubmitAsync();

        page.WaitForAssertion(() => Assert.Contains(
            "Recorded for Elsmere, Oda (T-100): 74.6 kg, BP 118/72, pulse 88, ankles swollen and dizzy.", page.Find(".quick-result").TextContent, StringComparison.Ordinal));
        Assert.All(page.FindAll(".quick-line input"), input => Assert.True(string.IsNullOrEmpty(input.GetAttribute("value"))));
        await using var db = Clinic.OpenDb();
        var weight = await db.Readings.SingleAsync(reading => reading.Kind == ReadingKind.Weight, Token);
        Assert.Equal((74_616, "164.5 lb", ReadingSource.Phone), (weight.Value, weight.AsTyped, weight.Source));
    }

    [Fact]
    public async Task Every_refusal_stands_beside_its_field_and_nothing_typed_is_lost()
    {
        await Clinic.EnrolAsync();
        var page = OpenPage();
        await TypeAsync(page, "nobody of that name", "heavy", "118", "fast", "breathless");
        await page.Find(".quick-line").SubmitAsync();

        page.WaitForAssertion(() => Assert.Equal(5, page.FindAll(".quick-line .field-problem").Count));
        Assert.Equal(["nobody of that name", "heavy", "118", "fast", "breathless"], page.FindAll(".quick-line input").Select(input => input.GetAttribute("value")));
        await using var db = Clinic.OpenDb();
        Assert.False(await db.Readings.AnyAsync(Token));
    }

    [Fact]
    public async Task A_weight_outside_the_range_is_refused_beside_its_field()
    {
        await Clinic.EnrolAsync();
        var page = OpenPage();
        await TypeAsync(page, "T-100", "741", "", "", "");
        await page.Find(".quick-line").SubmitAsync();

        page.WaitForAssertion(() => Assert.Contains("outside 25 to 300 kg", page.Find("#quick-weight-problem").TextContent, StringComparison.Ordinal));
        Assert.Equal("741", page.Find("#quick-weight").GetAttribute("value"));
    }

    [Fact]
    public async Task Of_several_people_the_person_at_the_keys_chooses()
    {
        await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-1", GivenName = "Oda" });
        await Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-2", GivenName = "Wilma" });
        var page = OpenPage();
        await TypeAsync(page, "elsmere", "74.6", "", "", "");
        await page.Find(".quick-line").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("2 people match", page.Find("#quick-who-problem").TextContent, StringComparison.Ordinal));

        await page.Find("#quick-who").KeyDownAsync(new KeyboardEventArgs { Key = "ArrowDown" });
        await page.Find("#quick-who").KeyDownAsync(new KeyboardEventArgs { Key = "ArrowDown" });
        Assert.Equal("quick-person-1", page.Find("#quick-who").GetAttribute("aria-activedescendant"));
        await page.Find(".quick-line").SubmitAsync();

        page.WaitForAssertion(() => Assert.Contains("Recorded for Elsmere, Wilma (T-2)", page.Find(".quick-result").TextContent, StringComparison.Ordinal));
    }

    [Fact]
    public async Task A_weight_that_does_not_fit_is_set_aside_and_can_be_confirmed_in_place()
    {
        var patient = await Clinic.EnrolAsync();
        for (var back = 10; back >= 1; back--)
        {
            await Clinic.WeighAsync(patient, Today.AddDays(-back), 64.2m);
        }

        var page = OpenPage();
        await TypeAsync(page, "elsmere", "141.6", "", "", "");
        await page.Find(".quick-line").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("141.6 kg looks like pounds, would then be 64.2 kg", page.Find(".quick-result").TextContent, StringComparison.Ordinal));

        await page.Find(".quick-result button").ClickAsync();

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.Equal(ReadingState.Accepted, db.Readings.AsNoTracking().Single(reading => reading.Value == 141_600).State));
    }

    [Fact]
    public async Task With_the_database_away_it_says_so_and_keeps_the_line()
    {
        await Clinic.EnrolAsync();
        var page = OpenPage();
        await TypeAsync(page, "elsmere", "74.6", "118/72", "", "");
        Database.IsAway = true;
        await page.Find(".quick-line").SubmitAsync();

        page.WaitForAssertion(() => Assert.Contains("The database does not answer", page.Find(".quick-line [role=alert]").TextContent, StringComparison.Ordinal));
        Assert.Equal(["elsmere", "74.6", "118/72"], page.FindAll(".quick-line input").Select(input => input.GetAttribute("value")).Take(3));
        Database.IsAway = false;
        await page.Find(".quick-line").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("Recorded for Elsmere, Oda", page.Find(".quick-result").TextContent, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Unknown_words_are_said_and_offered_as_a_note()
    {
        await Clinic.EnrolAsync();
        var page = OpenPage();
        await TypeAsync(page, "elsmere", "", "", "", "ankles, itchy");
        await page.Find(".quick-line").SubmitAsync();
        page.WaitForAssertion(() => Assert.Contains("“itchy”", page.Find("#quick-symptoms-problem").TextContent, StringComparison.Ordinal));

        await page.Find(".quick-symptoms button").ClickAsync();

        await using var db = Clinic.OpenDb();
        page.WaitForAssertion(() => Assert.Equal((Symptoms.AnkleSwelling, "itchy"), db.SymptomReports.AsNoTracking().AsEnumerable().Select(report => (report.Symptoms, report.Note)).Single()));
    }

    private static async Task TypeAsync(IRenderedComponent<DailyWeightsPage> page, params string[] texts)
    {
        string[] fields = ["#quick-who", "#quick-weight", "#quick-pressure", "#quick-pulse", "#quick-symptoms"];
        foreach (var (field, text) in fields.Zip(texts))
        {
            await page.Find(field).InputAsync(text);
        }
    }
}
