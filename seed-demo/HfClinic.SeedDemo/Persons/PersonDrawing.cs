using HfClinic.Clinical.Values;

namespace HfClinic.SeedDemo.Persons;

/// <summary>Draws invented people such as a heart failure clinic has them. The proportions are common practice, no source.</summary>
internal static class PersonDrawing
{
    /// <param name="named">A given name and sex, or null to draw them.</param>
    /// <param name="kilograms">A given body mass, or null to draw it: normal around 82 kg, deviation 18 kg, 48 to 150 kg.</param>
    public static Person Draw(Chance chance, (string Family, string Given, Sex Sex)? named = null, double? kilograms = null)
    {
        var sex = named?.Sex ?? (chance.Happens(0.42) ? Sex.Female : Sex.Male);
        var drawn = Names.Draw(chance, sex);
        var mass = kilograms ?? Math.Clamp(chance.Normal(82, 18), 48, 150);
        var bodyMassIndex = Math.Clamp(chance.Normal(28, 4), 19, 42);
        return new Person
        {
            FamilyName = named?.Family ?? drawn.Family,
            GivenName = named?.Given ?? drawn.Given,
            Sex = sex,
            BornDaysAgo = (int)(Math.Clamp(chance.Normal(72, 11), 36, 94) * 365.25),
            HeightCentimetres = (int)Math.Clamp(100 * Math.Sqrt(mass / bodyMassIndex), 144, 198),
            Kilograms = mass,
            ScaleInPounds = chance.Happens(0.2),
            HasOximeter = chance.Happens(0.35),
            MeasuresInTheEvening = chance.Happens(0.33),
            WeighsAtMinute = chance.Between(330, 555),
            Systolic = (int)Math.Clamp(chance.Normal(118, 12), 96, 152),
            Pulse = (int)Math.Clamp(chance.Normal(69, 8), 52, 92),
            HasAtrialFibrillation = chance.Happens(0.35),
            EjectionFraction = Math.Round((decimal)(chance.Happens(0.62) ? chance.Between(18.0, 40.0) : chance.Between(41.0, 62.0))),
        };
    }
}
