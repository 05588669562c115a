namespace HfClinic.Records.Contacts;

/// <summary>How the outcome of a contact is written.</summary>
public static class ContactWords
{
    public static string Of(ContactOutcome outcome) => outcome switch
    {
        ContactOutcome.Spoke => "spoken",
        ContactOutcome.SpokeWithRelative => "spoke with relative",
        ContactOutcome.LeftMessage => "left message",
        ContactOutcome.NoAnswer => "no answer",
        _ => "message sent",
    };
}
