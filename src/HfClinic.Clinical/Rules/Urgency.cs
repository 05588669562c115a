namespace HfClinic.Clinical.Rules;

/// <summary>How soon a person should look. Higher is sooner.</summary>
public enum Urgency
{
    ForInformation = 0,
    NextVisit = 1,
    ThisWeek = 2,
    Today = 3,
}
