namespace HfClinic.Clinical.Rules.Titration;

/// <summary>Where one class of medicine stands.</summary>
public enum TitrationState
{
    /// <summary>The phenotype does not call for it, or its dose has no target.</summary>
    NotIndicated = 1,

    /// <summary>Not given, for a reason on record.</summary>
    NotGiven = 2,

    AtTarget = 3,

    /// <summary>Below target with a reason recorded by a prescriber that still stands.</summary>
    LimitRecorded = 4,

    /// <summary>Below target, told as information only.</summary>
    Information = 5,

    /// <summary>Below target or absent, and the time from which it is shown has not come.</summary>
    NotYetDue = 6,

    /// <summary>Below target or absent, and something in the record says no step is expected now.</summary>
    Held = 7,

    /// <summary>Below target or absent, and a value is missing or too old to say more.</summary>
    CheckDue = 8,

    /// <summary>Below target, and nothing in the record argues against asking.</summary>
    Due = 9,

    /// <summary>A pillar is absent, and nothing in the record argues against asking.</summary>
    NotCovered = 10,

    /// <summary>What is needed to judge at all is missing.</summary>
    CannotTell = 11,
}
