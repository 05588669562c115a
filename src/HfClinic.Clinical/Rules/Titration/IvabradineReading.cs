using System.Globalization;
using HfClinic.Clinical.Calculations;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>
/// Reads ivabradine against its target, a heart rate of 50 to 60 at rest in sinus rhythm. Sources: ivabradine label; ESC 2021, 5.4.3.
/// </summary>
internal sealed class IvabradineReading(TakenMedicine medicine, TitrationFacts facts)
{
    private readonly PatientPicture _picture = facts.Picture;

    private readonly ClinicProtocol _protocol = facts.Protocol;

    private const string Name = "ivabradine";

    private readonly string _band = string.Create(
        CultureInfo.InvariantCulture, $"{facts.Protocol["heart-rate.ivabradine-low"].Value:0} to {facts.Protocol["heart-rate.ivabradine-high"].Value:0}/min");

    public ClassTitration Read(Phenotype phenotype)
    {
        var days = _picture.AsOf.DayNumber - medicine.Since.DayNumber;
        var tempo = Tempo.Of(MedicineClass.Ivabradine, false, _protocol);
        var candidate = new Candidate(MedicineClass.Ivabradine, Name, false);
        var holds = Holds.Now(TitrationClass.Ivabradine, candidate, facts, null);
        var cleared = Holds.LastCleared(TitrationClass.Ivabradine, candidate, facts, medicine.Since);
        var what = $"{medicine.Words}, unchanged for {Wording.Days(days)}";
        var reading = new ClassTitration
        {
            Class = TitrationClass.Ivabradine,
            State = TitrationState.AtTarget,
            Sentence = $"{Name}: {what}",
            Taken = medicine,
            Target = $"heart rate {_band}",
            DaysUnchanged = days,
            StepFrom = medicine.Since.AddDays(tempo.Earliest),
            DueSince = medicine.Since.AddDays(tempo.Gap),
            OverdueFrom = (cleared > medicine.Since ? cleared.Value : medicine.Since).AddDays(tempo.Overdue),
            Holds = holds,
            IsSetAside = holds.Any(hold => hold.Effect >= LimitEffect.Review),
            Missing = Freshness.Missing(TitrationClass.Ivabradine, facts),
            Limit = RecordedLimits.Standing(TitrationClass.Ivabradine, _picture, _protocol),
            SourceKeys = ["label-ivabradine", "esc-2021-text"],
        };
        if (_picture.Rhythm is { What: Rhythm.AtrialFibrillation } rhythm)
        {
            var note = $"{medicine.Words}, and atrial fibrillation on {Wording.Day(rhythm.Day)}: acts only in sinus rhythm";
            return reading with
            {
                State = TitrationState.NotIndicated,
                Sentence = $"{Name}: {note}",
                Notes = [new(TitrationNoteKind.NotInSinusRhythm, note, reading.SourceKeys, rhythm.Day)],
            };
        }

        if (!phenotype.OnHfrefPathway)
        {
            return reading with { State = TitrationState.NotIndicated, Sentence = $"{Name}: {what}; not looked for in {EjectionFractionClass.Words(phenotype.Kind)}" };
        }

        var rate = facts.Latest(LimitMeasure.HeartRate);
        var high = _protocol["heart-rate.ivabradine-high"];
        if (rate is not null && holds.IsEmpty && !high.IsMetBy(rate.Value))
        {
            return reading with { Sentence = $"{Name}: on target: {rate.Words}, within {_band}; {what}" };
        }

        var maximum = medicine.Match.Medicine!.DosesFor(_protocol.DoseProfile())!.Maximum!;
        return holds.IsEmpty && medicine.Daily >= maximum.LowDaily
            ? reading with { Sentence = $"{Name}: at the highest published dose: {what}" }
            : GapState.Decide(reading, _picture, TitrationState.Due, $"above the target rate: {rate?.Words ?? "heart rate not known"}; {what}", Name);
    }
}
