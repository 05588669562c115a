using HfClinic.Clinical.Values;
using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Readings;
using HfClinic.Records.Settings;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;

namespace HfClinic.Web.DailyWeights;

/// <summary>Takes called-in readings at typing speed. On refusal everything typed stays.</summary>
public sealed partial class QuickLine(RecordReadings record, ClinicClock clock, ILogger<QuickLine> log)
{
    private static readonly string[] fields =
    [
        "", nameof(WhoField), nameof(CalledInLine.Weight), nameof(CalledInLine.Pressure), nameof(TakenReadings.SystolicPressure),
        nameof(TakenReadings.DiastolicPressure), nameof(CalledInLine.Pulse), nameof(TakenReadings.HeartRate), nameof(CalledInLine.Symptoms),
    ];

    private readonly Saving saving = new(log);
    private CalledInLine line = new();
    private QuickRecorded? result;
    private WhoField who = null!;

    [Parameter, EditorRequired]
    public Actor Actor { get; set; } = null!;

    [CascadingParameter]
    public WeightUnit Unit { get; set; }

    // Bound properties: a bound field is never overwritten by an answer that comes later than the next key.
    private string Weight { get => line.Weight; set => Type(line with { Weight = value ?? "" }); }

    private string Pressure { get => line.Pressure; set => Type(line with { Pressure = value ?? "" }); }

    private string Pulse { get => line.Pulse; set => Type(line with { Pulse = value ?? "" }); }

    private string Symptoms { get => line.Symptoms; set => Type(line with { Symptoms = value ?? "" }); }

    private string? WeightEcho => CalledInWeight.Read(line.Weight, Unit, nameof(line.Weight), out _)?.Words;

    private CalledInSymptoms Told => CalledInSymptoms.Read(line.Symptoms);

    private string SymptomEcho => Told.Symptoms != Clinical.Values.Symptoms.None ? SymptomWords.List(Told.Symptoms) : Told.AskedNone ? "asked, none told" : "";

    private string Unknown => string.Join(", ", Told.Unknown.Select(word => $"“{word}”"));

    private bool OffersNote => saving.For(nameof(line.Symptoms)) is not null && Told is { Unknown.Count: > 0, Symptoms: not Clinical.Values.Symptoms.None, Unclear.Count: 0 };

    private string? For(params string[] names) => names.Select(saving.For).FirstOrDefault(words => words is not null);

    private string? Invalid(params string[] names) => For(names) is null ? null : "true";

    /// <summary>A changed word is a new word: whether unknown ones are kept is asked again.</summary>
    private void Type(CalledInLine typed) => line = typed with { KeepsUnknownWords = typed.KeepsUnknownWords && typed.Symptoms == line.Symptoms };

    private Task KeepAsNoteAsync()
    {
        line = line with { KeepsUnknownWords = true };
        return AddAsync();
    }

    private async Task AddAsync()
    {
        QuickRecorded? recorded = null;
        if (await saving.RunAsync(async () => recorded = await RecordAsync()))
        {
            (result, line) = (recorded, new());
            await who.StartOverAsync();
        }
    }

    private async Task<QuickRecorded> RecordAsync()
    {
        List<Problem> problems = [];
        var person = await who.FindAsync(problems);
        TakenReadings? taken = null;
        try
        {
            taken = line.Read(Unit, clock.ToLocal(clock.Now));
        }
        catch (RefusedException refused)
        {
            problems.AddRange(refused.Problems);
        }

        return person is null || taken is null
            ? throw new RefusedException(problems)
            : QuickRecorded.Of(person, taken, await record.RunAsync(Actor, person.Id, taken), Unit);
    }
}
