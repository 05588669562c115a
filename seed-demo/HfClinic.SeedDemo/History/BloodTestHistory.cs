using System.Collections.Immutable;
using HfClinic.SeedDemo.Persons;

namespace HfClinic.SeedDemo.History;

/// <summary>Invented blood tests around ordinary values of people with heart failure (common practice, no source).</summary>
internal static class BloodTestHistory
{
    public static ImmutableArray<Tested> Draw(Chance chance, Person person)
    {
        var tests = ImmutableArray.CreateBuilder<Tested>();
        var creatinine = Math.Clamp(chance.Normal(105, 26), 58, 220);
        var potassium = chance.Normal(4.5, 0.25);
        var peptide = Math.Exp(chance.Normal(person.EjectionFraction <= 40 ? 7.1 : 6.5, 0.6));
        foreach (var about in (int[])[-170, -90, -32])
        {
            var day = about + chance.Between(-6, 6);
            tests.Add(new("potassium", day, Rounded(Math.Clamp(potassium + chance.Normal(0, 0.2), 3.4, 5.6), 1), "mmol/L"));
            tests.Add(new("sodium", day, Rounded(Math.Clamp(chance.Normal(139, 2.5), 128, 146), 0), "mmol/L"));
            tests.Add(new("creatinine", day, Rounded(creatinine * Math.Exp(chance.Normal(0, 0.06)), 0), "µmol/L"));
            if (about != -90)
            {
                tests.Add(new("nt-probnp", day, Rounded(peptide * Math.Exp(chance.Normal(0, 0.2)), 0), "ng/L"));
            }
        }

        return tests.ToImmutable();
    }

    private static decimal Rounded(double value, int decimals) => Math.Round((decimal)value, decimals);
}
