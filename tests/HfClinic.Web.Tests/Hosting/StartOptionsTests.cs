using HfClinic.Web.Hosting;

namespace HfClinic.Web.Tests.Hosting;

public class StartOptionsTests
{
    [Theory]
    [InlineData("", StartCommand.Serve, false, 240)]
    [InlineData("demo", StartCommand.Demo, false, 240)]
    [InlineData("demo --fresh", StartCommand.Demo, true, 240)]
    [InlineData("--fresh demo --patients 1000", StartCommand.Demo, true, 1000)]
    [InlineData("verify-audit", StartCommand.VerifyAudit, false, 240)]
    [InlineData("--verify-audit", StartCommand.VerifyAudit, false, 240)]
    public void A_command_is_understood(string line, StartCommand command, bool fresh, int patients)
    {
        var start = StartOptions.Parse(Words(line));

        Assert.Equal((command, fresh, patients, null), (start.Command, start.Fresh, start.DemoPatients, start.Fault));
        Assert.Empty(start.HostArguments);
    }

    [Theory]
    [InlineData("--urls http://127.0.0.1:8080")]
    [InlineData("--urls=http://127.0.0.1:8080")]
    [InlineData("--environment Development --urls http://127.0.0.1:8080")]
    public void What_the_web_host_understands_is_handed_on_as_it_is(string line)
    {
        var start = StartOptions.Parse(["demo", .. Words(line)]);

        Assert.Null(start.Fault);
        Assert.Equal(Words(line), start.HostArguments);
    }

    [Theory]
    [InlineData("dmeo", "'dmeo' is not a command")]
    [InlineData("demo now", "'now' is not a command")]
    [InlineData("demo --fresh now", "'now' is not a command")]
    [InlineData("--urls=http://127.0.0.1:8080 now", "'now' is not a command")]
    [InlineData("--fresh", "goes with demo only")]
    [InlineData("verify-audit --fresh", "goes with demo only")]
    [InlineData("--patients 100", "goes with demo only")]
    [InlineData("demo verify-audit", "One command at a time")]
    [InlineData("verify-audit demo", "One command at a time")]
    [InlineData("demo --patients", "needs a number from 1 to 100000")]
    [InlineData("demo --patients many", "needs a number from 1 to 100000")]
    [InlineData("demo --patients 0", "needs a number from 1 to 100000")]
    [InlineData("demo --patients -5", "needs a number from 1 to 100000")]
    [InlineData("demo --patients 100001", "needs a number from 1 to 100000")]
    [InlineData("demo --urls", "needs an address")]
    public void A_wrong_word_is_named_and_how_to_mend_it(string line, string words) =>
        Assert.Contains(words, StartOptions.Parse(Words(line)).Fault);

    private static string[] Words(string line) => line.Split(' ', StringSplitOptions.RemoveEmptyEntries);
}
