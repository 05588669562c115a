using HfClinic.Records.Access;
using HfClinic.Records.Work;

namespace HfClinic.Records.Flags;

/// <summary>Keeps a flag off the list until a day, with a reason. It comes back sooner if the evidence grows.</summary>
public sealed class PutOffFlag(ClinicWork work)
{
    /// <summary>The longest a flag can be put off, in days.</summary>
    public const int LongestDays = 30;

    /// <summary>Puts the flag off.</summary>
    /// <exception cref="RefusedException">The day is not within the next 30 days, or no reason is given.</exception>
    public Task RunAsync(Actor actor, long flagId, DateOnly until, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.AnswerFlags, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            if (until <= scope.Today || until > scope.Today.AddDays(LongestDays))
            {
                throw new RefusedException(new Problem("Until",
                    $"{TextRules.Day(until)} is not within the next {LongestDays} days.",
                    $"Give a day from {TextRules.Day(scope.Today.AddDays(1))} to {TextRules.Day(scope.Today.AddDays(LongestDays))}."));
            }

            var flag = await OpenFlags.TakeAsync(scope, flagId, cancellation);
            (flag.PutOffUntil, flag.PutOffBecause) = (until, because);
            flag.Version++;
            scope.Db.FlagSteps.Add(OpenFlags.Step(scope, flag, FlagStepKind.PutOff, $"Until {TextRules.Day(until)}: {because}"));
        }, cancellation);
}
