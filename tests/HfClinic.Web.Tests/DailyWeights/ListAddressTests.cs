using HfClinic.Records.DailyWeights;
using HfClinic.Web.DailyWeights;

namespace HfClinic.Web.Tests.DailyWeights;

public class ListAddressTests
{
    [Fact]
    public void Every_view_and_order_survives_the_address() => Assert.All(
        from view in Enum.GetValues<DailyWeightsView>() from sort in Enum.GetValues<DailyWeightsSort>() select new ListAddress(view, "Ó Briain & co", sort),
        address => Assert.Equal(address, Again(address)));

    [Fact]
    public void Everyone_by_urgency_is_the_plain_address() => Assert.Equal("daily-weights", ListAddress.Read(null, null, null).Href);

    [Fact]
    public void Unknown_words_show_everyone_rather_than_nobody() =>
        Assert.True(ListAddress.Read("nonsense", "", "nonsense") is { IsEveryone: true, Sort: DailyWeightsSort.Urgency });

    private static ListAddress Again(ListAddress address)
    {
        var query = System.Web.HttpUtility.ParseQueryString(new Uri(new Uri("http://x/"), address.Href).Query);
        return ListAddress.Read(query["view"], query["q"], query["sort"]);
    }
}
