using HfClinic.Records.Access;
using HfClinic.Records.Work;

namespace HfClinic.Records.Flags;

/// <summary>Keeps flags off the list until a day, with a reason. Each comes back sooner if its evidence grows.</summary>
public sealed class PutOffFlag(ClinicWork work)
{
    /// <summary>The longest a flag can be put off, in days.</summary>
    public const int LongestDays = 30;

    /// <inheritdoc cref="RunAsync(Actor, IReadOnlyCollection{long}, DateOnly, string, CancellationToken)"/>
    public Task RunAsync(Actor actor, long flagId, DateOnly until, string reason, CancellationToken cancellation = default) =>
        RunAsync(actor, [flagId], until, reason, cancellation);

    /// <summary>Puts the flags off, all of them or none.</summary>
    /// <exception cref="RefusedException">The day is not within the next 30 days, no reason is given, or no flag is named.</exception>
    public Task RunAsync(Actor actor, IReadOnlyCollection<long> flagIds, DateOnly until, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.AnswerFlags, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            if (until <= scope.Today || until > scope.Today.AddDays(LongestDays))
            {
                throw new RefusedException(new Problem("Until",
                    $"{TextRules.Day(until)} is not within the next {LongestDays} days.",
                    $"Give a day from {TextRules.Day(scope.Today.AddDays(1))} to {TextRules.Day(scope.Today.AddDays(LongestDays))}."));
            }

            if (flagIds.Count == 0)
            {
                throw new RefusedException(new Problem("Flags", "No flag is chosen.", "Tick at least one."));
            }

            foreach (var flagId in flagIds.Distinct().Order())
            {
                var flag = await OpenFlags.TakeAsync(scope, flagId, cancellation);
                (flag.PutOffUntil, flag.PutOffBecause) = (until, because);
                flag.Version++;
                scope.Db.FlagSteps.Add(OpenFlags.Step(scope, flag, FlagStepKind.PutOff, $"Until {TextRules.Day(until)}: {because}"));
            }
        }, cancellation);
}
