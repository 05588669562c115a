using HfClinic.Clinical.Medicines;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>How soon a step may come, is shown as due and is overdue, in days; from the protocol.</summary>
internal sealed record Tempo(int Earliest, int Gap, int Overdue)
{
    /// <summary>The tempo of a pillar that is absent.</summary>
    public static Tempo OfAbsence(ClinicProtocol protocol) =>
        new(0, Days(protocol, "titration.absent.gap-days"), Days(protocol, "titration.absent.overdue-days"));

    /// <summary>The tempo of a medicine that is taken.</summary>
    /// <param name="startedLow">Sacubitril/valsartan at its lowest rung since its start.</param>
    public static Tempo Of(MedicineClass medicine, bool startedLow, ClinicProtocol protocol)
    {
        var key = medicine switch
        {
            MedicineClass.BetaBlocker => "beta-blocker",
            MedicineClass.AceInhibitor or MedicineClass.Arb => "ace-inhibitor-arb",
            MedicineClass.Arni => "arni",
            MedicineClass.Mra => "mra",
            MedicineClass.NonsteroidalMra => "finerenone",
            _ => "stepped",
        };
        return new(
            Days(protocol, startedLow ? "titration.arni.earliest-low-start-days" : $"titration.{key}.earliest-days"),
            Days(protocol, $"titration.{key}.gap-days"),
            Days(protocol, $"titration.{key}.overdue-days"));
    }

    private static int Days(ClinicProtocol protocol, string key) => (int)protocol[key].Value;
}
