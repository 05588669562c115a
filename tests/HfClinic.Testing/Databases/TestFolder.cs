namespace HfClinic.Testing.Databases;

/// <summary>
/// A short-named temporary folder owned by this process. It is removed when the process ends; if the process is killed,
/// the next run finds its lock released and removes it then.
/// </summary>
public sealed class TestFolder
{
    // A Unix socket path may have at most 107 bytes (man 7 unix), so the folder stands directly under /tmp whatever TMPDIR says.
    private const string Parent = "/tmp";
    private const string Prefix = "hfct-";
    private const string LockEnding = ".lock";

    private readonly FileStream _lock;

    private TestFolder(string path, FileStream @lock)
    {
        Path = path;
        _lock = @lock;
        AppDomain.CurrentDomain.ProcessExit += (_, _) => Remove();
    }

    public string Path { get; }

    /// <summary>Called before the folder is removed: whoever works in it stops here.</summary>
    public Action? BeforeRemoval { get; set; }

    public static TestFolder Create(string purpose)
    {
        RemoveAbandoned();
        var path = $"{Parent}/{Prefix}{purpose}-{Guid.NewGuid().ToString("N")[..8]}";
        var @lock = new FileStream(path + LockEnding, FileMode.CreateNew, FileAccess.ReadWrite, FileShare.None);
        Directory.CreateDirectory(path);
        if (!OperatingSystem.IsWindows())
        {
            // Another account (postgres, when the tests run as root) must be able to reach what is inside.
            File.SetUnixFileMode(path, (UnixFileMode)0b111_101_101);
        }

        return new TestFolder(path, @lock);
    }

    /// <summary>Removes the folders of test processes that are gone: nobody holds their lock any more.</summary>
    public static void RemoveAbandoned()
    {
        foreach (var lockFile in Directory.EnumerateFiles(Parent, $"{Prefix}*{LockEnding}"))
        {
            // A lock this young may be another process between creating and locking it.
            if (File.GetCreationTimeUtc(lockFile) > TimeProvider.System.GetUtcNow().UtcDateTime.AddSeconds(-10) || !TryLock(lockFile, out var held))
            {
                continue;
            }

            using (held)
            {
                Delete(lockFile[..^LockEnding.Length], lockFile);
            }
        }
    }

    private void Remove()
    {
        BeforeRemoval?.Invoke();
        Delete(Path, Path + LockEnding);
        _lock.Dispose();
    }

    private static bool TryLock(string lockFile, out FileStream? held)
    {
        try
        {
            held = new FileStream(lockFile, FileMode.Open, FileAccess.ReadWrite, FileShare.None);
            return true;
        }
        catch (Exception problem) when (problem is IOException or UnauthorizedAccessException)
        {
            // Held by a living process, removed meanwhile, or another account's: not ours to remove.
            held = null;
            return false;
        }
    }

    private static void Delete(string folder, string lockFile)
    {
        if (Directory.Exists(folder))
        {
            Directory.Delete(folder, recursive: true);
        }

        File.Delete(lockFile);
    }
}
