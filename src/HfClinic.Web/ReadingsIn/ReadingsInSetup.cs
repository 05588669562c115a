using HfClinic.Records.Access;
using HfClinic.Records.Exchange;

namespace HfClinic.Web.ReadingsIn;

/// <summary>What the pages for reading files in need of the host.</summary>
public static class ReadingsInSetup
{
    /// <summary>The address of a report as CSV.</summary>
    public static string CsvAddress(long importId) => $"readings-in/{importId}/report.csv";

    public static IServiceCollection AddReadingsIn(this IServiceCollection services)
    {
        services.AddSingleton<FilesIn>();
        return services.AddHostedService<FilesInService>();
    }

    /// <summary>The report as a download, written as it comes from the database.</summary>
    public static void MapReadingsIn(this IEndpointRouteBuilder routes) => routes
        .MapGet("/readings-in/{importId:long}/report.csv", async (long importId, ImportReports reports, HttpContext context) =>
        {
            if (await reports.RunAsync(importId, context.RequestAborted) is null)
            {
                context.Response.StatusCode = StatusCodes.Status404NotFound;
                return;
            }

            context.Response.ContentType = "text/csv; charset=utf-8";
            context.Response.Headers.ContentDisposition = $"attachment; filename=\"readings-in-{importId}.csv\"";
            await reports.WriteCsvAsync(importId, context.Response.Body, context.RequestAborted);
        })
        .RequireAuthorization(nameof(Capability.ImportFiles));
}
