namespace HfClinic.Records.Flags;

/// <summary>How the flags of one kind behaved over a period.</summary>
/// <param name="Raised">Episodes that began in the period.</param>
/// <param name="AnsweredSameDay">Those first answered on the clinic day on which they were raised.</param>
/// <param name="AnsweredLater">Those first answered on a later day.</param>
/// <param name="ClearedByData">Those the data cleared without an answer.</param>
/// <param name="PatientMonths">Of the whole clinic over the period.</param>
public sealed record FlagKind(string RuleId, string Title, int Raised, int AnsweredSameDay, int AnsweredLater, int ClearedByData, decimal PatientMonths)
{
    /// <summary>Episodes per 100 patient-months; null without any patient-time.</summary>
    public decimal? Per100PatientMonths => PatientMonths > 0 ? 100 * Raised / PatientMonths : null;

    /// <summary>Share of the raised that was answered the same day, 0 to 1; null when none was raised.</summary>
    public decimal? ShareAnsweredSameDay => Raised > 0 ? (decimal)AnsweredSameDay / Raised : null;
}

/// <summary>How this clinic's flags behaved over a period.</summary>
/// <param name="From">First clinic day, included.</param>
/// <param name="Until">Last clinic day, included.</param>
/// <param name="PatientMonths">Days enrolled within the period over 30.4375, all patients together.</param>
/// <param name="Kinds">In the order of the rule book; kinds it no longer knows at the end.</param>
/// <param name="Weights">Weights measured in the period; what replaced another in a correction is not counted again.</param>
/// <param name="HeldWeights">Those of them that were set aside at entry.</param>
public sealed record FlagBehaviour(
    DateOnly From, DateOnly Until, decimal PatientMonths, IReadOnlyList<FlagKind> Kinds, int Weights, int HeldWeights)
{
    /// <summary>Share of weights set aside at entry, 0 to 1; null without any weight.</summary>
    public decimal? ShareHeld => Weights > 0 ? (decimal)HeldWeights / Weights : null;
}
