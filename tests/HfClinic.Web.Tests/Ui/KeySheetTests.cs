using Bunit;
using HfClinic.Web.Ui;
using Microsoft.Extensions.DependencyInjection;

namespace HfClinic.Web.Tests.Ui;

public class KeySheetTests : BunitContext
{
    private readonly BunitJSModuleInterop module;

    public KeySheetTests()
    {
        module = JSInterop.SetupModule("./keys.js");
        Services.AddScoped<Keys>();
    }

    /// <summary>Source: WCAG 2.2, 2.1.4 character key shortcuts: a mechanism is available to turn them off.</summary>
    [Fact]
    public void Letter_keys_can_be_switched_off()
    {
        module.Setup<bool>("lettersOn").SetResult(true);
        module.SetupVoid("setLetters", false).SetVoidResult();

        var sheet = Render<KeySheet>();
        sheet.Find("input[type=checkbox]").Change(false);

        module.VerifyInvoke("setLetters");
    }

    [Fact]
    public void An_earlier_choice_is_shown()
    {
        module.Setup<bool>("lettersOn").SetResult(false);
        Assert.False(Render<KeySheet>().Find("input[type=checkbox]").HasAttribute("checked"));
    }

    [Fact]
    public async Task Focus_goes_to_the_row_after_the_one_dealt_with()
    {
        module.Setup<bool>("focusRowAfter", "17").SetResult(true);
        Assert.True(await Services.GetRequiredService<Keys>().FocusRowAfterAsync("17"));
    }
}
