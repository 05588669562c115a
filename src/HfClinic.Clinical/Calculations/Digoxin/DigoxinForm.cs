namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>How digoxin is given.</summary>
public enum DigoxinForm
{
    Tablet,
    Elixir,
    Capsule,
    Intravenous,
}

/// <summary>How much of each form reaches the blood.</summary>
/// <remarks>Published ranges: US digoxin label. Working figures: pharmacokinetics texts, seen second-hand.</remarks>
public static class DigoxinForms
{
    /// <summary>The absorbed share used in formulas: tablet 0.7, elixir 0.8, capsule and injection 1.</summary>
    public static double AbsorbedShare(DigoxinForm form) => form switch
    {
        DigoxinForm.Tablet => 0.7,
        DigoxinForm.Elixir => 0.8,
        _ => 1,
    };

    /// <summary>The form with the published range: "0.7 (tablets, published 60 to 80 %)".</summary>
    public static string Words(DigoxinForm form) => form switch
    {
        DigoxinForm.Tablet => "0.7 (tablets, published 60 to 80 %)",
        DigoxinForm.Elixir => "0.8 (elixir, published 70 to 85 %)",
        DigoxinForm.Capsule => "1 (capsules, published 90 to 100 %)",
        _ => "1 (injection)",
    };

    internal static Input Share(DigoxinForm form) => Input.Choice("absorbed share", Words(form));
}
