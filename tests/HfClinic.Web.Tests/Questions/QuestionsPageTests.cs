using Bunit;
using HfClinic.Records.Access;
using HfClinic.Records.Questions;
using HfClinic.Testing;
using HfClinic.Web.Questions;
using HfClinic.Web.Tests.Pages;
using HfClinic.Web.Ui;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Questions;

public class QuestionsPageTests
{
    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Fact]
    public async Task Says_that_it_is_loading()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        Assert.Contains("Loading the questions", pages.RenderWaiting<QuestionsPage>().Text());
    }

    [Fact]
    public async Task Says_that_no_question_waits()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        pages.Render<QuestionsPage>().Says("No question waits for an answer.");
    }

    [Fact]
    public async Task A_prescriber_answers_word_for_word_the_oldest_first()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        await AskAsync(pages, "First <b>question</b>?");
        pages.Clinic.Clock.Advance(TimeSpan.FromMinutes(5));
        await AskAsync(pages, "Second?", "T-200");
        var page = pages.Render<QuestionsPage>();
        page.WaitForElements(".question", 2);
        Assert.Equal(["First <b>question</b>?", "Second?"], page.FindAll(".question blockquote").Select(words => words.TextContent));
        page.Says("Test Nurse asked on 31 Mar 2026 09:00");

        var answer = page.Find("textarea").Id!;
        await page.SendAsync(answer);
        Assert.Contains("missing", page.Problem(answer));
        await page.TypeAsync(answer, "Yes.\n  Today.");
        await page.SendAsync(answer);
        page.WaitForElements(".question", 1);
        await using var db = pages.Clinic.OpenDb();
        Assert.Equal("Yes.\n  Today.", (await db.Questions.SingleAsync(question => question.Answer != null, Cancellation)).Answer);
    }

    [Fact]
    public async Task The_second_answer_stays_typed_and_sees_the_first()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Prescriber);
        var question = await AskAsync(pages, "May she come?");
        var page = pages.Render<QuestionsPage>();
        var answer = page.WaitForElement("textarea").Id!;
        await pages.Clinic.Get<AnswerQuestion>().RunAsync(TestClinic.As(ClinicRole.Prescriber), question, "Yes, at noon.", Cancellation);
        await page.TypeAsync(answer, "No.");
        await page.SendAsync(answer);
        page.Says("answered this meanwhile");
        page.Says("Yes, at noon.");
        Assert.Equal("No.", page.Typed(answer));
    }

    [Fact]
    public async Task A_nurse_sees_the_answers_nobody_has_read_and_marks_one_read()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        var question = await AskAsync(pages, "May she come?");
        var page = pages.Render<QuestionsPage>();
        page.Says("Every answer has been read.");
        await pages.Services.GetRequiredService<AnswerQuestion>().RunAsync(TestClinic.As(ClinicRole.Prescriber), question, "Yes, at noon.", Cancellation);
        page.Says("Yes, at noon.");
        await page.Button("I have read this answer").ClickAsync();
        page.Says("Every answer has been read.");
        Assert.Empty(page.FindAll("textarea"));
    }

    [Fact]
    public async Task Says_when_the_database_does_not_answer()
    {
        await using var pages = await ClinicPages.StartAsync(ClinicRole.Nurse);
        await pages.BreakAsync("Questions");
        var page = pages.Render<QuestionsPage>();
        page.Says(DatabaseAway.WhileReading);
        await pages.BreakAsync("Questions", mend: true);
        await page.Button("Try again").ClickAsync();
        page.Says("Every answer has been read.");
    }

    private static async Task<long> AskAsync(ClinicPages pages, string text, string number = "T-100") => await pages.Clinic.Get<AskQuestion>().RunAsync(
        TestClinic.As(ClinicRole.Nurse), await pages.Clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = number }), text, null, Cancellation);
}
