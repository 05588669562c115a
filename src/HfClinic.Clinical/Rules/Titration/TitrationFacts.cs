using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>What the titration rules read of one picture, gathered once.</summary>
internal sealed class TitrationFacts
{
    private static readonly ImmutableArray<MedicineClass> BaselineClasses =
        [MedicineClass.AceInhibitor, MedicineClass.Arb, MedicineClass.Arni, MedicineClass.Mra, MedicineClass.Sglt2Inhibitor];

    private readonly ImmutableArray<ImmutableArray<Measured>> _series;

    private readonly ImmutableArray<Measured?> _latest;

    public TitrationFacts(PatientPicture picture, ClinicProtocol protocol)
    {
        (Picture, Protocol) = (picture, protocol);
        Taken = TakenMedicine.Of(picture);
        Baseline = FindBaseline();
        LastRasOrMraStep = LastStep([.. BaselineClasses.Remove(MedicineClass.Sglt2Inhibitor)]);
        _series = [.. Enum.GetValues<LimitMeasure>().Select(measure => Measured.Series(measure, picture, Baseline))];
        _latest = [.. Enum.GetValues<LimitMeasure>().Select(FindLatest)];
    }

    public PatientPicture Picture { get; }

    public ClinicProtocol Protocol { get; }

    public ImmutableArray<TakenMedicine> Taken { get; }

    /// <summary>
    /// The last creatinine up to the day of the latest step of a RAS inhibitor, MRA or SGLT2 inhibitor, not older than the protocol's number
    /// of days at that step; null when there is none.
    /// </summary>
    public Measured? Baseline { get; }

    /// <summary>The last day on which the dose of a RAS inhibitor or MRA changed.</summary>
    public DateOnly? LastRasOrMraStep { get; }

    /// <summary>All values up to the picture's day, in order of time.</summary>
    public ImmutableArray<Measured> Series(LimitMeasure measure) => _series[(int)measure];

    /// <summary>The latest value, or null when it is missing or too old to count.</summary>
    public Measured? Latest(LimitMeasure measure) => _latest[(int)measure];

    /// <summary>Whether the day is within the protocol's number of days before the picture's day.</summary>
    public bool IsFresh(DateOnly day, string thresholdKey) => Protocol[thresholdKey].IsMetBy(Picture.AsOf.DayNumber - day.DayNumber);

    private Measured? FindLatest(LimitMeasure measure)
    {
        var key = measure is LimitMeasure.SystolicPressure or LimitMeasure.HeartRate ? "fresh.vitals-days" : "fresh.labs-days";
        return Series(measure).LastOrDefault() is { } latest && IsFresh(latest.Day, key) ? latest : null;
    }

    private Measured? FindBaseline()
    {
        var step = LastStep(BaselineClasses);
        var before = Measured.Series(LimitMeasure.Creatinine, Picture, null).LastOrDefault(value => value.Day <= step);
        return before is not null && Protocol["baseline.days"].IsMetBy(step!.Value.DayNumber - before.Day.DayNumber) ? before : null;
    }

    private DateOnly? LastStep(ImmutableArray<MedicineClass> classes) =>
        TakenMedicine.Steps(Picture, classes).Cast<DateOnly?>().FirstOrDefault();
}
