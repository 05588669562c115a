namespace HfClinic.Clinical.Calculations;

/// <summary>Iron deficiency in heart failure by the ESC definition of 2021.</summary>
public static class IronDeficiency
{
    private static readonly Formula Saturation = new("transferrin saturation", "%", 0, "100 × iron / iron-binding capacity, same unit", ["common-definitions"]);

    private static readonly Formula Definition = new(
        "iron deficiency",
        "",
        0,
        "ferritin below 100 micrograms/L, or 100 to 299 micrograms/L with transferrin saturation below 20 %",
        ["esc-2021-iron-deficiency"])
    {
        Caution = "Newer papers prefer transferrin saturation below 20 % or iron of 13 µmol/L or less, whatever the ferritin.",
    };

    private static readonly Quantity<decimal> Iron = Quantity.Exact("iron", "µmol/L", 0.5, 100);
    private static readonly Quantity<decimal> BindingCapacity = Quantity.Exact("iron-binding capacity", "µmol/L", 10, 150);
    private static readonly Quantity<decimal> Ferritin = Quantity.Exact("ferritin", "micrograms/L", 1, 10_000);
    private static readonly Quantity<decimal> Percent = Quantity.Exact("transferrin saturation", "%", 1, 100);

    /// <summary>Transferrin saturation, percent. Iron 0.5 to 100 µmol/L, capacity 10 to 150 µmol/L and not below the iron.</summary>
    public static Computed<decimal> TransferrinSaturation(Given<decimal> ironMicromolPerLitre, Given<decimal> capacityMicromolPerLitre)
    {
        var (iron, capacity) = (Iron.Take(ironMicromolPerLitre), BindingCapacity.Take(capacityMicromolPerLitre));
        return Saturation.Compute(
            [iron, capacity],
            () => 100m * iron.Value / capacity.Value,
            percent => $"{Figures.Fixed((double)percent, Saturation.Decimals)} {Saturation.Unit}",
            () => iron.Value <= capacity.Value ? null : $"iron {iron.Shown} is above iron-binding capacity {capacity.Shown}");
    }

    /// <summary>
    /// Whether the definition is met. Ferritin 1 to 10,000 micrograms/L, saturation 1 to 100 %. Saturation is only needed for a ferritin
    /// of 100 micrograms/L and above, below 300.
    /// </summary>
    public static Computed<bool> IsMet(Given<decimal> ferritinMicrogramsPerLitre, Given<decimal> transferrinSaturationPercent)
    {
        var ferritin = Ferritin.Take(ferritinMicrogramsPerLitre);
        bool decides = !ferritin.IsUsable || (ferritin.Value >= 100 && ferritin.Value < 300);
        var saturation = decides ? Percent.Take(transferrinSaturationPercent) : Percent.TakeIfThere(transferrinSaturationPercent);
        return Definition.Compute(
            [ferritin, saturation],
            () => ferritin.Value < 100 || (ferritin.Value < 300 && saturation.Value < 20),
            met => met ? "definition met" : "definition not met");
    }
}
