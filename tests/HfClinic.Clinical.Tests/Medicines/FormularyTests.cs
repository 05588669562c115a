using System.Globalization;
using CsCheck;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Medicines;

public class FormularyTests
{
    private static readonly Formulary BuiltIn = Formulary.BuiltIn;

    /// <summary>Start and target as printed in the 2021 ESC guideline, Table 8 (p 3621), footnotes a to f; amounts of one taking, takings a day.</summary>
    [Theory]
    [InlineData("bisoprolol", null, "1.25-1.25x1", "10-10x1")]
    [InlineData("carvedilol", null, "3.125-3.125x2", "25-25x2")]
    [InlineData("metoprolol", "succinate", "12.5-25x1", "200-200x1")]
    [InlineData("nebivolol", null, "1.25-1.25x1", "10-10x1")]
    [InlineData("captopril", null, "6.25-6.25x3", "50-50x3")]
    [InlineData("enalapril", null, "2.5-2.5x2", "10-20x2")]
    [InlineData("lisinopril", null, "2.5-5x1", "20-35x1")]
    [InlineData("ramipril", null, "2.5-2.5x2", "5-5x2")]
    [InlineData("trandolapril", null, "0.5-0.5x1", "4-4x1")]
    [InlineData("candesartan", null, "4-4x1", "32-32x1")]
    [InlineData("losartan", null, "50-50x1", "150-150x1")]
    [InlineData("valsartan", null, "40-40x2", "160-160x2")]
    [InlineData("sacubitril/valsartan", null, "100-100x2", "200-200x2")]
    [InlineData("spironolactone", null, "25-25x1", "50-50x1")]
    [InlineData("eplerenone", null, "25-25x1", "50-50x1")]
    [InlineData("dapagliflozin", null, "10-10x1", "10-10x1")]
    [InlineData("empagliflozin", null, "10-10x1", "10-10x1")]
    [InlineData("vericiguat", null, "2.5-2.5x1", "10-10x1")]
    [InlineData("hydralazine/isosorbide dinitrate", null, "57.5-57.5x3", "115-115x3")]
    public void ESC_2021_Table_8(string name, string? salt, string start, string target) => Matches(DoseProfile.Esc, name, salt, start, target);

    /// <summary>
    /// 2017 ACC/AHA/HFSA focused update, Table 3; carvedilol and spironolactone as the 2022 AHA/ACC/HFSA Table 14, seen second-hand;
    /// finerenone and sotagliflozin US labels; ARNI start as the 2017 ACC decision pathway, Table 3.
    /// </summary>
    [Theory]
    [InlineData("bisoprolol", null, "1.25-1.25x1", "10-10x1")]
    [InlineData("carvedilol", null, "3.125-3.125x2", "25-50x2")]
    [InlineData("carvedilol", "controlled release", "10-10x1", "80-80x1")]
    [InlineData("metoprolol", "succinate", "12.5-25x1", "200-200x1")]
    [InlineData("captopril", null, "6.25-6.25x3", "50-50x3")]
    [InlineData("enalapril", null, "2.5-2.5x2", "10-20x2")]
    [InlineData("lisinopril", null, "2.5-5x1", "20-40x1")]
    [InlineData("perindopril", "erbumine", "2-2x1", "8-16x1")]
    [InlineData("ramipril", null, "1.25-2.5x1", "10-10x1")]
    [InlineData("quinapril", null, "5-5x2", "20-20x2")]
    [InlineData("fosinopril", null, "5-10x1", "40-40x1")]
    [InlineData("trandolapril", null, "1-1x1", "4-4x1")]
    [InlineData("candesartan", null, "4-8x1", "32-32x1")]
    [InlineData("losartan", null, "25-50x1", "50-150x1")]
    [InlineData("valsartan", null, "20-40x2", "160-160x2")]
    [InlineData("sacubitril/valsartan", null, "100-100x2", "200-200x2")]
    [InlineData("spironolactone", null, "12.5-25x1", "25-50x1")]
    [InlineData("eplerenone", null, "25-25x1", "50-50x1")]
    [InlineData("sotagliflozin", null, "200-200x1", "400-400x1")]
    [InlineData("isosorbide dinitrate", null, "20-30x3", "40-40x3")]
    [InlineData("vericiguat", null, "2.5-2.5x1", "10-10x1")]
    public void AHA_2017_Table_3(string name, string? salt, string start, string target) => Matches(DoseProfile.Aha, name, salt, start, target);

    [Fact]
    public void Every_figure_names_a_source_that_resolves_and_every_ladder_reaches_its_target() => Assert.All(
        BuiltIn.All.Where(medicine => medicine.SteeredBy is SteeredBy.Dose or SteeredBy.FixedDose),
        medicine => Assert.All(
            medicine.Doses.Where(dose => dose.Target is not null),
            dose => Assert.True(Reaches(medicine, dose), $"{medicine.FullName}, {dose.Profile}")));

    /// <summary>Perindopril arginine: the marketed strengths stop at 10 mg, the converted lower bound.</summary>
    private static bool Reaches(Medicine medicine, PublishedDoses dose) => medicine.Ladder!.Rungs[^1].Daily >= dose.Target!.ReachedDaily;

    [Theory]
    [InlineData("enalapril", DoseProfile.Esc, 10, 50)]
    [InlineData("enalapril", DoseProfile.Esc, 19, 95)]
    [InlineData("enalapril", DoseProfile.Esc, 20, 100)]
    [InlineData("enalapril", DoseProfile.Esc, 30, 100)]
    [InlineData("enalapril", DoseProfile.Esc, 40, 100)]
    [InlineData("enalapril", DoseProfile.Esc, 80, 200)]
    [InlineData("losartan", DoseProfile.Aha, 50, 33.333)]
    [InlineData("losartan", DoseProfile.Aha, 150, 100)]
    [InlineData("sacubitril/valsartan", DoseProfile.Esc, 100, 25)]
    [InlineData("sacubitril/valsartan", DoseProfile.Esc, 200, 50)]
    [InlineData("sacubitril/valsartan", DoseProfile.Aha, 400, 100)]
    [InlineData("spironolactone", DoseProfile.Esc, 25, 50)]
    [InlineData("spironolactone", DoseProfile.Aha, 25, 100)]
    [InlineData("eplerenone", DoseProfile.Esc, 12.5, 25)]
    public void Percent_of_target_by_total_daily_dose(string name, DoseProfile profile, decimal totalDaily, decimal percent) =>
        Assert.Equal(percent, BuiltIn.Find(name)!.DosesFor(profile)!.Target!.PercentOf(totalDaily), 3);

    [Fact]
    public void Raising_a_dose_never_lowers_the_percent() =>
        Gen.Select(Gen.Int[0, Targets().Count() - 1].Select(at => Targets().ElementAt(at)), Gen.Decimal[0, 500], Gen.Decimal[0, 100]).Sample((target, dose, more) =>
            target.PercentOf(dose + more) >= target.PercentOf(dose));

    [Theory]
    [InlineData("metoprolol succinate", "succinate", false, true)]
    [InlineData("Metoprolol tartrate", "tartrate", false, false)]
    [InlineData("metoprolol", null, true, false)]
    [InlineData("perindopril", null, true, true)]
    [InlineData("carvedilol", null, false, true)]
    [InlineData("frusemide", null, false, false)]
    public void The_salt_decides_where_it_must(string recorded, string? salt, bool unknown, bool covers)
    {
        var match = BuiltIn.Read(recorded);

        Assert.Equal((salt, unknown), (match.Medicine?.Salt, match.SaltUnknown));
        Assert.Equal(covers, match.CoversPillar && TitrationClasses.Of(match.Class!.Value) is not null);
    }

    [Fact]
    public void Two_salts_share_their_codes() => Assert.Equal(
        (BuiltIn.Find("metoprolol", "succinate")!.Atc!.Code, BuiltIn.Find("metoprolol", "succinate")!.RxNorm!.Code),
        (BuiltIn.Find("metoprolol", "tartrate")!.Atc!.Code, BuiltIn.Find("metoprolol", "tartrate")!.RxNorm!.Code));

    /// <summary>The 2021 ESC table has no row for perindopril, quinapril and fosinopril.</summary>
    [Theory]
    [InlineData("perindopril", "erbumine")]
    [InlineData("quinapril", null)]
    [InlineData("fosinopril", null)]
    public void Where_the_profile_has_no_row_the_other_is_taken(string name, string? salt) =>
        Assert.Equal(DoseProfile.Aha, BuiltIn.Find(name, salt)!.DosesFor(DoseProfile.Esc)!.Profile);

    [Theory]
    [InlineData("digoxin")]
    [InlineData("furosemide")]
    [InlineData("metolazone")]
    [InlineData("ivabradine")]
    public void These_have_no_target_dose(string name) => Assert.All(BuiltIn.Find(name)!.Doses, dose => Assert.Null(dose.Target));

    private static IEnumerable<DoseFigure> Targets() => BuiltIn.All
        .SelectMany(medicine => medicine.Doses).Select(dose => dose.Target).OfType<DoseFigure>();

    private static void Matches(DoseProfile profile, string name, string? salt, string start, string target)
    {
        var doses = BuiltIn.Find(name, salt)!.Doses.Single(dose => dose.Profile == profile);

        Assert.Equal((start, target), (Say(doses.Start!), Say(doses.Target!)));
        Assert.True(doses.Target!.Standing is Standing.Confirmed or Standing.SecondHand or Standing.Unconfirmed);
    }

    private static string Say(DoseFigure figure) =>
        string.Create(CultureInfo.InvariantCulture, $"{figure.Low:0.####}-{figure.High:0.####}x{figure.TimesDaily:0.##}");
}
