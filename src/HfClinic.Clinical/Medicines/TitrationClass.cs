using System.Collections.Immutable;

namespace HfClinic.Clinical.Medicines;

/// <summary>What is titrated as one: the four pillars of HFrEF therapy and the other medicines with a target.</summary>
public enum TitrationClass
{
    BetaBlocker,

    /// <summary>ACE inhibitor, ARB or ARNI.</summary>
    RasInhibitor,

    Mra,
    Sglt2Inhibitor,
    HydralazineNitrate,
    Ivabradine,
    Vericiguat,
    Finerenone,
}

/// <summary>Titration classes in words and in medicine classes.</summary>
public static class TitrationClasses
{
    /// <summary>All, pillars first.</summary>
    public static readonly ImmutableArray<TitrationClass> All = [.. Enum.GetValues<TitrationClass>()];

    /// <summary>The four pillars of HFrEF therapy (ESC 2021 5.3; AHA 2022 7.3).</summary>
    public static readonly ImmutableArray<TitrationClass> Pillars =
        [TitrationClass.BetaBlocker, TitrationClass.RasInhibitor, TitrationClass.Mra, TitrationClass.Sglt2Inhibitor];

    /// <summary>As written in a statement, and the subject of a finding: "beta blocker".</summary>
    public static string Words(TitrationClass titration) => titration switch
    {
        TitrationClass.BetaBlocker => "beta blocker",
        TitrationClass.RasInhibitor => "RAS inhibitor",
        TitrationClass.Mra => "MRA",
        TitrationClass.Sglt2Inhibitor => "SGLT2 inhibitor",
        TitrationClass.HydralazineNitrate => "hydralazine and nitrate",
        TitrationClass.Ivabradine => "ivabradine",
        TitrationClass.Vericiguat => "vericiguat",
        _ => "finerenone",
    };

    /// <summary>The titration class of a medicine class, or null when it is not titrated to a target.</summary>
    public static TitrationClass? Of(MedicineClass medicine) => medicine switch
    {
        MedicineClass.BetaBlocker => TitrationClass.BetaBlocker,
        MedicineClass.AceInhibitor or MedicineClass.Arb or MedicineClass.Arni => TitrationClass.RasInhibitor,
        MedicineClass.Mra => TitrationClass.Mra,
        MedicineClass.NonsteroidalMra => TitrationClass.Finerenone,
        MedicineClass.Sglt2Inhibitor => TitrationClass.Sglt2Inhibitor,
        MedicineClass.HydralazineNitrate or MedicineClass.Hydralazine or MedicineClass.IsosorbideDinitrate =>
            TitrationClass.HydralazineNitrate,
        MedicineClass.Ivabradine => TitrationClass.Ivabradine,
        MedicineClass.Vericiguat => TitrationClass.Vericiguat,
        _ => null,
    };
}
