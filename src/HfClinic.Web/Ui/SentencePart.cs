namespace HfClinic.Web.Ui;

/// <summary>A stretch of a sentence: plain words, or a count that is the link to its filter.</summary>
/// <param name="Text">The words as read: "9 for today".</param>
/// <param name="Href">Where the filter lives in the address; null for plain words.</param>
/// <param name="Chosen">Whether this filter is the one shown; its link then leads back to everyone.</param>
public sealed record SentencePart(string Text, string? Href = null, bool Chosen = false);
