using HfClinic.Browser.Tests.Browser;
using HfClinic.Testing.Databases;

namespace HfClinic.Browser.Tests;

public class FirstPageTests(BrowserFixture browser)
{
    [Theory, BothDatabases]
    public async Task The_program_answers_on_a_new_database(DatabaseEngine engine)
    {
        await using var app = await ClinicApp.StartAsync(engine);
        await using var window = await browser.OpenAsync(app);

        var answer = await window.Page.APIRequest.GetAsync("/");

        Assert.True(answer.Status < 500, $"The root page answered {answer.Status}.");
    }
}
