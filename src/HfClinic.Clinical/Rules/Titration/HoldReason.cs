using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>One reason why no step of a class is expected now.</summary>
/// <param name="Words">What was seen, with its day: "potassium 5.3 mmol/L on 12 Mar 2026".</param>
/// <param name="Limit">The limit in words: "above 5.0 mmol/L".</param>
/// <param name="Remark">What the source says about it.</param>
public sealed record HoldReason(
    LimitEffect Effect, string Words, string Limit, string Remark, DateOnly Day, long? ReadingId, ImmutableArray<string> SourceKeys)
{
    /// <summary>As in a sentence: "potassium 5.3 mmol/L on 12 Mar 2026 (limit: above 5.0 mmol/L; caution to start or raise)".</summary>
    public string Sentence => Limit.Length == 0 ? $"{Words} ({Remark})" : $"{Words} (limit: {Limit}; {Remark})";
}
