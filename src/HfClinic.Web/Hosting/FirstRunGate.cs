using HfClinic.Records.Settings;

namespace HfClinic.Web.Hosting;

/// <summary>Until the clinic is set up, every page leads to the first-run page.</summary>
public static class FirstRunGate
{
    private static readonly string[] Open = ["/first-run", "/health", "/_framework", "/_content", "/fonts"];

    public static Task Pass(HttpContext context, RequestDelegate next)
    {
        var path = context.Request.Path;
        var isPage = !Path.HasExtension(path.Value) && !Array.Exists(Open, open => path.StartsWithSegments(open, StringComparison.OrdinalIgnoreCase));
        if (isPage && context.RequestServices.GetRequiredService<CurrentSettings>().OrNull is null)
        {
            context.Response.Redirect("/first-run");
            return Task.CompletedTask;
        }

        return next(context);
    }
}
