using HfClinic.Clinical.Flags;
using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Flags;

/// <summary>Closes a flag with a person's answer. The answer and what was shown stay on record.</summary>
public sealed class AnswerFlag(ClinicWork work)
{
    /// <summary>Answers one open flag.</summary>
    /// <exception cref="RefusedException">No answer is given.</exception>
    /// <exception cref="ChangedMeanwhileException">It is not open any more.</exception>
    public Task RunAsync(Actor actor, long flagId, string answer, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.AnswerFlags, async scope =>
        {
            var text = TextRules.Required("Answer", "The answer", answer, 2000);
            var flag = await OpenFlags.TakeAsync(scope, flagId, cancellation);
            Close(scope, flag, text);
        }, cancellation);

    internal static async Task AnswerAsync(
        WorkScope scope, long patientId, IReadOnlyCollection<long> flagIds, string answer, CancellationToken cancellation)
    {
        if (!scope.Actor.May(Capability.AnswerFlags))
        {
            throw new NotAllowedException($"{scope.Actor.Name} may not settle flags.");
        }

        var flags = await scope.Db.Flags
            .Where(flag => flag.PatientId == patientId && flagIds.Contains(flag.Id) && flag.State == FlagState.Open)
            .OrderBy(flag => flag.Id).ToListAsync(cancellation);
        if (flags.Count != flagIds.Distinct().Count())
        {
            throw new ChangedMeanwhileException("One of these flags was settled meanwhile. Nothing of yours was saved; look again.");
        }

        flags.ForEach(flag => Close(scope, flag, answer));
    }

    private static void Close(WorkScope scope, Flag flag, string answer)
    {
        flag.State = FlagState.Answered;
        (flag.AnsweredAt, flag.AnsweredOn, flag.AnsweredByName, flag.Answer) = (scope.Now, scope.Today, scope.Actor.Name, answer);
        (flag.PutOffUntil, flag.PutOffBecause) = (null, null);
        flag.Version++;
        scope.Db.FlagSteps.Add(OpenFlags.Step(scope, flag, FlagStepKind.Answered, answer));
    }
}
