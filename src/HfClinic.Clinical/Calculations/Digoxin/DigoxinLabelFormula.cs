namespace HfClinic.Clinical.Calculations.Digoxin;

/// <summary>The formula behind the older US label (after Jelliffe): body stores and the share lost each day. History only.</summary>
public static class DigoxinLabelFormula
{
    /// <summary>Peak body stores aimed at in heart failure by the older label, micrograms for each kg of lean weight.</summary>
    public const double StoresPerKilogram = 10;

    private const string History = "Aims at the older range of 0.8 to 2 ng/mL, about twice what 0.5 to 0.9 ng/mL needs: history only.";

    private static readonly Formula Loss = new("digoxin lost in a day", "%", 1, "14 + creatinine clearance / 5", ["digoxin-label-older"])
    {
        Caution = History,
    };

    private static readonly Formula Replacement = new(
        "digoxin lost in a day, as absorbed", "micrograms", 0, "10 micrograms for each kg of lean weight × share lost in a day", ["digoxin-label-older"])
    {
        Caution = History,
    };

    private static readonly Quantity<double> Percent = Quantity.Of("digoxin lost in a day", "%", 14, 64);

    /// <summary>Percent of body stores lost in a day. Creatinine clearance 0 to 250 mL/min.</summary>
    public static Computed<double> PercentLostDaily(Given<double> creatinineClearance)
    {
        var clearance = Accepted.CreatinineClearance.Take(creatinineClearance);
        return Loss.Compute([clearance], () => 14 + clearance.Number / 5);
    }

    /// <summary>Micrograms of absorbed digoxin lost in a day at the label's stores. Lean weight 25 to 250 kg.</summary>
    public static Computed<double> AbsorbedLostDaily(Given<double> leanKilograms, Given<double> percentLostDaily)
    {
        var (weight, percent) = (Accepted.DosingWeight.Take(leanKilograms), Percent.Take(percentLostDaily));
        return Replacement.Compute([weight, percent], () => StoresPerKilogram * weight.Number * percent.Number / 100);
    }
}
