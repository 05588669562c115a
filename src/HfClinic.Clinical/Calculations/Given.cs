using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Calculations;

/// <summary>
/// One value offered to a calculation. The default is a missing value. A plain value and a <see cref="Computed{T}"/>
/// convert to it, so that one calculation can feed the next and a missing input is named at the end of the chain.
/// </summary>
/// <typeparam name="T">A number or a value type of its own; the unit is in the type or in the parameter's name.</typeparam>
/// <param name="Value">The value; null when it is missing or could not be computed.</param>
/// <param name="Day">The day it was measured, when known.</param>
public readonly record struct Given<T>(T? Value, DateOnly? Day = null)
    where T : struct
{
    /// <summary>The calculation it comes from, if any.</summary>
    public Computed? From { get; private init; }

    /// <summary>Why the value is not usable although it is there, to follow its name: "of 03 Mar 2024 is more than 365 days old".</summary>
    public string? Stale { get; private init; }

    public static implicit operator Given<T>(T value) => new(value);

    public static implicit operator Given<T>(T? value) => new(value);

    /// <summary>The result of a calculation as the input of another, as old as its oldest input; the reason goes along when there is no result.</summary>
    public static implicit operator Given<T>(Computed<T> computed) => new(computed.Value, computed.OldestDay) { From = computed };

    /// <summary>The same value, marked unusable when it is undated, dated after the day asked for, or older than allowed.</summary>
    /// <param name="days">The oldest age allowed, in days; an age of exactly this many days is allowed.</param>
    /// <param name="asOf">The day for which is computed.</param>
    public Given<T> NotOlderThan(int days, DateOnly asOf) => Value is null ? this : this with { Stale = WhyStale(days, asOf) };

    private string? WhyStale(int days, DateOnly asOf) =>
        Day is not { } day ? "has no date"
        : day > asOf ? $"is dated {Wording.Day(day)}, after {Wording.Day(asOf)}"
        : asOf.DayNumber - day.DayNumber > days ? $"of {Wording.Day(day)} is more than {Wording.Days(days)} old"
        : null;
}
