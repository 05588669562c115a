namespace HfClinic.Web.Shell;

/// <summary>The headers every answer carries: scripts only from this server, no framing, no guessing of types.</summary>
public static class PageSafety
{
    // MudBlazor sets inline styles, so styles cannot be held to 'self' alone.
    private const string Policy =
        "default-src 'self'; script-src 'self'; style-src 'self' 'unsafe-inline'; img-src 'self' data:; " +
        "font-src 'self'; connect-src 'self'; object-src 'none'; base-uri 'self'; form-action 'self'; frame-ancestors 'none'";

    public static IApplicationBuilder UsePageSafety(this IApplicationBuilder app) => app.Use((context, next) =>
    {
        var headers = context.Response.Headers;
        headers.ContentSecurityPolicy = Policy;
        headers.XContentTypeOptions = "nosniff";
        headers.XFrameOptions = "DENY";
        headers["Permissions-Policy"] = "camera=(), microphone=(), geolocation=()";
        headers["Referrer-Policy"] = "same-origin";
        return next(context);
    });
}
