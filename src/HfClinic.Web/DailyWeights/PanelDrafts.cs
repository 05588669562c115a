using HfClinic.Records.Contacts;

namespace HfClinic.Web.DailyWeights;

/// <summary>Which form of the panel is open.</summary>
public enum PanelForm
{
    None = 0,
    Call = 1,
    Ask = 2,
    PutOff = 3,
}

/// <summary>What has been typed for one patient and is not saved yet. It outlives the panel: going to another row and back loses nothing.</summary>
public sealed class PanelDrafts
{
    public PanelForm Open { get; set; }

    public ContactOutcome Outcome { get; set; } = ContactOutcome.Spoke;

    public string CallNote { get; set; } = "";

    /// <summary>Flags the person has unticked: the call does not settle them.</summary>
    public HashSet<long> NotSettled { get; } = [];

    public string Question { get; set; } = "";

    /// <summary>The flag the question is about; null for the patient as a whole.</summary>
    public long? QuestionFlag { get; set; }

    public DateOnly? PutOffUntil { get; set; }

    public string PutOffReason { get; set; } = "";

    /// <summary>Flags the person has unticked: they stay on the list.</summary>
    public HashSet<long> NotPutOff { get; } = [];

    public Dictionary<long, HeldDraft> Held { get; } = [];

    /// <summary>What is typed about one held reading.</summary>
    public HeldDraft HeldOf(long readingId) => Held.TryGetValue(readingId, out var known) ? known : Held[readingId] = new();
}

/// <summary>What to do with a held reading.</summary>
public enum HeldChoice
{
    None = 0,
    Confirm = 1,
    Correct = 2,
    StrikeOut = 3,
}

/// <summary>What is typed about one held reading.</summary>
public sealed class HeldDraft
{
    public HeldChoice Choice { get; set; }

    /// <summary>The right weight, as typed.</summary>
    public string Weight { get; set; } = "";

    public string Reason { get; set; } = "";
}
