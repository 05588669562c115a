using System.Collections.Immutable;
using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Where one class of medicine of one patient stands, and why.</summary>
public sealed record ClassTitration
{
    public required TitrationClass Class { get; init; }

    public required TitrationState State { get; init; }

    /// <summary>Why it is, or is not, on the list: one sentence without full stop.</summary>
    public required string Sentence { get; init; }

    /// <summary>What is taken of the class; null when nothing that counts is.</summary>
    public TakenMedicine? Taken { get; init; }

    /// <summary>Percent of the target's total daily dose, unrounded; null when there is no target dose.</summary>
    public decimal? Percent { get; init; }

    /// <summary>The target in words: "10 mg daily".</summary>
    public string Target { get; init; } = "";

    /// <summary>Days since the last change of dose, or since the pillar has been absent.</summary>
    public int? DaysUnchanged { get; init; }

    /// <summary>The first day on which a step could come (the shortest published interval).</summary>
    public DateOnly? StepFrom { get; init; }

    /// <summary>The day from which the gap is shown; set whenever the dose is below target or the pillar absent.</summary>
    public DateOnly? DueSince { get; init; }

    /// <summary>The day from which it is overdue; a hold that has cleared starts the count anew.</summary>
    public DateOnly? OverdueFrom { get; init; }

    /// <summary>Whether it is due and the overdue day has come.</summary>
    public bool IsOverdue { get; init; }

    /// <summary>What must be checked first: "systolic pressure of the last 30 days".</summary>
    public ImmutableArray<string> Missing { get; init; } = [];

    /// <summary>Everything that holds it, gravest first.</summary>
    public ImmutableArray<HoldReason> Holds { get; init; } = [];

    /// <summary>The prescriber's reason that still stands, if any.</summary>
    public TitrationLimit? Limit { get; init; }

    public ImmutableArray<TitrationNote> Notes { get; init; } = [];

    /// <summary>
    /// Whether a gap would be shown but for a safety flag that is open or a review or same-day limit that is met: set aside, not cleared.
    /// </summary>
    public bool IsSetAside { get; init; }

    /// <summary>Whether it counts one level lower: beta blocker in atrial fibrillation.</summary>
    public bool OneLevelLower { get; init; }

    /// <summary>Keys into the source table for target and limits.</summary>
    public ImmutableArray<string> SourceKeys { get; init; } = [];

    /// <summary>Below target or absent where it is looked for, whatever holds it.</summary>
    public bool IsShort => State is TitrationState.NotYetDue or TitrationState.Held or TitrationState.CheckDue or TitrationState.Due or TitrationState.NotCovered;

    internal bool Has(TitrationNoteKind kind) => Notes.Any(note => note.Kind == kind);
}
