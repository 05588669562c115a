using MudBlazor;

namespace HfClinic.Web.Shell;

/// <summary>MudBlazor's controls in the clinic's paper and ink. The colours repeat the tokens of <c>wwwroot/clinic.css</c>; a test compares them.</summary>
public static class ClinicTheme
{
    private static readonly string[] Fonts = ["Atkinson Hyperlegible Next", "system-ui", "sans-serif"];

    public static readonly MudTheme Theme = new()
    {
        PaletteLight = Fill(new PaletteLight(), paper: "#fbfaf6", sheet: "#ffffff", wash: "#f4f1e9", ink: "#1b2227", soft: "#56626b",
            hairline: "#e2ddd2", line: "#cfc8b9", accent: "#0b5a6b", onAccent: "#ffffff", signal: "#a8321f"),
        PaletteDark = Fill(new PaletteDark(), paper: "#13181b", sheet: "#1a2125", wash: "#20282c", ink: "#ebe8e0", soft: "#a9b3b9",
            hairline: "#2c353a", line: "#414c52", accent: "#7cc4d3", onAccent: "#0a2229", signal: "#f39a84"),
        LayoutProperties = new LayoutProperties { DefaultBorderRadius = "0" },
        Typography = new Typography
        {
            Default = new DefaultTypography { FontFamily = Fonts, FontSize = "0.9375rem", LineHeight = "1.45", LetterSpacing = "normal" },
            Body1 = new Body1Typography { FontFamily = Fonts, FontSize = "0.9375rem", LineHeight = "1.45", LetterSpacing = "normal" },
            Body2 = new Body2Typography { FontFamily = Fonts, FontSize = "0.90625rem", LineHeight = "1.4", LetterSpacing = "normal" },
            Caption = new CaptionTypography { FontFamily = Fonts, FontSize = "0.78125rem", LetterSpacing = "normal" },
            H1 = new H1Typography { FontFamily = Fonts, FontSize = "1.8125rem", FontWeight = "700", LineHeight = "1.15", LetterSpacing = "-0.012em" },
            H6 = new H6Typography { FontFamily = Fonts, FontSize = "1.25rem", FontWeight = "700", LineHeight = "1.2", LetterSpacing = "normal" },
            Button = new ButtonTypography { FontFamily = Fonts, FontSize = "0.9375rem", FontWeight = "600", TextTransform = "none", LetterSpacing = "normal" },
        },
    };

    // One accent and one signal carry every role a control may ask for: no traffic-light colours reach the page.
    private static T Fill<T>(T palette, string paper, string sheet, string wash, string ink, string soft,
        string hairline, string line, string accent, string onAccent, string signal)
        where T : Palette
    {
        palette.Background = paper;
        palette.BackgroundGray = wash;
        palette.Surface = palette.DrawerBackground = sheet;
        palette.AppbarBackground = paper;
        palette.AppbarText = palette.TextPrimary = palette.DrawerText = palette.Black = ink;
        palette.TextSecondary = palette.ActionDefault = palette.DrawerIcon = soft;
        palette.TextDisabled = palette.ActionDisabled = soft;
        palette.ActionDisabledBackground = wash;
        palette.LinesDefault = palette.Divider = palette.TableLines = hairline;
        palette.DividerLight = hairline;
        palette.LinesInputs = soft;
        palette.TableHover = palette.TableStriped = wash;
        palette.GrayLighter = line;
        palette.Primary = palette.Secondary = palette.Tertiary = palette.Info = palette.Success = palette.Warning = accent;
        palette.PrimaryContrastText = palette.SecondaryContrastText = palette.TertiaryContrastText = onAccent;
        palette.InfoContrastText = palette.SuccessContrastText = palette.WarningContrastText = onAccent;
        palette.Error = signal;
        palette.ErrorContrastText = paper;
        palette.Dark = ink;
        palette.DarkContrastText = paper;
        return palette;
    }
}
