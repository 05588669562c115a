using System.Collections.Immutable;
using System.Text.Encodings.Web;
using System.Text.Json;
using HfClinic.Clinical.Rules;

namespace HfClinic.Records.Flags;

/// <summary>Evidence as it is stored with a flag: JSON that a later program still reads.</summary>
public static class EvidenceText
{
    private static readonly JsonSerializerOptions Plain = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping };

    public static string Write(ImmutableArray<Evidence> evidence) => JsonSerializer.Serialize(evidence, Plain);

    public static ImmutableArray<Evidence> Read(string json) => JsonSerializer.Deserialize<ImmutableArray<Evidence>>(json, Plain);
}
