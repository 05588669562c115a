using HfClinic.Clinical.Values;

namespace HfClinic.Web.Ui;

/// <summary>Who a person is, in few words.</summary>
public static class PersonWords
{
    /// <summary>"78 years"; "age not known" without a birth date.</summary>
    public static string Age(DateOnly? birthDate, DateOnly today)
    {
        if (birthDate is not { } born)
        {
            return "age not known";
        }

        var years = today.Year - born.Year;
        return Wording.Count(born > today.AddYears(-years) ? years - 1 : years, "year", "years");
    }

    /// <summary>"woman", "man"; empty when not on record.</summary>
    public static string Of(Sex sex) => sex switch
    {
        Sex.Female => "woman",
        Sex.Male => "man",
        _ => "",
    };

    /// <summary>The New York Heart Association class as it is written: "III".</summary>
    public static string Nyha(int nyhaClass) => nyhaClass switch
    {
        1 => "I",
        2 => "II",
        3 => "III",
        _ => "IV",
    };
}
