using CsCheck;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Rules;
using HfClinic.Clinical.Rules.Titration;
using static HfClinic.Clinical.Tests.Pictures;
using static HfClinic.Clinical.Tests.Rules.Titration.TitrationPictures;

namespace HfClinic.Clinical.Tests.Rules.Titration;

public class TitrationPropertyTests
{
    private static readonly string[] Doses = ["bisoprolol", "carvedilol", "metoprolol", "atenolol", "enalapril", "losartan", "sacubitril/valsartan", "spironolactone", "dapagliflozin", "ivabradine"];

    private static readonly Gen<PatientPicture> AnyPicture = Gen.Select(
        Gen.Int[15, 65].Array[0, 3],
        Gen.Select(Gen.Int[0, Doses.Length - 1], Gen.Int[1, 40], Gen.Int[-200, 0]).Array[0, 4],
        Gen.Select(Gen.Int[35, 65], Gen.Int[-200, 0]).Array[0, 4],
        Gen.Select(Gen.Int[44, 62], Gen.Int[60, 300], Gen.Int[-200, 0]).Array[0, 4],
        Gen.Select(Gen.Int[0, 1], Gen.Int[80, 130])).Select(BuildPicture);

    [Fact]
    public void Adding_a_limit_never_adds_a_gap() =>
        Gen.Select(AnyPicture, Gen.Int[0, 7], Gen.Int[-400, 0], Gen.Bool).Sample((picture, at, on, aha) =>
        {
            var protocol = aha ? Aha : Esc;
            var more = picture.Limit(TitrationClasses.All[at], on);
            return Gaps(more, protocol).IsSubsetOf(Gaps(picture, protocol)) && Overdue(more, protocol).IsSubsetOf(Overdue(picture, protocol));
        });

    [Fact]
    public void A_condition_or_a_safety_flag_never_adds_a_gap() =>
        Gen.Select(AnyPicture, Gen.Int[1, 13].Where(condition => condition != (int)PatientCondition.Pacemaker)).Sample((picture, condition) =>
        {
            var flagged = picture with { OpenSafetyFlags = [new("safety.x", TitrationClass.RasInhibitor)] };
            var ill = picture with { Conditions = [(PatientCondition)condition] };
            return Gaps(ill, Esc).IsSubsetOf(Gaps(picture, Esc)) && Gaps(flagged, Esc).IsSubsetOf(Gaps(picture, Esc));
        });

    [Fact]
    public void Every_class_says_why_and_no_rule_fails() =>
        Gen.Select(AnyPicture, Gen.Bool).Sample((picture, aha) =>
        {
            var protocol = aha ? Aha : Esc;
            Assert.All(TitrationAssessment.Of(picture, protocol).Classes, reading =>
            {
                Assert.StartsWith(TitrationClasses.Words(reading.Class), reading.Sentence);
                Assert.True(reading.State != TitrationState.Held || !reading.Holds.IsEmpty);
                Assert.True(reading.State is not (TitrationState.CheckDue or TitrationState.CannotTell) || !reading.Missing.IsEmpty);
            });
            Assert.All(RuleBook.Assess(TitrationRules.All, picture, protocol), finding =>
            {
                Assert.NotEqual(Outcome.CouldNotBeChecked, finding.Outcome);
                if (finding.Outcome == Outcome.Fires)
                {
                    Assert.NotEmpty(finding.Limit);
                    Assert.NotEmpty(finding.SourceKeys);
                    Assert.Single(finding.Evidence, evidence => evidence.RaisedIt);
                }
            });
        });

    private static HashSet<TitrationClass> Gaps(PatientPicture picture, ClinicProtocol protocol) =>
        [.. TitrationAssessment.Of(picture, protocol).Classes.Where(one => one.State is TitrationState.Due or TitrationState.NotCovered).Select(one => one.Class)];

    private static HashSet<TitrationClass> Overdue(PatientPicture picture, ClinicProtocol protocol) =>
        [.. TitrationAssessment.Of(picture, protocol).Classes.Where(one => one.IsOverdue).Select(one => one.Class)];

    private static PatientPicture BuildPicture(
        int[] ejections, (int Medicine, int Steps, int From)[] doses, (int Potassium, int Day)[] potassium, (int Rate, int Creatinine, int Day)[] other, (int Rhythm, int Systolic) now)
    {
        var picture = new PatientPicture { AsOf = Today, EnrolledOn = Today.AddDays(-150) }
            .Ejection([.. ejections.Select(percent => $"{percent}")])
            .InRhythm(-10, now.Rhythm == 0 ? Rhythm.Sinus : Rhythm.AtrialFibrillation)
            .Systolic(-1, now.Systolic).Weighed(-2, 84_000 + (20 * now.Systolic));
        picture = doses.Aggregate(picture, (built, dose) => built.On(Doses[dose.Medicine], dose.Steps * 1.25m, 2, dose.From));
        picture = potassium.Aggregate(picture, (built, test) => built.Blood("potassium", test.Day, test.Potassium / 10m));
        return other.Aggregate(picture, (built, test) => built.Rate(test.Day, test.Rate).Blood("creatinine", test.Day, test.Creatinine));
    }
}
