using HfClinic.Records.Access;
using HfClinic.Records.Questions;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Questions;

public class QuestionsTests
{
    private const string Words = "She is 3 kg up & says \"my rings don't fit\" –\nmay she come today?";
    private const string Reply = "Yes, today 14:00.\nBring the pill box.";

    private static readonly Actor Nurse = TestClinic.As(ClinicRole.Nurse);
    private static readonly Actor Prescriber = TestClinic.As(ClinicRole.Prescriber);

    private static CancellationToken Cancellation => TestContext.Current.CancellationToken;

    [Theory, BothDatabases]
    public async Task Goes_to_the_prescriber_and_back_word_for_word(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolWithGainAsync();
        await using var db = clinic.OpenDb();
        var flag = await db.Flags.FirstAsync(f => f.RuleId == "volume.gain-3-days", Cancellation);
        var question = await clinic.Get<AskQuestion>().RunAsync(Nurse, id, Words, flag.Id, Cancellation);
        var query = clinic.Get<QuestionsQuery>();
        var open = Assert.Single(await query.RowsAsync(QuestionsView.Open, 0, 10, Cancellation));
        Assert.Equal((Words, "Gained 2.6 kg in 3 days", "Elsmere, Oda", "Test Nurse"),
            (open.Question.Text, open.FlagStatement, open.PatientName, open.Question.AskedByName));
        Assert.Equal(1, (await db.PatientSummaries.AsNoTracking().SingleAsync(Cancellation)).OpenQuestions);

        await clinic.Get<AnswerQuestion>().RunAsync(Prescriber, question, Reply, Cancellation);
        var unread = Assert.Single(await query.RowsAsync(QuestionsView.AnsweredUnread, 0, 10, Cancellation));
        Assert.Equal((Reply, "Test Prescriber"), (unread.Question.Answer, unread.Question.AnsweredByName));
        Assert.Equal(0, (await db.PatientSummaries.AsNoTracking().SingleAsync(Cancellation)).OpenQuestions);

        await clinic.Get<AnswerQuestion>().MarkSeenAsync(Nurse, question, Cancellation);
        Assert.Empty(await query.RowsAsync(QuestionsView.AnsweredUnread, 0, 10, Cancellation));
        Assert.Equal("Test Nurse", (await db.Questions.SingleAsync(Cancellation)).AnswerSeenByName);
    }

    [Theory, BothDatabases]
    public async Task The_second_answer_is_refused_and_shows_the_first(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var question = await clinic.Get<AskQuestion>().RunAsync(Nurse, await clinic.EnrolAsync(), Words, null, Cancellation);
        var answer = clinic.Get<AnswerQuestion>();
        await answer.RunAsync(Prescriber, question, Reply, Cancellation);
        var conflict = await Assert.ThrowsAsync<ChangedMeanwhileException>(() => answer.RunAsync(Prescriber, question, "no", Cancellation));
        Assert.Equal(Reply, Assert.IsType<Question>(conflict.Theirs).Answer);
    }

    [Theory, BothDatabases]
    public async Task The_longest_waiting_comes_first(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        var id = await clinic.EnrolAsync();
        foreach (var text in new[] { "first", "second" })
        {
            await clinic.Get<AskQuestion>().RunAsync(Nurse, id, text, null, Cancellation);
            clinic.Clock.Advance(TimeSpan.FromMinutes(5));
        }

        var open = await clinic.Get<QuestionsQuery>().RowsAsync(QuestionsView.Open, 0, 10, Cancellation);
        Assert.Equal(["first", "second"], open.Select(row => row.Question.Text));
    }

    [Theory, BothDatabases]
    public async Task Refuses_no_words_and_another_patients_flag(DatabaseEngine engine)
    {
        await using var clinic = await TestClinic.StartAsync(engine);
        await clinic.EnrolWithGainAsync();
        var other = await clinic.EnrolAsync(ClinicSteps.Someone with { ClinicNumber = "T-200" });
        await using var db = clinic.OpenDb();
        var flag = await db.Flags.FirstAsync(Cancellation);
        var ask = clinic.Get<AskQuestion>();
        await Assert.ThrowsAsync<RefusedException>(() => ask.RunAsync(Nurse, other, "\n ", null, Cancellation));
        await Assert.ThrowsAsync<NotFoundException>(() => ask.RunAsync(Nurse, other, "why?", flag.Id, Cancellation));
        Assert.Equal(0, await db.Questions.CountAsync(Cancellation));
    }
}
