using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Medicines;

public class FormularyFaultTests
{
    private const string Figure = """{"low":1,"high":1,"timesDaily":1,"atTargetFrom":null,"sourceKeys":["clinic-default"],"standing":"clinic-default"}""";

    private const string Good =
        """
        {"name":"second","salt":null,"otherNames":[],"class":"beta-blocker","coversPillar":true,"steeredBy":"dose","unit":"mg","phenotypes":["reduced"],
        "atc":null,"rxNorm":null,"doses":[{"profile":"esc","start":START,"lowStart":null,"target":TARGET,"maximum":null,"usual":null}],
        "ladder":{"rungs":[{"amount":1,"timesDaily":1,"words":null},{"amount":2,"timesDaily":1,"words":null}],"sourceKeys":["clinic-default"],"standing":"clinic-default"},
        "interval":{"days":14,"upTo":28,"sourceKeys":["clinic-default"],"standing":"clinic-default"},
        "byWeight":[],"byKidney":[],"informationFrom":[],"lowStartWhen":[],"notes":[]}
        """;

    private static readonly string Row = Good.Replace("START", Figure).Replace("TARGET", Figure.Replace("\"low\":1,\"high\":1", "\"low\":2,\"high\":2"));

    [Fact]
    public void A_good_row_is_read() => Assert.Equal(50, Formulary.Parse($"[{Row}]", SourceTable.Load()).All[0].Doses[0].Target!.PercentOf(1));

    [Theory]
    [InlineData("\"unit\":\"mg\"", "\"unit\":\"mg\",\"colour\":\"white\"", "colour")]
    [InlineData("\"unit\":\"mg\",", "", "unit")]
    [InlineData("\"unit\":\"mg\"", "\"unit\":\"ml\"", "the unit 'ml' is not known")]
    [InlineData("\"name\":\"second\"", "\"name\":\"Second\"", "not a generic name in lower case")]
    [InlineData("\"name\":\"second\"", "\"name\":\"first\"", "the key 'first' is there twice")]
    [InlineData("\"phenotypes\":[\"reduced\"]", "\"phenotypes\":[]", "no phenotype is named")]
    [InlineData("\"low\":2,\"high\":2", "\"low\":0.5,\"high\":0.5", "the start of 1 a day lies above the target of 0.5 a day")]
    [InlineData("\"low\":2,\"high\":2", "\"low\":3,\"high\":2", "the range 3 to 2 runs down")]
    [InlineData("\"low\":2,\"high\":2", "\"low\":0,\"high\":2", "a dose is not above zero")]
    [InlineData("\"amount\":2", "\"amount\":1", "the ladder is not sorted upwards")]
    [InlineData("\"days\":14", "\"days\":0", "the interval is not a number of days")]
    [InlineData("\"sourceKeys\":[\"clinic-default\"],\"standing\":\"clinic-default\"},\n\"byWeight\"", "\"sourceKeys\":[],\"standing\":\"clinic-default\"},\n\"byWeight\"", "a figure names no source")]
    [InlineData("\"sourceKeys\":[\"clinic-default\"],\"standing\":\"clinic-default\"},\n\"byWeight\"", "\"sourceKeys\":[\"hearsay\"],\"standing\":\"clinic-default\"},\n\"byWeight\"", "the source 'hearsay' is not in the source table")]
    [InlineData("\"steeredBy\":\"dose\"", "\"steeredBy\":\"symptoms\"", "it is not steered by dose and has a target")]
    [InlineData("\"class\":\"beta-blocker\"", "\"class\":\"sedative\"", "class")]
    public void A_faulty_row_is_refused_with_file_row_and_reason(string part, string instead, string reason)
    {
        Assert.Contains(part, Row);
        var json = $"[{Row.Replace("\"name\":\"second\"", "\"name\":\"first\"")},{Row.Replace(part, instead)}]";

        var fault = Assert.Throws<TableFaultException>(() => Formulary.Parse(json, SourceTable.Load()));

        Assert.StartsWith("formulary.json, row 2: ", fault.Message);
        Assert.Contains(reason, fault.Message);
    }
}
