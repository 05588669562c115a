using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Questions;

/// <summary>A prescriber answers a question; a nurse notes that the answer was read.</summary>
public sealed class AnswerQuestion(ClinicWork work)
{
    /// <summary>Stores the answer word for word.</summary>
    /// <exception cref="ChangedMeanwhileException">Another prescriber answered first; carries the <see cref="Question"/>.</exception>
    public Task RunAsync(Actor actor, long questionId, string answer, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.AnswerQuestions, async scope =>
        {
            var words = TextRules.Required("Answer", "The answer", answer, 4000);
            var question = await TakeAsync(scope, questionId, cancellation);
            if (question.AnsweredAt is not null)
            {
                throw new ChangedMeanwhileException($"{question.AnsweredByName} answered this meanwhile. Your answer was not saved.", question);
            }

            (question.Answer, question.AnsweredAt) = (words, scope.Now);
            (question.AnsweredById, question.AnsweredByName) = (actor.UserId, actor.Name);
            question.Version++;
        }, cancellation);

    /// <summary>Notes that the answer was read.</summary>
    public Task MarkSeenAsync(Actor actor, long questionId, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.AskQuestions, async scope =>
        {
            var question = await TakeAsync(scope, questionId, cancellation);
            if (question.AnsweredAt is not null && question.AnswerSeenAt is null)
            {
                (question.AnswerSeenAt, question.AnswerSeenByName) = (scope.Now, actor.Name);
                question.Version++;
            }
        }, cancellation);

    private static async Task<Question> TakeAsync(WorkScope scope, long questionId, CancellationToken cancellation)
    {
        var patientId = await scope.Db.Questions.Where(q => q.Id == questionId).Select(q => (long?)q.PatientId).SingleOrDefaultAsync(cancellation)
            ?? throw new NotFoundException("There is no such question.");
        await scope.TakePatientAsync(patientId, cancellation);
        return await scope.Db.Questions.SingleAsync(q => q.Id == questionId, cancellation);
    }
}
