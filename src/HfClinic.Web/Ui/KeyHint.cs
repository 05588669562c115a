namespace HfClinic.Web.Ui;

/// <summary>One line of the key sheet.</summary>
/// <param name="Key">As printed on the key: "C", "Enter", "/".</param>
/// <param name="Does">What it does, in words.</param>
public sealed record KeyHint(string Key, string Does);
