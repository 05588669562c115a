using System.Globalization;

namespace HfClinic.Web.Hosting;

/// <summary>What the program is started for.</summary>
public enum StartCommand
{
    /// <summary>The clinic on the configured database.</summary>
    Serve,

    /// <summary>The invented demo clinic on a database of its own.</summary>
    Demo,

    /// <summary>Checks the chain of the record of access and ends.</summary>
    VerifyAudit,
}

/// <summary>The command line: a command of ours, then anything the web host understands, such as <c>--urls</c>.</summary>
public sealed record StartOptions(StartCommand Command, bool Fresh, int DemoPatients, string[] HostArguments, string? Fault = null)
{
    public const int UsualDemoPatients = 240;
    private const int MostDemoPatients = 100_000;

    /// <summary>Reads the command line. A wrong word gives a <see cref="Fault"/> that says how to mend it.</summary>
    public static StartOptions Parse(string[] arguments)
    {
        StartCommand? command = null;
        var (fresh, patients) = (false, (int?)null);
        var host = new List<string>();
        for (var at = 0; at < arguments.Length; at++)
        {
            switch (arguments[at])
            {
                case "demo" or "verify-audit" or "--verify-audit" when command is not null:
                    return Wrong("One command at a time: demo or verify-audit.");
                case "demo":
                    command = StartCommand.Demo;
                    break;
                case "verify-audit" or "--verify-audit":
                    command = StartCommand.VerifyAudit;
                    break;
                case "--fresh":
                    fresh = true;
                    break;
                case "--patients":
                    if (++at >= arguments.Length || !int.TryParse(arguments[at], NumberStyles.None, CultureInfo.InvariantCulture, out var number)
                        || number is < 1 or > MostDemoPatients)
                    {
                        return Wrong($"--patients needs a number from 1 to {MostDemoPatients}, for example: demo --patients 1000");
                    }

                    patients = number;
                    break;
                case "--urls" when at + 1 >= arguments.Length:
                    return Wrong("--urls needs an address to listen on, for example: --urls http://127.0.0.1:8080");
                default:
                    if (!arguments[at].StartsWith('-') && !IsValue(arguments, at))
                    {
                        return Wrong($"'{arguments[at]}' is not a command. Use: demo [--fresh] [--patients N], verify-audit, or nothing to run the clinic.");
                    }

                    host.Add(arguments[at]);
                    break;
            }
        }

        return command != StartCommand.Demo && fresh
            ? Wrong("--fresh starts the demo clinic over and goes with demo only: demo --fresh")
            : command != StartCommand.Demo && patients is not null
            ? Wrong("--patients is the size of the demo clinic and goes with demo only: demo --patients 1000")
            : new(command ?? StartCommand.Serve, fresh, patients ?? UsualDemoPatients, [.. host]);

        // The word after one of the web host's settings, such as --urls http://127.0.0.1:8080, belongs to it.
        static bool IsValue(string[] arguments, int at) => at > 0 && arguments[at - 1].StartsWith("--", StringComparison.Ordinal)
            && !arguments[at - 1].Contains('=') && arguments[at - 1] is not ("--fresh" or "--verify-audit" or "--patients");

        static StartOptions Wrong(string fault) => new(StartCommand.Serve, false, UsualDemoPatients, [], fault);
    }
}

/// <summary>The program cannot start as asked; the message says why and how to mend it.</summary>
public sealed class CannotStartException(string message) : Exception(message);
