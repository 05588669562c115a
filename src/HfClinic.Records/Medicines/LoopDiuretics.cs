namespace HfClinic.Records.Medicines;

/// <summary>The loop diuretics, by generic name (WHO ATC group C03C).</summary>
public static class LoopDiuretics
{
    public static readonly IReadOnlyList<string> Names = ["furosemide", "bumetanide", "torasemide"];

    public static bool Includes(string medicine) => Names.Contains(medicine);
}
