using HfClinic.Records.Access;
using HfClinic.Records.Work;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Readings;

/// <summary>Takes a symptom report out that was recorded in error; it stays visible as struck out.</summary>
public sealed class StrikeOutSymptoms(ClinicWork work)
{
    /// <exception cref="RefusedException">No reason is given.</exception>
    /// <exception cref="ChangedMeanwhileException">It was struck out already.</exception>
    public Task RunAsync(Actor actor, long reportId, string reason, CancellationToken cancellation = default) =>
        work.RunAsync(actor, Capability.DecideReadings, async scope =>
        {
            var because = TextRules.Required("Reason", "The reason", reason, 400);
            var patientId = await scope.Db.SymptomReports.Where(r => r.Id == reportId).Select(r => (long?)r.PatientId).SingleOrDefaultAsync(cancellation)
                ?? throw new NotFoundException("There is no such symptom report.");
            await scope.TakePatientAsync(patientId, cancellation);
            var report = await scope.Db.SymptomReports.SingleAsync(r => r.Id == reportId, cancellation);
            if (report.StruckOutAt is not null)
            {
                throw new ChangedMeanwhileException("This symptom report was struck out meanwhile.");
            }

            (report.StruckOutAt, report.StruckOutBecause) = (scope.Now, because);
        }, cancellation);
}
