namespace HfClinic.Clinical.Calculations;

/// <summary>One value as it went into a calculation, to be shown beside the result.</summary>
/// <param name="Name">"LVOT diameter".</param>
/// <param name="Shown">The value with its unit: "2 cm"; empty when it is missing.</param>
/// <param name="Accepts">The range accepted: "1.4 to 3 cm"; empty when any value is.</param>
/// <param name="WhyNot">Why it cannot be used: "no LVOT diameter"; null when it can.</param>
public record Input(string Name, string Shown, string Accepts, string? WhyNot)
{
    /// <summary>The day it was measured, when known.</summary>
    public DateOnly? Day { get; init; }

    /// <summary>The calculation it comes from, if any: its inputs, formula and sources can be followed there.</summary>
    public Computed? From { get; init; }

    /// <summary>What it counts in a score; null outside scores and when it cannot be told.</summary>
    public int? Points { get; init; }

    public bool IsUsable => WhyNot is null;

    /// <summary>An answer from a fixed list, such as the form of a medicine.</summary>
    internal static Input Choice(string name, string shown) => new(name, shown, "", null);
}

/// <summary>An input with its value.</summary>
/// <param name="Taken">The value; null when it is missing.</param>
/// <param name="Number">The value in the unit of its quantity; NaN when it is missing.</param>
public sealed record Input<T>(string Name, string Shown, string Accepts, string? WhyNot, T? Taken, double Number) : Input(Name, Shown, Accepts, WhyNot)
    where T : struct
{
    /// <summary>The value. Only read where the input is usable.</summary>
    /// <exception cref="InvalidOperationException">It is missing.</exception>
    public T Value => Taken ?? throw new InvalidOperationException($"{Name} is missing.");

    /// <summary>The same input with what it counts in a score; without points when it cannot be used.</summary>
    internal Input Worth(Func<T, int> points) => IsUsable ? this with { Points = points(Value) } : this;
}
