using System.Net;
using HfClinic.Records.Access;
using Microsoft.AspNetCore.Routing;
using Microsoft.AspNetCore.StaticAssets;
using Microsoft.Extensions.DependencyInjection;
using static HfClinic.Records.Access.ClinicRole;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Hosting;

/// <summary>
/// Who reaches which address. The table is written by hand from who does what in a clinic (common practice, no source) and must name
/// every address of the program, so that a page without a decision about its readers fails here.
/// </summary>
public class AccessMatrixTests
{
    private static readonly ClinicRole[] Staff = [Nurse, Prescriber, Coordinator];
    private static readonly ClinicRole[] ReadsFilesIn = [Nurse, Coordinator, Administrator];
    private static readonly ClinicRole[] SignedIn = [Nurse, Prescriber, Coordinator, Administrator];
    private const ClinicRole[]? Anybody = null;

    private static readonly Dictionary<string, (string Example, ClinicRole[]? Roles)> Table = new()
    {
        ["/"] = ("/", SignedIn),
        ["/daily-weights"] = ("/daily-weights", Staff),
        ["/patients"] = ("/patients", Staff),
        ["/patients/new"] = ("/patients/new", Staff),
        ["/patients/{Id:long}"] = ("/patients/1", Staff),
        ["/patients/{Id:long}/edit"] = ("/patients/1/edit", Staff),
        ["/questions"] = ("/questions", Staff),
        ["/flag-behaviour"] = ("/flag-behaviour", [Prescriber, Coordinator]),
        ["/readings-in"] = ("/readings-in", ReadsFilesIn),
        ["/readings-in/{ImportId:long}"] = ("/readings-in/1", ReadsFilesIn),
        ["/readings-in/{importId:long}/report.csv"] = ("/readings-in/1/report.csv", ReadsFilesIn),
        ["/people"] = ("/people", [Administrator]),
        ["/record-of-access"] = ("/record-of-access", [Administrator]),
        ["/not-yours"] = ("/not-yours", SignedIn),
        ["/answer/404"] = ("/answer/404", SignedIn),
        ["/answer/{Status:int}"] = ("/answer/400", Anybody),
        ["/fault"] = ("/fault", Anybody),
        ["/sign-in"] = ("/sign-in", Anybody),
        ["/first-run"] = ("/first-run", Anybody),
        ["/health/live"] = ("/health/live", Anybody),
        ["/health/ready"] = ("/health/ready", Anybody),
    };

    /// <summary>Addresses that only take what is sent to them.</summary>
    private static readonly string[] PostedTo = ["/sign-out", "/sign-in/demo"];

    [Fact]
    public async Task Every_address_of_the_program_is_in_the_table()
    {
        await using var server = await ClinicServer.StartAsync();
        var addresses = server.Services.GetServices<EndpointDataSource>().SelectMany(source => source.Endpoints).OfType<RouteEndpoint>()
            .Where(endpoint => endpoint.Metadata.GetMetadata<StaticAssetDescriptor>() is null)
            .Select(endpoint => "/" + endpoint.RoutePattern.RawText!.TrimStart('/'))
            .Where(address => !address.StartsWith("/_", StringComparison.Ordinal) && !address.StartsWith("/{*", StringComparison.Ordinal))
            .Distinct().Order(StringComparer.Ordinal);

        Assert.Equal(Table.Keys.Concat(PostedTo).Order(StringComparer.Ordinal), addresses);
    }

    [Theory]
    [InlineData(Nurse)]
    [InlineData(Prescriber)]
    [InlineData(Coordinator)]
    [InlineData(Administrator)]
    public async Task A_role_reaches_its_own_addresses_and_no_others(ClinicRole role)
    {
        await using var server = await ClinicServer.StartAsync();
        using var client = await server.SignInAsync(role);
        Assert.Equal(
            Table.ToDictionary(row => row.Value.Example, row => row.Value.Roles?.Contains(role) != false ? "in" : "/not-yours"),
            await OutcomesAsync(client));
    }

    [Fact]
    public async Task Somebody_not_signed_in_is_sent_to_the_sign_in_page()
    {
        await using var server = await ClinicServer.StartAsync();
        using var client = server.Stranger();
        Assert.Equal(
            Table.ToDictionary(row => row.Value.Example, row => row.Value.Roles is null ? "in" : "/sign-in"), await OutcomesAsync(client));
    }

    [Theory]
    [InlineData("/_blazor/negotiate?negotiateVersion=1")]
    [InlineData("/sign-out")]
    public async Task Nothing_can_be_sent_to_the_program_without_signing_in(string address)
    {
        await using var server = await ClinicServer.StartAsync();
        using var client = server.Stranger();
        using var answer = await client.PostAsync(new Uri(address, UriKind.Relative), null, TestContext.Current.CancellationToken);
        Assert.StartsWith("/sign-in", answer.Headers.Location?.PathAndQuery);
    }

    private static async Task<Dictionary<string, string>> OutcomesAsync(HttpClient client)
    {
        var outcomes = new Dictionary<string, string>();
        foreach (var (example, _) in Table.Values)
        {
            using var answer = await client.GetAsync(new Uri(example, UriKind.Relative), TestContext.Current.CancellationToken);
            var isAway = answer.StatusCode == HttpStatusCode.Redirect && answer.Headers.Location!.IsAbsoluteUri;
            outcomes[example] = isAway ? answer.Headers.Location!.AbsolutePath : "in";
            Assert.True(answer.StatusCode < HttpStatusCode.InternalServerError, $"{example} answered {answer.StatusCode}.");
        }

        return outcomes;
    }
}
