namespace HfClinic.Clinical.Flags;

/// <summary>Where a flag stands.</summary>
public enum FlagState
{
    /// <summary>Waits for a person.</summary>
    Open = 1,

    /// <summary>A person has settled it; their answer stands for a time.</summary>
    Answered = 2,

    /// <summary>The data have cleared it.</summary>
    Cleared = 3,
}
