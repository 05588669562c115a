using HfClinic.Clinical.Medicines;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules.Titration;

/// <summary>A prescriber's reasons for stopping short of target, and how long they stand.</summary>
internal static class RecordedLimits
{
    /// <summary>The latest limit of the class that stands on the picture's day.</summary>
    public static TitrationLimit? Standing(TitrationClass titration, PatientPicture picture, ClinicProtocol protocol) =>
        Of(titration, picture).LastOrDefault(limit => !IsOver(limit, picture.AsOf, protocol));

    /// <summary>The latest limit of the class when it has run out by time and no other stands.</summary>
    public static TitrationLimit? Expired(TitrationClass titration, PatientPicture picture, ClinicProtocol protocol) =>
        Standing(titration, picture, protocol) is null && Of(titration, picture).LastOrDefault() is { } last && !(last.EndedOn <= picture.AsOf)
            ? last
            : null;

    /// <summary>The first day on which the latest limit no longer stood; null when none has ended.</summary>
    public static DateOnly? LastCleared(TitrationClass titration, PatientPicture picture, ClinicProtocol protocol) => Of(titration, picture)
        .Where(limit => IsOver(limit, picture.AsOf, protocol))
        .Select(limit => (DateOnly?)Min(limit.EndedOn, LastDay(limit, protocol).AddDays(1)))
        .Max();

    /// <summary>The last day the limit stands by time.</summary>
    public static DateOnly LastDay(TitrationLimit limit, ClinicProtocol protocol) =>
        limit.Expires ?? limit.On.AddDays((int)protocol["titration-limit.days"].Value);

    private static IEnumerable<TitrationLimit> Of(TitrationClass titration, PatientPicture picture) =>
        picture.TitrationLimits.Where(limit => limit.Class == titration && limit.On <= picture.AsOf);

    private static bool IsOver(TitrationLimit limit, DateOnly day, ClinicProtocol protocol) =>
        limit.EndedOn <= day || day > LastDay(limit, protocol);

    private static DateOnly Min(DateOnly? one, DateOnly other) => one < other ? one.Value : other;
}
