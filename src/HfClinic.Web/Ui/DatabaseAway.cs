using System.Data.Common;
using System.Net.Sockets;

namespace HfClinic.Web.Ui;

/// <summary>Tells a database that does not answer from a fault in the program.</summary>
public static class DatabaseAway
{
    public const string WhileReading = "The database does not answer. Nothing is lost; try again in a moment.";

    public const string WhileSaving = "The database does not answer. Nothing was saved; what you typed is still here. Try again in a moment.";

    public static bool Is(Exception failure)
    {
        for (var cause = failure; cause is not null; cause = cause.InnerException)
        {
            if (cause is DbException or SocketException or TimeoutException)
            {
                return true;
            }
        }

        return false;
    }
}
