using CsCheck;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Tests.Values;

/// <summary>Conversions between the units laboratories report. Figures from UCUM where named, else computed from molar masses in R.</summary>
public class LaboratoryUnitsTests
{
    private static readonly Gen<decimal> Amount = Gen.Int[1, 9_999_999].Select(thousandths => thousandths / 1000m);

    /// <summary>UCUM: 1 mg/dL of 113.12 g/mol is 88.40169731 µmol/L.</summary>
    [Fact]
    public void Creatinine_of_1_mg_per_dl() => Assert.Equal(88.40169731m, Creatinine.FromMgPerDl(1).MicromolPerLitre, 8);

    /// <summary>UCUM: 2 meq/L of magnesium is 1 mmol/L.</summary>
    [Fact]
    public void Magnesium_and_calcium_carry_two_charges()
    {
        Assert.Equal(1m, Magnesium.FromMEqPerLitre(2).MmolPerLitre);
        Assert.Equal(2.5m, Calcium.FromMEqPerLitre(5).MmolPerLitre);
    }

    [Fact]
    public void Potassium_and_sodium_carry_one()
    {
        Assert.Equal(Potassium.FromMmolPerLitre(4.2m), Potassium.FromMEqPerLitre(4.2m));
        Assert.Equal(Sodium.FromMmolPerLitre(138), Sodium.FromMEqPerLitre(138));
    }

    /// <summary>Customary factors 0.4114 and 0.2495.</summary>
    [Fact]
    public void Magnesium_and_calcium_in_mg_per_dl()
    {
        Assert.Equal(0.4114m, Magnesium.FromMgPerDl(1).MmolPerLitre, 4);
        Assert.Equal(0.2495m, Calcium.FromMgPerDl(1).MmolPerLitre, 4);
        Assert.Equal(0.7m, Magnesium.FromMgPerDl(1.7m).MmolPerLitre, 1);
        Assert.Equal(2.6m, Calcium.FromMgPerDl(10.5m).MmolPerLitre, 1);
    }

    /// <summary>Customary factors 0.357 for the nitrogen and 0.1665 for the whole urea: the same number means 2.14 times as much.</summary>
    [Fact]
    public void Urea_nitrogen_is_not_urea()
    {
        Assert.Equal(0.357m, Urea.FromNitrogenMgPerDl(1).MmolPerLitre, 3);
        Assert.Equal(0.1665m, Urea.FromUreaMgPerDl(1).MmolPerLitre, 4);
        Assert.Equal(2.14m, Urea.FromNitrogenMgPerDl(20).MmolPerLitre / Urea.FromUreaMgPerDl(20).MmolPerLitre, 2);
    }

    /// <summary>Customary divisors 3.464 and 8.457.</summary>
    [Fact]
    public void Natriuretic_peptides_in_pmol()
    {
        Assert.Equal(100m, Bnp.FromPgPerMl(346.4m).PmolPerLitre);
        Assert.Equal(100m, NtProBnp.FromPgPerMl(845.7m).PmolPerLitre);
    }

    /// <summary>UCUM: 2.0 ng/mL of 780.95 g/mol is 2.5609834 nmol/L.</summary>
    [Fact]
    public void Digoxin_of_2_ng_per_ml() => Assert.Equal(2.5609834m, DigoxinLevel.FromNgPerMl(2).NmolPerLitre, 7);

    [Fact]
    public void Every_switch_of_units_comes_back() => Amount.Sample(amount => Assert.All(
        new[]
        {
            Creatinine.FromMgPerDl(Creatinine.FromMicromolPerLitre(amount).MgPerDl).MicromolPerLitre,
            Creatinine.FromMicromolPerLitre(Creatinine.FromMgPerDl(amount).MicromolPerLitre).MgPerDl,
            Magnesium.FromMEqPerLitre(Magnesium.FromMmolPerLitre(amount).MEqPerLitre).MmolPerLitre,
            Magnesium.FromMgPerDl(Magnesium.FromMmolPerLitre(amount).MgPerDl).MmolPerLitre,
            Calcium.FromMEqPerLitre(Calcium.FromMmolPerLitre(amount).MEqPerLitre).MmolPerLitre,
            Calcium.FromMgPerDl(Calcium.FromMmolPerLitre(amount).MgPerDl).MmolPerLitre,
            Urea.FromNitrogenMgPerDl(Urea.FromMmolPerLitre(amount).NitrogenMgPerDl).MmolPerLitre,
            Urea.FromUreaMgPerDl(Urea.FromMmolPerLitre(amount).UreaMgPerDl).MmolPerLitre,
            DigoxinLevel.FromNmolPerLitre(DigoxinLevel.FromNgPerMl(amount).NmolPerLitre).NgPerMl,
            NtProBnp.FromPmolPerLitre(NtProBnp.FromPgPerMl(amount).PmolPerLitre).PgPerMl,
            Bnp.FromPmolPerLitre(Bnp.FromPgPerMl(amount).PmolPerLitre).PgPerMl,
            Length.FromCentimetres(Length.FromMillimetres(amount).Centimetres).Millimetres,
        },
        back => Assert.Equal(amount, back, 20)));

    [Theory]
    [InlineData("5.1", "5.1 mmol/L")]
    [InlineData("5", "5.0 mmol/L")]
    public void A_value_is_written_with_its_unit(string mmol, string text) =>
        Assert.Equal(text, Potassium.FromMmolPerLitre(decimal.Parse(mmol, System.Globalization.CultureInfo.InvariantCulture)).ToString());
}
