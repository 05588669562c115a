namespace HfClinic.Clinical.Flags;

/// <summary>Where a flag stands.</summary>
public enum FlagState
{
    Open = 1,

    /// <summary>A person answered it.</summary>
    Answered = 2,

    /// <summary>The data cleared it.</summary>
    Cleared = 3,
}
