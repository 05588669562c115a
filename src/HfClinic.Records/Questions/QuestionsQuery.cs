using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Questions;

/// <summary>Which questions are asked for.</summary>
public enum QuestionsView
{
    Open = 0,
    AnsweredUnread = 1,
    All = 2,
}

/// <summary>A question with the name of its patient and the words of its flag.</summary>
public sealed record QuestionRow(Question Question, string PatientName, string ClinicNumber, string? FlagStatement);

/// <summary>Reads the questions to the prescribers.</summary>
public sealed class QuestionsQuery(IDbContextFactory<ClinicDb> databases)
{
    /// <summary>A page of questions, the oldest open first, otherwise the newest first.</summary>
    public async Task<IReadOnlyList<QuestionRow>> RowsAsync(QuestionsView view, int skip, int take, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var questions = Filtered(db, view);
        questions = view == QuestionsView.Open ? questions.OrderBy(q => q.AskedAt) : questions.OrderByDescending(q => q.AskedAt);
        return await (from question in questions
                      join patient in db.Patients on question.PatientId equals patient.Id
                      join flag in db.Flags on question.FlagId equals flag.Id into flags
                      from flag in flags.DefaultIfEmpty()
                      select new QuestionRow(question, patient.FamilyName + ", " + patient.GivenName, patient.ClinicNumber,
                          flag == null ? null : flag.Statement))
            .Skip(skip).Take(take).ToListAsync(cancellation);
    }

    /// <summary>How many there are.</summary>
    public async Task<int> CountAsync(QuestionsView view, CancellationToken cancellation = default)
    {
        await using var db = await databases.CreateDbContextAsync(cancellation);
        return await Filtered(db, view).CountAsync(cancellation);
    }

    private static IQueryable<Question> Filtered(ClinicDb db, QuestionsView view) => view switch
    {
        QuestionsView.Open => db.Questions.AsNoTracking().Where(q => q.AnsweredAt == null),
        QuestionsView.AnsweredUnread => db.Questions.AsNoTracking().Where(q => q.AnsweredAt != null && q.AnswerSeenAt == null),
        _ => db.Questions.AsNoTracking(),
    };
}
