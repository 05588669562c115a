using Microsoft.Data.Sqlite;

namespace HfClinic.Testing.Databases;

/// <summary>SQLite test databases: a filled template file, copied for each test.</summary>
public sealed class SqliteFiles
{
    private readonly string _folder;
    private readonly TemplateOnce _templates;
    private int _count;

    public SqliteFiles(string folder)
    {
        _folder = folder;
        _templates = new TemplateOnce(FillAsync);
    }

    public async Task<TestDatabase> CreateAsync(DatabaseTemplate template)
    {
        var source = await _templates.PrepareAsync(template);
        var file = Path.Combine(_folder, $"test{Interlocked.Increment(ref _count)}.db");
        File.Copy(source, file);
        var connectionString = $"Data Source={file}";
        return new TestDatabase(DatabaseEngine.Sqlite, connectionString, () => RemoveAsync(file, connectionString));
    }

    private async Task<string> FillAsync(DatabaseTemplate template)
    {
        var file = Path.Combine(_folder, $"template_{template.Name}.db");
        await File.WriteAllBytesAsync(file, []);
        await template.Fill(DatabaseEngine.Sqlite, $"Data Source={file};Pooling=False");
        if (new FileInfo(file + "-wal") is { Exists: true, Length: > 0 })
        {
            throw new InvalidOperationException(
                $"The template '{template.Name}' left a connection open: its last changes are still in {file}-wal and would not be copied.");
        }

        return file;
    }

    private static Task RemoveAsync(string file, string connectionString)
    {
        using (var connection = new SqliteConnection(connectionString))
        {
            SqliteConnection.ClearPool(connection);
        }

        foreach (var part in (string[])[file, file + "-wal", file + "-shm"])
        {
            File.Delete(part);
        }

        return Task.CompletedTask;
    }
}
