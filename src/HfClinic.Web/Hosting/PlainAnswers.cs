using Microsoft.AspNetCore.Antiforgery;
using Microsoft.AspNetCore.Diagnostics;

namespace HfClinic.Web.Hosting;

/// <summary>An answer that would otherwise be an empty page with a number gets a page that says what happened.</summary>
public static class PlainAnswers
{
    public static IApplicationBuilder UsePlainAnswers(this IApplicationBuilder app) => app
        .UseStatusCodePagesWithReExecute("/answer/{0}", createScopeForStatusCodePages: true)
        .Use(async (context, next) =>
        {
            // The page is only shown: a refused form is not posted to it a second time.
            if (context.Features.Get<IStatusCodeReExecuteFeature>() is not null)
            {
                context.Request.Method = HttpMethods.Get;
                context.Features.Set<IAntiforgeryValidationFeature>(null);
            }

            await next(context);

            // A form refused for its token comes back empty, yet named as a page, and would be passed over.
            if (context.Response is { StatusCode: StatusCodes.Status400BadRequest, HasStarted: false })
            {
                context.Response.ContentType = null;
            }
        });
}
