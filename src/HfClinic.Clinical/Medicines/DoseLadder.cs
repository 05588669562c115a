using System.Collections.Immutable;
using HfClinic.Clinical.Sources;

namespace HfClinic.Clinical.Medicines;

/// <summary>One rung of a dose ladder.</summary>
/// <param name="Amount">Of one taking, in the medicine's unit.</param>
/// <param name="TimesDaily">Takings a day; 0.5 is every other day.</param>
/// <param name="Words">How the strength is written where it is not its amount: "49/51 mg"; else null.</param>
public sealed record Rung(decimal Amount, decimal TimesDaily, string? Words)
{
    public decimal Daily => Amount * TimesDaily;
}

/// <summary>The usual steps of a medicine, lowest first.</summary>
public sealed record DoseLadder(ImmutableArray<Rung> Rungs, ImmutableArray<string> SourceKeys, Standing Standing) : IPublished
{
    /// <summary>The rung whose total daily dose is the given one, or null when the dose lies off the ladder.</summary>
    public Rung? At(decimal totalDaily) => Rungs.FirstOrDefault(rung => rung.Daily == totalDaily);

    /// <summary>The first rung above the given total daily dose, or null at the top.</summary>
    public Rung? Above(decimal totalDaily) => Rungs.FirstOrDefault(rung => rung.Daily > totalDaily);
}
