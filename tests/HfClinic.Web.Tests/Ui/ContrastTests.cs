using HfClinic.Web.Shell;
using MudBlazor;

namespace HfClinic.Web.Tests.Ui;

/// <summary>Source of both limits: WCAG 2.2 (W3C Recommendation), 1.4.3 contrast (minimum) and 1.4.11 non-text contrast.</summary>
public class ContrastTests
{
    private const double Text = 4.5;
    private const double Graphics = 3.0;

    public static TheoryData<string, string, double> Pairs
    {
        get
        {
            var pairs = new TheoryData<string, string, double>();
            foreach (var ground in new[] { "paper", "sheet", "wash" })
            {
                foreach (var text in new[] { "ink", "soft", "accent", "signal" })
                {
                    pairs.Add(text, ground, Text);
                }

                pairs.Add("tick", ground, Graphics);
                pairs.Add("dot", ground, Graphics);
            }

            pairs.Add("on-accent", "accent", Text);
            pairs.Add("paper", "ink", Text);
            foreach (var mark in new[] { "band-line", "trend", "dot", "signal" })
            {
                pairs.Add(mark, "band", Graphics);
            }

            return pairs;
        }
    }

    [Theory]
    [MemberData(nameof(Pairs))]
    public void Enough_in_both_themes(string mark, string ground, double least)
    {
        var tokens = ColourTokens.Read();
        Assert.InRange(ColourTokens.Contrast(tokens[mark].Light, tokens[ground].Light), least, 21);
        Assert.InRange(ColourTokens.Contrast(tokens[mark].Dark, tokens[ground].Dark), least, 21);
    }

    /// <summary>Black on white is 21:1 and #767676 on white is the well-known lightest grey that passes 4.5:1 (WCAG 2.2, technique G18; the grey from memory).</summary>
    [Fact]
    public void The_formula_gives_the_published_ratios()
    {
        Assert.Equal(21, ColourTokens.Contrast("#000000", "#ffffff"), 6);
        Assert.Equal(4.54, ColourTokens.Contrast("#767676", "#ffffff"), 2);
        Assert.True(ColourTokens.Contrast("#777777", "#ffffff") < Text);
    }

    [Fact]
    public void The_control_palettes_repeat_the_tokens()
    {
        var tokens = ColourTokens.Read();
        Check(ClinicTheme.Theme.PaletteLight, name => tokens[name].Light);
        Check(ClinicTheme.Theme.PaletteDark, name => tokens[name].Dark);
    }

    private static void Check(Palette palette, Func<string, string> token)
    {
        Same(token("paper"), palette.Background);
        Same(token("sheet"), palette.Surface);
        Same(token("wash"), palette.BackgroundGray);
        Same(token("ink"), palette.TextPrimary);
        Same(token("soft"), palette.TextSecondary);
        Same(token("hairline"), palette.Divider);
        Same(token("line"), palette.GrayLighter);
        Same(token("accent"), palette.Primary);
        Same(token("on-accent"), palette.PrimaryContrastText);
        Same(token("signal"), palette.Error);
    }

    private static void Same(string token, MudBlazor.Utilities.MudColor colour) =>
        Assert.Equal(token, colour.ToString(MudBlazor.Utilities.MudColorOutputFormats.Hex), ignoreCase: true);
}
