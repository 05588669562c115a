using System.Globalization;

namespace HfClinic.Clinical.Values;

/// <summary>A length: a height, or a measure of the heart typed in centimetres or millimetres. Conversions are exact.</summary>
public readonly record struct Length
{
    private Length(decimal millimetres) => Millimetres = millimetres;

    /// <summary>Millimetres, exact.</summary>
    public decimal Millimetres { get; }

    /// <summary>Centimetres, exact.</summary>
    public decimal Centimetres => Millimetres / 10m;

    /// <summary>Metres, exact.</summary>
    public decimal Metres => Millimetres / 1000m;

    public static Length FromMillimetres(decimal millimetres) => new(millimetres);

    /// <exception cref="OverflowException">The value is too large for a decimal number of millimetres.</exception>
    public static Length FromCentimetres(decimal centimetres) => new(centimetres * 10m);

    /// <summary>In centimetres: "2.1 cm".</summary>
    public override string ToString() => string.Create(CultureInfo.InvariantCulture, $"{Centimetres:0.##} cm");
}
