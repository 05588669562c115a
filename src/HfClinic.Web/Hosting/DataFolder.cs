namespace HfClinic.Web.Hosting;

/// <summary>The folder for what the program keeps on this machine: the SQLite files and files being read in.</summary>
public sealed class DataFolder
{
    /// <summary>The environment variable, or setting, that names it.</summary>
    public const string Setting = "HFCLINIC_DATA";

    /// <param name="configuration">Looked up for <see cref="Setting"/>; else the user's own data folder.</param>
    public DataFolder(IConfiguration configuration)
    {
        Path = configuration[Setting] is { Length: > 0 } given
            ? System.IO.Path.GetFullPath(given)
            : System.IO.Path.Combine(
                Environment.GetFolderPath(Environment.SpecialFolder.LocalApplicationData, Environment.SpecialFolderOption.DoNotVerify) is { Length: > 0 } own
                    ? own
                    : AppContext.BaseDirectory,
                "hfclinic");
        Directory.CreateDirectory(Path);
    }

    public string Path { get; }

    public string DemoFile => System.IO.Path.Combine(Path, "demo.db");

    public string ClinicFile => System.IO.Path.Combine(Path, "clinic.db");

    /// <summary>Removes the demo clinic's SQLite file with its journal.</summary>
    public void RemoveDemo()
    {
        foreach (var file in new[] { DemoFile, DemoFile + "-wal", DemoFile + "-shm" })
        {
            File.Delete(file);
        }
    }
}
