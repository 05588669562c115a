using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Stories;

/// <summary>A gain in three days on a scale in pounds, by a person with a long and accented name.</summary>
internal static class GainInPounds
{
    public static Story Story { get; } = new()
    {
        FamilyName = "Ó Maoilbhréanainn-Lågvattensstrand de la Peña y Zúñiga",
        GivenName = "Gráinne Françoise Ágnes",
        Sex = Sex.Female,
        Kilograms = 76,
        ScaleInPounds = true,
        Extra = day => day switch { -2 => 0.9, -1 => 1.7, 0 => 2.7, _ => 0 },
    };
}
