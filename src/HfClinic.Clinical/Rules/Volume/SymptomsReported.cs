using System.Collections.Immutable;
using System.Numerics;
using HfClinic.Clinical.Picture;
using HfClinic.Clinical.Values;
using HfClinic.Clinical.Weights;

namespace HfClinic.Clinical.Rules.Volume;

/// <summary>
/// Symptoms told in the last 3 days, with or without a change of weight: weight alone finds a minority of those who get
/// worse. Source: ESC 2021 symptoms of heart failure, from memory; breathlessness before admission, Howie-Esquivel 2019;
/// the urgencies are a default of this program.
/// </summary>
public sealed class SymptomsReported : VolumeRule
{
    private const string DaysBack = "symptoms.days";

    public override string Id => "volume.symptoms";

    public override string Title => "Symptoms reported";

    public override ImmutableArray<string> SourceKeys { get; } = ["esc-2021-symptoms", "howie-esquivel-2019", "clinic-default"];

    /// <summary>One more symptom of the group is news.</summary>
    public override decimal? MaterialStep => 1;

    public override IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol)
    {
        var back = protocol[DaysBack];
        if (!back.IsOn || !(picture.WeighsAtHome || picture.Symptoms.Length > 0))
        {
            return [];
        }

        var reports = RecentSigns.Reports(picture, protocol);
        return reports.IsEmpty
            ? [CannotTell($"no symptom report in the last {Wording.Days((int)back.Value)}")]
            : SymptomGroup.All.Select(group => Read(group, reports, picture, protocol));
    }

    private Finding Read(SymptomGroup group, ImmutableArray<SymptomReport> reports, PatientPicture picture, ClinicProtocol protocol)
    {
        var told = reports.Where(report => group.Of(report.Symptoms) != Symptoms.None).ToList();
        if (told.Count == 0)
        {
            return Answer(Outcome.Clear) with { Subject = group.Name };
        }

        var symptoms = told.Aggregate(Symptoms.None, (all, report) => all | group.Of(report.Symptoms));
        var last = told[^1];
        var on = last.Day == picture.AsOf ? "" : $", reported {Wording.ShortDay(last.Day)}";
        return Answer(Outcome.Fires) with
        {
            Subject = group.Name,
            Urgency = group.UrgencyOf(symptoms),
            Statement = Wording.Sentence(SymptomWords.List(symptoms)) + on,
            Limit = $"reported within the last {Wording.Days((int)protocol[DaysBack].Value)}",
            Caution = (symptoms & SymptomGroup.Emergencies) == 0
                ? ""
                : "Chest pain and fainting may be an emergency: emergency services and the local protocol come before this list.",
            Magnitude = BitOperations.PopCount((uint)symptoms),
            Evidence = [.. told.Select(report => Told(group, report, report == last)), .. WeightBeside(picture, protocol)],
        };
    }

    private static Evidence Told(SymptomGroup group, SymptomReport report, bool isLast) =>
        new("Reported", SymptomWords.List(group.Of(report.Symptoms)), report.Day, RaisedIt: isLast);

    private static IEnumerable<Evidence> WeightBeside(PatientPicture picture, ClinicProtocol protocol)
    {
        var summary = WeightSummary.Of(picture);
        WeightChange?[] changes = [summary.Gain(3), summary.Gain(7)];
        return changes
            .OfType<WeightChange>()
            .Select(change => new Evidence(
                $"Weight against the lowest of the {Wording.Days(change.Days)} before",
                $"{Wording.Change(change.Difference, protocol.WeightUnit)} {Wording.Symbol(protocol.WeightUnit)}",
                change.Latest.Day,
                change.Latest.Id));
    }
}
