using System.Net;
using HfClinic.Records.Access;
using HfClinic.Testing;
using TestContext = Xunit.TestContext;

namespace HfClinic.Web.Tests.Hosting;

public class SignInLimitsTests
{
    [Fact]
    public async Task Too_many_tries_from_one_address_are_answered_in_words()
    {
        await using var server = await ClinicServer.StartAsync();
        using var client = server.Stranger();
        for (var attempt = 1; attempt <= 20; attempt++)
        {
            using var answer = await ClinicServer.TryToSignInAsync(client, $"nobody{attempt}", "a wrong password");
            Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        }

        using var refused = await ClinicServer.TryToSignInAsync(client, "nurse", Templates.Password);
        Assert.Equal(HttpStatusCode.TooManyRequests, refused.StatusCode);
        Assert.Contains("Wait a minute", await refused.Content.ReadAsStringAsync(TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task A_form_without_its_token_is_refused_in_words()
    {
        await using var server = await ClinicServer.StartAsync();
        using var client = server.Stranger();
        using var form = new FormUrlEncodedContent([new("_handler", "sign-in"), new("Input.UserName", "nurse"), new("Input.Password", Templates.Password)]);
        using var answer = await client.PostAsync(new Uri("/sign-in", UriKind.Relative), form, TestContext.Current.CancellationToken);
        Assert.Equal(HttpStatusCode.BadRequest, answer.StatusCode);
        Assert.Contains("nothing was saved", await answer.Content.ReadAsStringAsync(TestContext.Current.CancellationToken));
    }

    [Fact]
    public async Task The_sign_in_cookie_is_kept_from_scripts_and_other_sites()
    {
        await using var server = await ClinicServer.StartAsync();
        using var client = server.Stranger();
        using var answer = await ClinicServer.TryToSignInAsync(client, "nurse", Templates.Password);
        var cookie = Assert.Single(answer.Headers.GetValues("Set-Cookie"), cookie => cookie.StartsWith("hfclinic=", StringComparison.Ordinal));
        Assert.Contains("httponly", cookie);
        Assert.Contains("samesite=strict", cookie);
    }

    [Theory]
    [InlineData("/patients/abc")]
    [InlineData("/nothing-here")]
    [InlineData("/patients/99999999999999999999")]
    [InlineData("/readings-in/77/report.csv")]
    public async Task An_unknown_address_is_not_found(string address)
    {
        await using var server = await ClinicServer.StartAsync();
        using var client = await server.SignInAsync(ClinicRole.Nurse);
        using var answer = await client.GetAsync(new Uri(address, UriKind.Relative), TestContext.Current.CancellationToken);
        Assert.Equal(HttpStatusCode.NotFound, answer.StatusCode);
    }
}
