using System.Globalization;
using System.Runtime.InteropServices;

namespace HfClinic.Benchmarks.Harness;

/// <summary>What a figure was measured on: without it a figure in milliseconds says nothing.</summary>
internal static class Machine
{
    private const string LoadFile = "/proc/loadavg";

    public static void Describe(TextWriter output)
    {
        var memory = GC.GetGCMemoryInfo().TotalAvailableMemoryBytes / (1024.0 * 1024 * 1024);
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"Date: {TimeProvider.System.GetUtcNow():dd MMM yyyy HH:mm} UTC"));
        output.WriteLine(string.Create(CultureInfo.InvariantCulture, $"Machine: {Environment.ProcessorCount} cores, {memory:0.0} GiB memory"));
        output.WriteLine($"System: {RuntimeInformation.OSDescription}, {RuntimeInformation.OSArchitecture}");
        output.WriteLine($"Runtime: {RuntimeInformation.FrameworkDescription}{(IsDebug ? ", DEBUG BUILD: the figures are worth nothing" : "")}");
        if (File.Exists(LoadFile))
        {
            output.WriteLine($"Load before the start (1, 5, 15 minutes): {string.Join(", ", File.ReadAllText(LoadFile).Split(' ')[..3])}");
        }
    }

    private static bool IsDebug =>
#if DEBUG
        true;
#else
        false;
#endif
}
