using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;

namespace HfClinic.Clinical.Rules.Titration;

public enum TitrationNoteKind
{
    /// <summary>Told as information.</summary>
    Information = 1,

    /// <summary>A beta blocker without evidence in HFrEF.</summary>
    NotEvidenceBased = 2,

    /// <summary>The salt decides and is not recorded.</summary>
    SaltUnknown = 3,

    /// <summary>Stopped after the ejection fraction improved.</summary>
    StoppedAfterImprovement = 4,

    /// <summary>Acts in sinus rhythm only, and the rhythm is another.</summary>
    NotInSinusRhythm = 5,
}

/// <summary>A remark on one class.</summary>
public sealed record TitrationNote(TitrationNoteKind Kind, string Text, ImmutableArray<string> SourceKeys, DateOnly? Day = null)
{
    internal static TitrationNote Information(string text, IPublished source) => new(TitrationNoteKind.Information, text, source.SourceKeys);
}
