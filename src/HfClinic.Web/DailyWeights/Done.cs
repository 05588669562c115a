namespace HfClinic.Web.DailyWeights;

/// <summary>What was just done for a patient.</summary>
/// <param name="Said">In words for the status line: "Call recorded for Elsmere, Oda; 2 flags settled."</param>
/// <param name="NothingLeft">Every open flag is settled or put off.</param>
public sealed record Done(long PatientId, string Said, bool NothingLeft);
