using Microsoft.Playwright;

namespace HfClinic.Browser.Tests.Browser;

/// <summary>The two window sizes every page must be usable in, in CSS pixels.</summary>
public sealed record WindowSize(int Width, int Height)
{
    public static WindowSize Desk { get; } = new(1440, 900);

    public static WindowSize Phone { get; } = new(390, 844);

    public ViewportSize Viewport => new() { Width = Width, Height = Height };
}
