using HfClinic.Records.Access;
using HfClinic.Records.Flags;
using HfClinic.Records.Work;

namespace HfClinic.Records.Contacts;

/// <summary>Records a call or message, and answers the flags it settles.</summary>
public sealed class RecordContact(ClinicWork work)
{
    /// <summary>Records the contact; each flag named is answered with its note.</summary>
    /// <param name="settledFlags">Open flags of the same patient that this contact settles; may be empty.</param>
    /// <exception cref="RefusedException">A flag is to be settled without a word, or the note is too long.</exception>
    public Task<long> RunAsync(
        Actor actor, long patientId, ContactOutcome outcome, string? note, IReadOnlyCollection<long> settledFlags, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.RecordContacts, async scope =>
        {
            var text = TextRules.Optional("Note", "The note", note, 2000);
            await scope.TakePatientAsync(patientId, cancellation);
            var contact = new Contact
            {
                PatientId = patientId,
                At = scope.Now,
                Day = scope.Today,
                Outcome = outcome,
                Note = text,
                ById = actor.UserId,
                ByName = actor.Name,
            };
            scope.Db.Contacts.Add(contact);
            if (settledFlags.Count > 0)
            {
                var answer = text ?? throw new RefusedException(new Problem(
                    "Note", "A flag is settled with a word on what came of the call.", "Write what was said or decided."));
                await AnswerFlag.AnswerAsync(scope, patientId, settledFlags, answer, cancellation);
            }

            await scope.SaveAsync(cancellation);
            return contact.Id;
        }, cancellation);
}
