using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Questions;

/// <summary>Puts a question about a patient to the prescribers.</summary>
public sealed class AskQuestion(ClinicWork work)
{
    /// <summary>Stores the question word for word.</summary>
    /// <param name="flagId">The flag it is about, if any.</param>
    /// <exception cref="RefusedException">The question is empty or too long, or the flag is another patient's.</exception>
    public Task<long> RunAsync(Actor actor, long patientId, string text, long? flagId = null, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.AskQuestions, async scope =>
        {
            var words = TextRules.Required("Question", "The question", text, 4000);
            await scope.TakePatientAsync(patientId, cancellation);
            if (flagId is not null && !await scope.Db.Flags.AnyAsync(flag => flag.Id == flagId && flag.PatientId == patientId, cancellation))
            {
                throw new NotFoundException("There is no such flag for this patient.");
            }

            var question = new Question
            {
                PatientId = patientId,
                FlagId = flagId,
                Text = words,
                AskedAt = scope.Now,
                AskedById = actor.UserId,
                AskedByName = actor.Name,
            };
            scope.Db.Questions.Add(question);
            await scope.SaveAsync(cancellation);
            return question.Id;
        }, cancellation);
}
