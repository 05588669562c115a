using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>A published dose or range of doses with the place it was read.</summary>
/// <param name="Low">Lower bound of one taking, in the medicine's unit.</param>
/// <param name="High">Upper bound; the same as <paramref name="Low"/> when a single dose is published.</param>
/// <param name="TimesDaily">Takings a day; 0.5 is every other day.</param>
/// <param name="AtTargetFrom">Where a target counts as reached when that is not the lower bound (losartan); else null.</param>
/// <param name="SourceKeys">Keys into the source table.</param>
/// <param name="Standing">How well the figure is confirmed.</param>
public sealed record DoseFigure(
    decimal Low, decimal High, decimal TimesDaily, decimal? AtTargetFrom, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished
{
    /// <summary>The lower bound over a day.</summary>
    public decimal LowDaily => Low * TimesDaily;

    /// <summary>The upper bound over a day.</summary>
    public decimal HighDaily => High * TimesDaily;

    /// <summary>The total daily dose from which the target is reached.</summary>
    public decimal ReachedDaily => (AtTargetFrom ?? Low) * TimesDaily;

    /// <summary>
    /// The total daily dose in percent of this target, unrounded: of the dose from which it is reached when below, 100 within
    /// the range, of the upper bound when above.
    /// </summary>
    public decimal PercentOf(decimal totalDaily) =>
        totalDaily < ReachedDaily ? totalDaily / ReachedDaily * 100
        : totalDaily <= HighDaily ? 100
        : totalDaily / HighDaily * 100;
}

/// <summary>A figure that names its source and how well it is confirmed.</summary>
public interface IPublished
{
    /// <summary>Keys into the source table; at least one.</summary>
    ImmutableArray<string> SourceKeys { get; }

    /// <summary>How well the figure is confirmed.</summary>
    Standing Standing { get; }
}
