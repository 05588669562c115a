namespace HfClinic.Records.Exchange;

/// <summary>How far a reading-in is.</summary>
/// <param name="BytesRead">Of the file.</param>
/// <param name="Lines">Lines taken so far.</param>
/// <param name="Reassessed">Patients reassessed so far, after the last line.</param>
/// <param name="ToReassess">Patients to be reassessed; 0 until the last line is in.</param>
public sealed record ImportProgress(long ImportId, long BytesRead, long Bytes, int Lines, int Reassessed = 0, int ToReassess = 0)
{
    /// <summary>Whether the lines are in and the patients are being reassessed.</summary>
    public bool IsReassessing => ToReassess > 0;

    /// <summary>0 to 100 of the part under way.</summary>
    public double Percent => IsReassessing ? 100.0 * Reassessed / ToReassess : Bytes == 0 ? 0 : 100.0 * BytesRead / Bytes;
}
