using System.Text.Json;
using System.Text.Json.Serialization;

namespace HfClinic.Records.Tests.Exchange;

/// <summary>What must come of the intake files, as computed apart from this program.</summary>
internal sealed class ExpectedIntake
{
    public required DateOnly AsOf { get; init; }

    public required Dictionary<string, int> Counts { get; init; }

    /// <summary>By line number; lines that simply go in are missing.</summary>
    public required Dictionary<int, string> Lines { get; init; }

    public required Dictionary<string, ExpectedPatient> Patients { get; init; }

    private static readonly JsonSerializerOptions Strict = new()
    {
        PropertyNamingPolicy = JsonNamingPolicy.SnakeCaseLower,
        UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
    };

    public static ExpectedIntake Read() =>
        JsonSerializer.Deserialize<ExpectedIntake>(File.ReadAllText(ImportBench.Intake("expected.json")), Strict)!;

    internal sealed class ExpectedPatient
    {
        [JsonPropertyName("gain_1d_g")]
        public int? Gain1 { get; init; }

        [JsonPropertyName("gain_3d_g")]
        public int? Gain3 { get; init; }

        [JsonPropertyName("gain_7d_g")]
        public int? Gain7 { get; init; }

        [JsonPropertyName("loss_1d_g")]
        public int? Loss1 { get; init; }

        [JsonPropertyName("loss_3d_g")]
        public int? Loss3 { get; init; }

        [JsonPropertyName("loss_7d_g")]
        public int? Loss7 { get; init; }

        [JsonPropertyName("gain_over_2kg_in_3d")]
        public bool GainOver2KgIn3Days { get; init; }

        [JsonPropertyName("gain_5lb_in_7d")]
        public bool Gain5LbIn7Days { get; init; }

        [JsonPropertyName("last_day")]
        public DateOnly? LastDay { get; init; }

        [JsonPropertyName("last_g")]
        public int? LastGrams { get; init; }

        [JsonPropertyName("silent_days")]
        public int? SilentDays { get; init; }

        [JsonPropertyName("no_weight_5d")]
        public bool NoWeight5Days { get; init; }
    }
}
