using HfClinic.Clinical.Picture;

namespace HfClinic.Records.Exchange;

/// <summary>Why a weight was set aside, in the words of a report.</summary>
internal static class HoldWords
{
    /// <summary>The reason and what can be done.</summary>
    public static LineFault Of(HoldReason reason) => new(
        reason switch
        {
            HoldReason.PoundsTakenAsKilograms => "looks like pounds entered as kilograms",
            HoldReason.KilogramsTakenAsPounds => "looks like kilograms entered as pounds",
            HoldReason.TenfoldTooHigh => "looks ten times too high",
            HoldReason.TenfoldTooLow => "looks ten times too low",
            HoldReason.DroppedDigit => "looks as if a digit was left out",
            HoldReason.SwappedDigits => "looks as if two digits were swapped",
            HoldReason.WrongDigit => "looks as if one digit is wrong",
            HoldReason.AnotherPerson => "fits another person of the household",
            _ => "far from the recent weights",
        },
        "Ask for a repeat weight; then confirm, correct or strike it out in the chart.");
}
