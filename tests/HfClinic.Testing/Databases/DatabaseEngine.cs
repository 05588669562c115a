namespace HfClinic.Testing.Databases;

/// <summary>The database engines the clinic runs on; every data test runs on both.</summary>
public enum DatabaseEngine
{
    Sqlite,
    PostgreSql,
}
