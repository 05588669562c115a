using System.Diagnostics;
using Npgsql;

namespace HfClinic.Testing.Databases;

/// <summary>
/// A private PostgreSQL server in a temporary folder, reached through a Unix socket there: no port, no password, nothing
/// shared with a server the machine may already run. Durability is off, for speed.
/// </summary>
public sealed class PostgresCluster
{
    private readonly string _binaries = PostgresBinaries.Find();
    private readonly string _folder;
    private readonly string _data;
    private readonly TemplateOnce _templates;
    private readonly TaskCompletionSource _ended = new();
    private readonly List<string> _log = [];
    private int _count;

    private PostgresCluster(string folder)
    {
        _folder = folder;
        _data = Path.Combine(folder, "data");
        _templates = new TemplateOnce(FillAsync);
    }

    public static async Task<PostgresCluster> StartAsync()
    {
        var home = TestFolder.Create("pg");
        var folder = Path.Combine(home.Path, "s");
        Directory.CreateDirectory(folder);
        var cluster = new PostgresCluster(folder);
        cluster.Initialise();
        home.BeforeRemoval = cluster.Stop;
        cluster.Serve();
        await cluster.WaitUntilReadyAsync();
        return cluster;
    }

    public async Task<TestDatabase> CreateAsync(DatabaseTemplate template)
    {
        var source = await _templates.PrepareAsync(template);
        var name = $"test{Interlocked.Increment(ref _count)}";
        await ExecuteAsync($"create database {name} template {source} strategy file_copy");
        var connectionString = ConnectionString(name) + ";Maximum Pool Size=20";
        return new TestDatabase(DatabaseEngine.PostgreSql, connectionString, () => RemoveAsync(name, connectionString));
    }

    private void Initialise()
    {
        if (Environment.IsPrivilegedProcess)
        {
            PostgresBinaries.Run(new ProcessStartInfo("chown", ["postgres:", _folder]) { RedirectStandardOutput = true, RedirectStandardError = true });
        }

        PostgresBinaries.Run(PostgresBinaries.Command(
            Path.Combine(_binaries, "initdb"),
            ["-D", _data, "-U", "postgres", "-A", "trust", "--no-sync", "-E", "UTF8", "--locale=C.UTF-8"]));
    }

    /// <summary>Runs the server on a thread of its own: the kernel ties the server's life to the thread that started it.</summary>
    private void Serve()
    {
        var command = PostgresBinaries.Command(
            Path.Combine(_binaries, "postgres"),
            ["-D", _data, "-k", _folder, "-c", "listen_addresses=", "-c", "unix_socket_permissions=0777", "-c", "max_connections=300",
             "-c", "fsync=off", "-c", "synchronous_commit=off", "-c", "full_page_writes=off"],
            dieWithParent: true);
        new Thread(() =>
        {
            using var server = new Process { StartInfo = command };
            server.OutputDataReceived += (_, line) => Keep(line.Data);
            server.ErrorDataReceived += (_, line) => Keep(line.Data);
            server.Start();
            server.BeginOutputReadLine();
            server.BeginErrorReadLine();
            server.WaitForExit();
            _ended.SetResult();
        })
        { IsBackground = true, Name = "PostgreSQL server" }.Start();
    }

    private async Task WaitUntilReadyAsync()
    {
        var patience = Stopwatch.StartNew();
        while (true)
        {
            try
            {
                await ExecuteAsync("select 1");
                return;
            }
            catch (NpgsqlException) when (!_ended.Task.IsCompleted && patience.Elapsed < TimeSpan.FromSeconds(30))
            {
                await Task.Delay(50);
            }
            catch (NpgsqlException problem)
            {
                throw new InvalidOperationException($"The test PostgreSQL did not start. Its log: {Log()}", problem);
            }
        }
    }

    private async Task<string> FillAsync(DatabaseTemplate template)
    {
        var name = $"template_{template.Name}";
        await ExecuteAsync($"create database {name}");
        await template.Fill(DatabaseEngine.PostgreSql, ConnectionString(name) + ";Pooling=false");
        return name;
    }

    private async Task RemoveAsync(string name, string connectionString)
    {
        await using (var connection = new NpgsqlConnection(connectionString))
        {
            NpgsqlConnection.ClearPool(connection);
        }

        await ExecuteAsync($"drop database {name} with (force)");
    }

    private string ConnectionString(string database) => $"Host={_folder};Username=postgres;Database={database}";

    private async Task ExecuteAsync(string sql)
    {
        await using var connection = new NpgsqlConnection(ConnectionString("postgres") + ";Pooling=false");
        await connection.OpenAsync();
        await using var command = new NpgsqlCommand(sql, connection);
        await command.ExecuteNonQueryAsync();
    }

    private void Stop()
    {
        if (!_ended.Task.IsCompleted)
        {
            PostgresBinaries.Run(PostgresBinaries.Command(Path.Combine(_binaries, "pg_ctl"), ["-D", _data, "-m", "immediate", "-w", "stop"]));
        }
    }

    private void Keep(string? line)
    {
        lock (_log)
        {
            _log.Add(line ?? "");
        }
    }

    private string Log()
    {
        lock (_log)
        {
            return string.Join('\n', _log);
        }
    }
}
