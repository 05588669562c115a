using HfClinic.Clinical.Values;

namespace HfClinic.Web.Ui;

/// <summary>A person in a few words.</summary>
public static class PersonWords
{
    /// <summary>"78 years, woman", or what of it is known.</summary>
    public static string AgeAndSex(DateOnly? birthDate, Sex sex, DateOnly today)
    {
        var words = new List<string>();
        if (birthDate is { } born)
        {
            words.Add(Years(born, today));
        }

        if (sex != Sex.NotRecorded)
        {
            words.Add(sex == Sex.Female ? "woman" : "man");
        }

        return words.Count == 0 ? Wording.Nothing : string.Join(", ", words);
    }

    /// <summary>"78 years"; "age not known" without a birth date.</summary>
    public static string AgeOnly(DateOnly? birthDate, DateOnly today) => birthDate is { } born ? Years(born, today) : "age not known";

    /// <summary>Completed years of life; a person born on 29 Feb completes one on 28 Feb in other years.</summary>
    public static int Age(DateOnly born, DateOnly today)
    {
        var years = today.Year - born.Year;
        return born.AddYears(years) > today ? years - 1 : years;
    }

    public static string Of(Sex sex) => sex switch
    {
        Sex.Female => "woman",
        Sex.Male => "man",
        _ => "not recorded",
    };

    /// <summary>The New York Heart Association class as it is written: "III".</summary>
    public static string Nyha(int nyhaClass) => nyhaClass switch
    {
        1 => "I",
        2 => "II",
        3 => "III",
        _ => "IV",
    };

    private static string Years(DateOnly born, DateOnly today) => Wording.Count(Age(born, today), "year", "years");
}
