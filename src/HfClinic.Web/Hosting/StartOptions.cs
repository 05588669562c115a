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
        var (command, fresh, patients) = (StartCommand.Serve, false, UsualDemoPatients);
        var host = new List<string>();
        for (var at = 0; at < arguments.Length; at++)
        {
            switch (arguments[at])
            {
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
                    if (++at >= arguments.Length || !int.TryParse(arguments[at], out patients) || patients is < 1 or > MostDemoPatients)
                    {
                        return Wrong($"--patients needs a number from 1 to {MostDemoPatients}, for example: demo --patients 1000");
                    }

                    break;
                default:
                    if (!arguments[at].StartsWith('-') && (at == 0 || !arguments[at - 1].StartsWith("--", StringComparison.Ordinal)))
                    {
                        return Wrong($"'{arguments[at]}' is not a command. Use: demo [--fresh] [--patients N], verify-audit, or nothing to run the clinic.");
                    }

                    host.Add(arguments[at]);
                    break;
            }
        }

        return fresh && command != StartCommand.Demo
            ? Wrong("--fresh starts the demo clinic over and goes with demo only: demo --fresh")
            : new(command, fresh, patients, [.. host]);

        static StartOptions Wrong(string fault) => new(StartCommand.Serve, false, UsualDemoPatients, [], fault);
    }
}

/// <summary>The program cannot start as asked; the message says why and how to mend it.</summary>
public sealed class CannotStartException(string message) : Exception(message);
