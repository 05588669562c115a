using System.Text;
using HfClinic.Records.Access;
using HfClinic.Records.Exchange;
using HfClinic.Testing;

namespace HfClinic.Records.Tests.Exchange;

/// <summary>Reads files in as a nurse does: look, take the guessed mapping, run.</summary>
internal static class ImportBench
{
    /// <summary>The end of the last day of the intake files, in the clinic.</summary>
    public static DateTimeOffset EndOfIntake { get; } = new(2026, 3, 31, 22, 30, 0, TimeSpan.Zero);

    public static string Intake(string name) => Path.Combine(AppContext.BaseDirectory, "Files", "intake", name);

    public static Task<FileLook> LookAsync(string path) =>
        FileLook.TakeAsync(path, Path.GetFileName(path), new ImportLimits(), TestContext.Current.CancellationToken);

    public static async Task<ImportRun> ReadInAsync(
        TestClinic clinic, string path, Func<FileMapping, FileMapping>? correct = null,
        IProgress<ImportProgress>? progress = null, CancellationToken? cancellation = null)
    {
        var look = await LookAsync(path);
        var guess = FileMapping.Guess(look);
        var id = await clinic.Get<ImportFile>().RunAsync(
            TestClinic.As(ClinicRole.Nurse), look, correct is null ? guess : correct(guess), progress, cancellation ?? TestContext.Current.CancellationToken);
        return (await clinic.Get<ImportReports>().RunAsync(id, TestContext.Current.CancellationToken))!;
    }

    public static Task<IReadOnlyList<ImportLine>> LinesAsync(TestClinic clinic, ImportRun run) =>
        clinic.Get<ImportReports>().LinesAsync(run.Id, null, 0, int.MaxValue, TestContext.Current.CancellationToken);

    /// <summary>A file with this text, removed with the returned value.</summary>
    public static TemporaryFile Write(string text, Encoding? encoding = null) => new((encoding ?? new UTF8Encoding(false)).GetPreamble()
        .Concat((encoding ?? new UTF8Encoding(false)).GetBytes(text)).ToArray());

    internal sealed class TemporaryFile : IDisposable
    {
        public TemporaryFile(byte[] content) => File.WriteAllBytes(Path, content);

        public string Path { get; } = System.IO.Path.Combine(System.IO.Path.GetTempPath(), $"hfclinic-{Guid.NewGuid():N}.csv");

        public void Dispose() => File.Delete(Path);
    }
}
