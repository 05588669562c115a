namespace HfClinic.Clinical.Sources;

/// <summary>One publication or decision that a rule or a figure rests on.</summary>
/// <param name="Key">Stable key: "esc-2021-self-care".</param>
/// <param name="Title">As shown beside a flag.</param>
/// <param name="Year">Year of publication; null for an undated leaflet or page.</param>
/// <param name="Where">Journal, volume and page, or publisher; enough to find it again.</param>
/// <param name="Standing">How it was read.</param>
public sealed record Source(string Key, string Title, int? Year, string Where, Standing Standing);
