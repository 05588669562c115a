using System.Collections.Immutable;
using HfClinic.Clinical.Picture;

namespace HfClinic.Clinical.Rules;

/// <summary>One published criterion as code. A pure function of the picture and the protocol.</summary>
public interface IRule
{
    /// <summary>Stable identity, for example "volume.gain-3-days".</summary>
    string Id { get; }

    /// <summary>Raised whenever the rule's meaning changes.</summary>
    int Version { get; }

    /// <summary>The rule's name on screen.</summary>
    string Title { get; }

    /// <summary>Keys into the source table; at least one.</summary>
    ImmutableArray<string> SourceKeys { get; }

    /// <summary>
    /// Whether a flag of this rule stays until a person answers it (true), or is cleared by the data (false).
    /// </summary>
    bool Latches { get; }

    /// <summary>How much larger <see cref="Finding.Magnitude"/> must grow to count as news; null when it has none.</summary>
    decimal? MaterialStep { get; }

    /// <summary>Days after an answer during which the same finding joins it instead of being raised anew.</summary>
    int JoinDays { get; }

    /// <summary>Answers for each subject the rule applies to; empty when it does not apply to this patient.</summary>
    IEnumerable<Finding> Assess(PatientPicture picture, ClinicProtocol protocol);
}
