using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>What an input is: its name, unit and the range in which it is believed. Both ends are accepted.</summary>
internal sealed class Quantity<T>(string name, string unit, double lowest, double highest, Func<T, double> number, Func<T, string>? words = null)
    where T : struct
{
    private readonly string accepts = $"{Figures.Plain(lowest)} to {Figures.WithUnit(Figures.Plain(highest), unit)}";

    /// <summary>Looks at the value offered and says whether and why it cannot be used.</summary>
    public Input<T> Take(Given<T> given)
    {
        double value = given.Value is { } taken ? number(taken) : double.NaN;
        string shown = given.Value is { } there ? Show(there, value) : "";
        string? whyNot = given.From?.WhyNot
            ?? (given.Value is null ? $"no {name}"
            : given.Stale is { } stale ? $"{name} {stale}"
            : !(value >= lowest && value <= highest) ? $"{name} {shown} is outside {accepts}"
            : null);
        return new Input<T>(name, shown, accepts, whyNot, given.Value, value) { Day = given.Day, From = given.From };
    }

    /// <summary>As <see cref="Take"/>, but a calculation can do without the value.</summary>
    public Input<T> TakeIfThere(Given<T> given) =>
        given.Value is null ? new Input<T>(name, "not recorded", accepts, null, null, double.NaN) : Take(given);

    /// <summary>The same quantity under another name.</summary>
    public Quantity<T> Named(string other) => new(other, unit, lowest, highest, number, words);

    private string Show(T value, double inUnit)
    {
        bool believed = inUnit >= lowest && inUnit <= highest;
        return words is not null ? words(value) : Figures.WithUnit(believed ? Figures.Short(inUnit) : Figures.Plain(inUnit), unit);
    }
}

/// <summary>Inputs that are plain numbers, choices or answers.</summary>
internal static class Quantity
{
    public static Quantity<double> Of(string name, string unit, double lowest, double highest) =>
        new(name, unit, lowest, highest, value => value);

    public static Quantity<int> Whole(string name, string unit, int lowest, int highest) =>
        new(name, unit, lowest, highest, value => value);

    public static Quantity<decimal> Exact(string name, string unit, double lowest, double highest) =>
        new(name, unit, lowest, highest, value => (double)value);

    /// <summary>A length in centimetres, however it was typed.</summary>
    public static Quantity<Length> Centimetres(string name, double lowest, double highest) =>
        new(name, "cm", lowest, highest, length => (double)length.Centimetres);

    /// <summary>A yes or a no. An answer not given is missing: it is not a no.</summary>
    public static Input<bool> Answer(string name, Given<bool> given) =>
        given.Value is not { } answer ? new Input<bool>(name, "", "", $"no answer on {name}", null, double.NaN)
        : new Input<bool>(name, answer ? "yes" : "no", "", given.Stale is { } stale ? $"{name} {stale}" : null, answer, answer ? 1 : 0) { Day = given.Day };

    public static Input<Sex> Sex(Sex sex) => sex == Values.Sex.NotRecorded
        ? new Input<Sex>("sex", "", "", "sex not recorded", null, double.NaN)
        : new Input<Sex>("sex", sex == Values.Sex.Female ? "female" : "male", "", null, sex, (int)sex);
}
