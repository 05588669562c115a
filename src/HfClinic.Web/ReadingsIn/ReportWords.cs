using System.Globalization;
using HfClinic.Records.Exchange;
using HfClinic.Web.Ui;

namespace HfClinic.Web.ReadingsIn;

/// <summary>What became of a file, as a sentence whose counts are the filters.</summary>
public static class ReportWords
{
    /// <summary>The sentence above a report.</summary>
    public static IReadOnlyList<SentencePart> Sentence(ImportRun run, ImportLineOutcome? shown)
    {
        List<SentencePart> parts = [new($"Of {Lines(run.Lines)}, {Number(run.Accepted)} went in")];
        if (run.Later > 0)
        {
            parts.Add(new(", among them "));
            parts.Add(Filter(run, shown, ImportLineOutcome.Accepted, $"{Number(run.Later)} as a later reading of the day"));
        }

        parts.Add(new(". "));
        List<SentencePart> rest = [];
        Add(ImportLineOutcome.Held, run.Held, "held for a person to decide");
        Add(ImportLineOutcome.Refused, run.Refused, "refused");
        Add(ImportLineOutcome.Duplicate, run.Duplicates, "on record already");
        for (var at = 0; at < rest.Count; at++)
        {
            parts.Add(rest[at]);
            parts.Add(new(at == rest.Count - 1 ? "." : at == rest.Count - 2 ? " and " : ", "));
        }

        return parts;

        void Add(ImportLineOutcome outcome, int count, string words)
        {
            if (count > 0)
            {
                rest.Add(Filter(run, shown, outcome, $"{Number(count)} {words}"));
            }
        }
    }

    /// <summary>"5,123 lines".</summary>
    public static string Lines(int count) => $"{Number(count)} {(count == 1 ? "line" : "lines")}";

    /// <summary>"5,123".</summary>
    public static string Number(int count) => count.ToString("N0", CultureInfo.InvariantCulture);

    /// <summary>How a filter is written in the address.</summary>
    public static string Slug(ImportLineOutcome outcome) => outcome == ImportLineOutcome.Accepted ? "later" : ImportWords.Of(outcome);

    /// <summary>The filter of an address; null for every line.</summary>
    public static ImportLineOutcome? FromSlug(string? slug) =>
        Enum.GetValues<ImportLineOutcome>().Where(outcome => Slug(outcome) == slug).Select(outcome => (ImportLineOutcome?)outcome).FirstOrDefault();

    private static SentencePart Filter(ImportRun run, ImportLineOutcome? shown, ImportLineOutcome outcome, string text) => shown == outcome
        ? new(text, $"readings-in/{run.Id}", Chosen: true)
        : new(text, $"readings-in/{run.Id}?show={Slug(outcome)}");
}
