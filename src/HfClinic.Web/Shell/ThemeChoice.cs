namespace HfClinic.Web.Shell;

/// <summary>What a person asked for: the device's own setting, or always one of the two.</summary>
public enum ThemeChoice
{
    System = 0,
    Light = 1,
    Dark = 2,
}

/// <summary>The choice as the cookie and the page's <c>data-theme</c> spell it.</summary>
public static class ThemeChoices
{
    /// <summary>Also written by <c>wwwroot/theme.js</c>.</summary>
    public const string CookieName = "clinic-theme";

    /// <summary>Anything but a known word is the device's own setting.</summary>
    public static ThemeChoice Parse(string? word) => word switch
    {
        "light" => ThemeChoice.Light,
        "dark" => ThemeChoice.Dark,
        _ => ThemeChoice.System,
    };

    public static string Word(ThemeChoice choice) => choice switch
    {
        ThemeChoice.Light => "light",
        ThemeChoice.Dark => "dark",
        _ => "system",
    };
}
