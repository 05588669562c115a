using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Tests.Sources;

public class SourceTableTests
{
    private const string Good = """{"key":"a-2020","title":"A","year":2020,"where":"Journal 1:1","standing":"confirmed"}""";

    [Fact]
    public void The_embedded_table_loads() => Assert.Equal(2021, SourceTable.Load()["esc-2021-self-care"].Year);

    [Fact]
    public void An_undated_source_has_no_year() => Assert.Null(SourceTable.Parse($"[{Good.Replace("2020,", "null,")}]")["a-2020"].Year);

    [Fact]
    public void An_unknown_key_is_a_fault_of_the_program() =>
        Assert.Contains("no-such", Assert.Throws<KeyNotFoundException>(() => SourceTable.Load()["no-such"]).Message);

    [Theory]
    [InlineData("\"year\":2020", "\"year\":2020,\"page\":3", "page")]
    [InlineData("\"year\":2020,", "", "year")]
    [InlineData("\"year\":2020", "\"year\":\"2020\"", "year")]
    [InlineData("\"year\":2020", "\"year\":20", "20 is not a year")]
    [InlineData("\"year\":2020", "\"year\":2020,\"year\":2021", "year")]
    [InlineData("\"title\":\"A\"", "\"title\":\"  \"", "title is blank")]
    [InlineData("\"title\":\"A\"", "\"title\":null", "title")]
    [InlineData("\"where\":\"Journal 1:1\"", "\"where\":\"\"", "where to find it")]
    [InlineData("\"confirmed\"", "\"sure\"", "standing")]
    [InlineData("\"confirmed\"", "0", "standing")]
    [InlineData("a-2020", " ", "key is blank")]
    public void A_faulty_row_is_refused_with_file_row_and_reason(string part, string instead, string reason)
    {
        var json = $"[{Good.Replace("a-2020", "first")},{Good.Replace(part, instead)}]";

        var fault = Assert.Throws<TableFaultException>(() => SourceTable.Parse(json));

        Assert.StartsWith("sources.json, row 2: ", fault.Message);
        Assert.Contains(reason, fault.Message);
    }

    [Fact]
    public void A_repeated_key_is_refused() =>
        Assert.Equal("sources.json, row 2: the key 'a-2020' is there twice",
            Assert.Throws<TableFaultException>(() => SourceTable.Parse($"[{Good},{Good}]")).Message);

    [Theory]
    [InlineData("{}", "sources.json: a table is an array of rows")]
    [InlineData("[{]", "sources.json: not JSON")]
    [InlineData("[null]", "sources.json, row 1: the row is null")]
    public void Something_that_is_no_table_is_refused(string json, string message) =>
        Assert.StartsWith(message, Assert.Throws<TableFaultException>(() => SourceTable.Parse(json)).Message);
}
