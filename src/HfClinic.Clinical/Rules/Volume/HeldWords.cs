using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>A held reading in words, and what it would be without its likely slip.</summary>
public static class HeldWords
{
    /// <summary>The number as it was typed with what it looks like: "141.6 kg looks like pounds".</summary>
    public static string Describe(WeightReading held, WeightUnit unit) => held.Held?.Reason switch
    {
        HoldReason.PoundsTakenAsKilograms => $"{Wording.Weight(held.Weight, WeightUnit.Kilograms)} looks like pounds",
        HoldReason.KilogramsTakenAsPounds => $"{Wording.Weight(held.Weight, WeightUnit.Pounds)} looks like kilograms",
        HoldReason.TenfoldTooHigh => $"{Wording.Weight(held.Weight, unit)} looks ten times too high",
        HoldReason.TenfoldTooLow => $"{Wording.Weight(held.Weight, unit)} looks ten times too low",
        HoldReason.DroppedDigit => $"{Wording.Weight(held.Weight, unit)} looks as if a digit was left out",
        HoldReason.SwappedDigits => $"{Wording.Weight(held.Weight, unit)} looks as if two digits were swapped",
        HoldReason.WrongDigit => $"{Wording.Weight(held.Weight, unit)} looks as if one digit is wrong",
        HoldReason.AnotherPerson => $"{Wording.Weight(held.Weight, unit)} fits another person of the household",
        _ => $"{Wording.Weight(held.Weight, unit)} is far from the recent weights",
    };

    /// <summary>The weight if the likely slip is undone; null where there is no one way to undo it.</summary>
    public static Weight? Mended(WeightReading held) => held.Held?.Reason switch
    {
        HoldReason.PoundsTakenAsKilograms => Weight.FromPounds(held.Weight.Kilograms),
        HoldReason.KilogramsTakenAsPounds => Weight.FromKilograms(held.Weight.Pounds),
        HoldReason.TenfoldTooHigh => Weight.FromKilograms(held.Weight.Kilograms / 10),
        HoldReason.TenfoldTooLow => Weight.FromKilograms(held.Weight.Kilograms * 10),
        _ => null,
    };
}
