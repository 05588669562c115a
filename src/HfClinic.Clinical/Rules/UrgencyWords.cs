namespace HfClinic.Clinical.Rules;

/// <summary>How an urgency is written.</summary>
public static class UrgencyWords
{
    public static string Of(Urgency urgency) => urgency switch
    {
        Urgency.Today => "Today",
        Urgency.ThisWeek => "This week",
        Urgency.NextVisit => "Next visit",
        _ => "For information",
    };
}
