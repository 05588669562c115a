using System.Data.Common;
using System.Net.Sockets;
using Microsoft.Data.Sqlite;

namespace HfClinic.Web.Ui;

/// <summary>Tells a database that does not answer from a fault in the program.</summary>
public static class DatabaseAway
{
    public const string WhileReading = "The database does not answer. Nothing is lost; try again in a moment.";

    public const string WhileSaving = "The database does not answer. Nothing was saved; what you typed is still here. Try again in a moment.";

    private const int SqliteConstraint = 19;

    /// <summary>Whether the failure, or one inside it, says that the database is away, busy or gone.</summary>
    /// <remarks>A row the database refuses (SQLSTATE class 23) is a fault in the program: it is not hidden behind "try again".</remarks>
    public static bool Is(Exception failure)
    {
        for (var cause = failure; cause is not null; cause = cause.InnerException)
        {
            switch (cause)
            {
                case SqliteException { SqliteErrorCode: SqliteConstraint }:
                case DbException { SqlState: ['2', '3', ..] }:
                    return false;
                case DbException or SocketException or TimeoutException:
                    return true;
            }
        }

        return false;
    }
}
