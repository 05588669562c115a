using System.Collections.Immutable;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>Signs of congestion ("wet") and of poor perfusion ("cold") found at the bedside. The lists are from memory.</summary>
[Flags]
public enum BedsideSigns
{
    None = 0,
    Orthopnoea = 1,
    RaisedJugularPressure = 2,
    OedemaOrAscites = 4,
    HepatojugularReflux = 8,
    Rales = 16,
    LoudP2 = 32,
    LowProportionalPulsePressure = 64,
    PulsusAlternans = 128,
    SymptomaticHypotension = 256,
    CoolLimbs = 512,
    Obtundation = 1024,
    FallingSodiumOrRenalFunction = 2048,
}

/// <summary>
/// The four profiles, as ticked by the clinician. The program lists signs but never sets the profile: signs were absent in 18
/// of 43 patients with a wedge pressure of 22 mmHg or more (Stevenson and Perloff 1989).
/// </summary>
public enum BedsideProfile
{
    /// <summary>A: no congestion, good perfusion.</summary>
    WarmAndDry,

    /// <summary>B: congestion, good perfusion.</summary>
    WarmAndWet,

    /// <summary>C: congestion, poor perfusion.</summary>
    ColdAndWet,

    /// <summary>L: no congestion, poor perfusion.</summary>
    ColdAndDry,
}

/// <summary>Signs and profiles in words (Nohria, J Am Coll Cardiol 2003;41:1797).</summary>
public static class BedsideWords
{
    public static readonly ImmutableArray<(BedsideSigns Sign, string Words)> Wet =
    [
        (BedsideSigns.Orthopnoea, "orthopnoea"),
        (BedsideSigns.RaisedJugularPressure, "raised jugular venous pressure"),
        (BedsideSigns.OedemaOrAscites, "oedema or ascites"),
        (BedsideSigns.HepatojugularReflux, "hepatojugular reflux"),
        (BedsideSigns.Rales, "rales"),
        (BedsideSigns.LoudP2, "loud P2"),
    ];

    public static readonly ImmutableArray<(BedsideSigns Sign, string Words)> Cold =
    [
        (BedsideSigns.LowProportionalPulsePressure, "proportional pulse pressure below 25 %"),
        (BedsideSigns.PulsusAlternans, "pulsus alternans"),
        (BedsideSigns.SymptomaticHypotension, "symptomatic hypotension"),
        (BedsideSigns.CoolLimbs, "cool limbs"),
        (BedsideSigns.Obtundation, "obtundation"),
        (BedsideSigns.FallingSodiumOrRenalFunction, "falling sodium or kidney function"),
    ];

    /// <summary>The signs present of one of the two lists: "orthopnoea and rales"; empty for none.</summary>
    public static string List(ImmutableArray<(BedsideSigns Sign, string Words)> group, BedsideSigns present) =>
        Wording.List([.. group.Where(entry => present.HasFlag(entry.Sign)).Select(entry => entry.Words)]);

    public static string Words(BedsideProfile profile) => profile switch
    {
        BedsideProfile.WarmAndDry => "warm and dry (A)",
        BedsideProfile.WarmAndWet => "warm and wet (B)",
        BedsideProfile.ColdAndWet => "cold and wet (C)",
        _ => "cold and dry (L)",
    };
}
