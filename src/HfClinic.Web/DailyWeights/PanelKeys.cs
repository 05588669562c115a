using HfClinic.Web.Ui;

namespace HfClinic.Web.DailyWeights;

/// <summary>The keys of this page, as its key sheet lists them.</summary>
public static class PanelKeys
{
    public const string Call = "c";
    public const string Ask = "a";
    public const string PutOff = "p";
    public const string QuickLine = "n";
    public const string More = "m";

    public static readonly IReadOnlyList<KeyHint> All =
    [
        new("C", "record a call for the open person"),
        new("A", "ask the prescriber"),
        new("P", "put off until a date"),
        new("N", "new called-in reading"),
        new("M", "more rows"),
        new("Ctrl Enter", "save the form you are typing in"),
    ];
}
