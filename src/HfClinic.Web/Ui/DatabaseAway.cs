using System.Data.Common;
using System.Net.Sockets;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore.Storage;

namespace HfClinic.Web.Ui;

/// <summary>Tells a database that does not answer from a fault of the program.</summary>
public static class DatabaseAway
{
    public const string WhileReading = "The database does not answer. Nothing is lost; try again in a moment. If it goes on, tell the person who runs this program.";

    public const string WhileSaving = "The database does not answer, so this is not confirmed as saved. What you typed is still here: try again in a moment, and look whether it is there already.";

    private const int SqliteConstraint = 19;

    /// <summary>Whether the exception, or one inside it, says that the database is away, busy or gone.</summary>
    /// <remarks>A row the database refuses is not such a case: it is a fault, and is not hidden behind "try again".</remarks>
    public static bool Says(Exception? exception)
    {
        for (; exception is not null; exception = exception.InnerException)
        {
            switch (exception)
            {
                case SqliteException { SqliteErrorCode: SqliteConstraint }:
                case DbException { SqlState: ['2', '3', ..] }:
                    return false;
                case DbException or TimeoutException or SocketException or RetryLimitExceededException:
                    return true;
            }
        }

        return false;
    }
}
