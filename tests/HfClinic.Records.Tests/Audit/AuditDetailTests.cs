using HfClinic.Clinical.Values;
using HfClinic.Records.Audit;

namespace HfClinic.Records.Tests.Audit;

public class AuditDetailTests
{
    [Fact]
    public void Shows_before_and_after_side_by_side_in_words()
    {
        var fields = AuditDetail.Of(
            Line("""{"GivenName":"Oda","WeighsAtHome":true,"LeftOn":null,"Version":1}""",
                """{"GivenName":"Odá","WeighsAtHome":false,"LeftOn":"2026-03-30","Version":2,"Id":7}"""), WeightUnit.Kilograms);
        Assert.Equal(
            [new("Given name", "Oda", "Odá"), new("Weighs at home", "yes", "no"), new("Left on", null, "30 Mar 2026")],
            fields);
    }

    [Theory]
    [InlineData("""{"Grams":71500}""", "Weight", "71.5 kg")]
    [InlineData("""{"Kind":"Weight","Value":71500}""", "Value", "71.5 kg")]
    [InlineData("""{"Kind":"HeartRate","Value":72}""", "Value", "72")]
    [InlineData("""{"MeasuredAt":"2026-03-31T06:00:00Z"}""", "Measured at", "31 Mar 2026 06:00 UTC")]
    [InlineData("""{"NurseId":"a"}""", "Nurse", "a")]
    public void Writes_values_as_screens_do(string after, string field, string shown) =>
        Assert.Equal(shown, AuditDetail.Of(Line(null, after), WeightUnit.Kilograms).Single(row => row.Field == field).After);

    [Theory]
    [InlineData("Test", 1)]
    [InlineData("Somebody Else", 2)]
    public void Who_did_it_is_not_said_twice(string name, int fields) => Assert.Equal(fields, AuditDetail.Of(
        Line(null, $$"""{"Reason":"misheard","ById":"01a231f3-49d0-7a22-b893-dd17061ca04c","ByName":"{{name}}"}"""), WeightUnit.Kilograms).Count);

    [Fact]
    public void A_person_pointed_to_is_named()
    {
        var nurse = Guid.Parse("01a231f3-49d0-7a22-b893-dd17061ca04c");
        var fields = AuditDetail.Of(Line("""{"NurseId":null}""", $$"""{"NurseId":"{{nurse}}"}"""), WeightUnit.Kilograms,
            new Dictionary<Guid, string> { [nurse] = "Mo O'Kafor" });
        Assert.Equal(new AuditField("Nurse", null, "Mo O'Kafor"), Assert.Single(fields));
    }

    [Fact]
    public void A_sentence_stays_a_sentence() =>
        Assert.Equal(new AuditField("", null, "Mo O'Kafor: Nurse → Prescriber"), Assert.Single(AuditDetail.Of(Line(null, "Mo O'Kafor: Nurse → Prescriber"), WeightUnit.Kilograms)));

    private static AuditEntry Line(string? before, string? after) =>
        new() { ByName = "Test", What = "Patient changed", Before = before, After = after, Hash = "" };
}
