using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>What must be known and fresh before a gap is shown.</summary>
public enum GapNeed
{
    SystolicPressure,
    HeartRate,
    WeightOrCongestion,
    Potassium,

    /// <summary>Creatinine or eGFR.</summary>
    RenalFunction,

    Rhythm,
}

/// <summary>What one titration class needs: the values its limits are read from.</summary>
public sealed record GapChecks(
    TitrationClass Titration, ImmutableArray<GapNeed> Needs, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished
{
    private const string File = "gap-checks.json";

    private static readonly ImmutableArray<GapChecks> All = Parse(StrictTable.Text(File), SourceTable.Load());

    /// <inheritdoc cref="ClassLimit.Parse"/>
    public static ImmutableArray<GapChecks> Parse(string json, SourceTable sources) =>
        StrictTable.Read<GapChecks>(File, json, row => row.Titration.ToString(), row =>
            row.Needs.IsDefaultOrEmpty ? "nothing is needed" : SourceCheck.WhyRefused(row.SourceKeys, sources));

    /// <summary>What the class needs.</summary>
    public static ImmutableArray<GapNeed> For(TitrationClass titration) => All.Single(row => row.Titration == titration).Needs;
}
