using System.Collections.Immutable;

namespace HfClinic.SeedDemo.Stories;

/// <summary>All stories.</summary>
internal static class StoryBook
{
    public static ImmutableArray<Story> All { get; } =
    [
        SuddenGain.Story,
        GainInPounds.Story,
        SlowGain.Story,
        GainAcrossGap.Story,
        AfterDischarge.Story,
        NightBreathlessness.Story,
        OwnLimit.Story,
        NewScale.Story,
        AnotherPerson.Story,
        AnotherPerson.OtherPerson,
        PoundsAsKilograms.Story,
        SwappedDigits.Story,
        CorrectedEntry.Story,
        StruckOutEntry.Story,
        OverDiuresis.Story,
        LossWithoutSigns.Story,
        GrowingBody.Story,
        .. Silent.Stories,
        SilentUnderCloseWatch.Story,
        SymptomsAlone.Story,
        SymptomsOnExertion.Story,
        Fainted.Story,
        NotReached.Story,
        PhonedAndSettled.Story,
        PutOffUntilVisit.Story,
        OpenQuestion.Story,
        UnreadAnswer.Story,
        .. SettledTheSameDay.Stories,
    ];
}
