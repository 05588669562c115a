using System.Net;
using System.Text.RegularExpressions;
using HfClinic.Records.Access;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Mvc.Testing;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Hosting;

/// <summary>The whole web program without a port, on a clinic with one person of each role.</summary>
public sealed partial class ClinicServer : WebApplicationFactory<Program>
{
    private readonly TestDatabase database;
    private readonly DirectoryInfo data = Directory.CreateTempSubdirectory("hfclinic-");

    private ClinicServer(TestDatabase database) => this.database = database;

    public static async Task<ClinicServer> StartAsync() => new(await TestDatabases.CreateAsync(DatabaseEngine.Sqlite, Templates.Ready));

    /// <summary>A browser without a screen; nobody is signed in.</summary>
    public HttpClient Stranger() => CreateClient(new() { AllowAutoRedirect = false });

    /// <summary>Signs a person of the role in, through the sign-in page.</summary>
    public async Task<HttpClient> SignInAsync(ClinicRole role)
    {
        var client = Stranger();
        using var answer = await TryToSignInAsync(client, role.ToString().ToLowerInvariant(), Templates.Password);
        Assert.Equal(HttpStatusCode.Redirect, answer.StatusCode);
        return client;
    }

    /// <summary>Fills the sign-in page in and sends it.</summary>
    public static async Task<HttpResponseMessage> TryToSignInAsync(HttpClient client, string name, string password)
    {
        var page = await client.GetStringAsync(new Uri("/sign-in", UriKind.Relative), TestContext.Current.CancellationToken);
        using var form = new FormUrlEncodedContent(
        [
            .. HiddenFields().Matches(page).Select(field => KeyValuePair.Create(field.Groups["name"].Value, field.Groups["value"].Value)),
            new("Input.UserName", name),
            new("Input.Password", password),
        ]);
        return await client.PostAsync(new Uri("/sign-in", UriKind.Relative), form, TestContext.Current.CancellationToken);
    }

    public override async ValueTask DisposeAsync()
    {
        await base.DisposeAsync();
        await database.DisposeAsync();
        data.Delete(recursive: true);
    }

    protected override void ConfigureWebHost(IWebHostBuilder builder)
    {
        builder.UseEnvironment("Production");
        builder.UseSetting("ConnectionStrings:Clinic", database.ConnectionString);
        builder.UseSetting("HFCLINIC_DATA", data.FullName);
        builder.UseSetting("Logging:LogLevel:Default", "Warning");
    }

    [GeneratedRegex("""<input type="hidden" name="(?<name>[^"]+)" value="(?<value>[^"]*)""")]
    private static partial Regex HiddenFields();
}
