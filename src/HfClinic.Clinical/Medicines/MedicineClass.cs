namespace HfClinic.Clinical.Medicines;

/// <summary>The class a medicine of the formulary belongs to.</summary>
public enum MedicineClass
{
    BetaBlocker,
    AceInhibitor,
    Arb,
    Arni,
    Mra,
    NonsteroidalMra,
    Sglt2Inhibitor,
    HydralazineNitrate,
    Hydralazine,
    IsosorbideDinitrate,
    Ivabradine,
    Vericiguat,
    Digoxin,
    LoopDiuretic,
    ThiazideTypeDiuretic,
}
