namespace HfClinic.Testing.Databases;

/// <summary>Writes the content of a template database, given its engine and connection string (unpooled).</summary>
public delegate Task FillDatabase(DatabaseEngine engine, string connectionString);

/// <summary>
/// A starting content for tests: filled once per engine and test run, then copied for each test.
/// The name identifies the content; lower-case letters, digits and underscores.
/// </summary>
public sealed record DatabaseTemplate(string Name, FillDatabase Fill)
{
    /// <summary>No tables at all: what a first start of the program finds.</summary>
    public static DatabaseTemplate Empty { get; } = new("empty", (_, _) => Task.CompletedTask);
}
