namespace HfClinic.Records.Exchange;

/// <summary>The words of a report.</summary>
public static class ImportWords
{
    public static string Of(ImportLineOutcome outcome) => outcome switch
    {
        ImportLineOutcome.Accepted => "accepted",
        ImportLineOutcome.Duplicate => "duplicate",
        ImportLineOutcome.Held => "held",
        _ => "refused",
    };

    public static string Of(ImportKind kind) => kind == ImportKind.Roster ? "roster" : "home readings";

    public static string Of(ImportState state) => state switch
    {
        ImportState.Running => "under way",
        ImportState.Done => "done",
        ImportState.Stopped => "stopped by hand",
        _ => "interrupted",
    };
}
