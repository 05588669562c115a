using HfClinic.Records.DailyWeights;

namespace HfClinic.Web.DailyWeights;

/// <summary>What the list shows, as it stands in the address: <c>daily-weights?view=silent&amp;q=elsmere&amp;sort=7-days</c>.</summary>
public sealed record ListAddress(DailyWeightsView View, string Search, DailyWeightsSort Sort)
{
    public const string Page = "daily-weights";

    private static readonly (DailyWeightsView View, string Word)[] Views =
    [
        (DailyWeightsView.Today, "today"), (DailyWeightsView.ThisWeek, "this-week"), (DailyWeightsView.Silent, "silent"),
        (DailyWeightsView.ToCheck, "to-check"), (DailyWeightsView.Mine, "mine"), (DailyWeightsView.NotYet, "not-yet"), (DailyWeightsView.PutOff, "put-off"),
    ];

    private static readonly (DailyWeightsSort Sort, string Word)[] Sorts =
    [
        (DailyWeightsSort.Name, "name"), (DailyWeightsSort.Change1Day, "1-day"), (DailyWeightsSort.Change3Days, "3-days"),
        (DailyWeightsSort.Change7Days, "7-days"), (DailyWeightsSort.ToTarget, "to-target"), (DailyWeightsSort.LastWeight, "last-weight"),
    ];

    /// <summary>Reads the address; an unknown word means everyone, or the order of urgency.</summary>
    public static ListAddress Read(string? view, string? search, string? sort) => new(
        Views.FirstOrDefault(known => known.Word == view).View,
        search?.Trim() ?? "",
        Sorts.FirstOrDefault(known => known.Word == sort).Sort);

    /// <summary>The address, relative to the program's root.</summary>
    public string Href
    {
        get
        {
            List<string> parts = [];
            if (View != DailyWeightsView.All)
            {
                parts.Add("view=" + Views.First(known => known.View == View).Word);
            }

            if (Search.Length > 0)
            {
                parts.Add("q=" + Uri.EscapeDataString(Search));
            }

            if (Sort != DailyWeightsSort.Urgency)
            {
                parts.Add("sort=" + Sorts.First(known => known.Sort == Sort).Word);
            }

            return parts.Count == 0 ? Page : $"{Page}?{string.Join('&', parts)}";
        }
    }

    /// <summary>Whether everyone is shown.</summary>
    public bool IsEveryone => View == DailyWeightsView.All && Search.Length == 0;
}
