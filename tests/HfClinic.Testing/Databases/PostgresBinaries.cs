using System.Diagnostics;
using System.Globalization;

namespace HfClinic.Testing.Databases;

/// <summary>Finds and runs the PostgreSQL programs of this machine.</summary>
internal static class PostgresBinaries
{
    private const string DebianFolder = "/usr/lib/postgresql";
    private const int OldestMajor = 15;

    /// <summary>The folder of the newest installed server programs.</summary>
    /// <exception cref="InvalidOperationException">PostgreSQL is not installed.</exception>
    public static string Find()
    {
        var debian = Directory.Exists(DebianFolder)
            ? Directory.EnumerateDirectories(DebianFolder)
                .Select(folder => (Folder: folder, Major: int.TryParse(Path.GetFileName(folder), CultureInfo.InvariantCulture, out var major) ? major : 0))
                .Where(found => found.Major >= OldestMajor)
                .OrderByDescending(found => found.Major)
                .Select(found => Path.Combine(found.Folder, "bin"))
            : [];
        var onPath = (Environment.GetEnvironmentVariable("PATH") ?? "").Split(Path.PathSeparator, StringSplitOptions.RemoveEmptyEntries);
        return debian.Concat(onPath).FirstOrDefault(folder => File.Exists(Path.Combine(folder, "initdb")) && File.Exists(Path.Combine(folder, "postgres")))
            ?? throw new InvalidOperationException(
                $"PostgreSQL {OldestMajor} or later is needed for the tests and was not found in {DebianFolder}/*/bin or PATH. "
                + "On Debian: apt-get install postgresql (tests/run does this when run as root).");
    }

    /// <summary>
    /// PostgreSQL refuses to run as root, so root steps down to the account the package made. With <paramref name="dieWithParent"/>
    /// the kernel sends SIGQUIT (PostgreSQL: immediate shutdown) when the thread that started it ends, also by a kill.
    /// </summary>
    public static ProcessStartInfo Command(string program, IEnumerable<string> arguments, bool dieWithParent = false)
    {
        string[] stepDown = Environment.IsPrivilegedProcess
            ? ["--reuid=postgres", "--regid=postgres", "--init-groups", "--inh-caps=-all"]
            : [];
        string[] leash = dieWithParent ? ["--pdeathsig=QUIT"] : [];
        return new ProcessStartInfo("setpriv", [.. stepDown, .. leash, program, .. arguments])
        {
            WorkingDirectory = "/",
            RedirectStandardOutput = true,
            RedirectStandardError = true,
        };
    }

    /// <summary>Runs a command to its end.</summary>
    /// <exception cref="InvalidOperationException">It failed; the message holds what it printed.</exception>
    public static void Run(ProcessStartInfo command)
    {
        using var process = Process.Start(command) ?? throw new InvalidOperationException($"{command.FileName} did not start.");
        var errors = process.StandardError.ReadToEndAsync();
        var output = process.StandardOutput.ReadToEnd();
        process.WaitForExit();
        if (process.ExitCode != 0)
        {
            throw new InvalidOperationException(
                $"{command.FileName} {string.Join(' ', command.ArgumentList)} ended with {process.ExitCode}: {output}{errors.GetAwaiter().GetResult()}");
        }
    }
}
