using HfClinic.Records.Settings;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.DailyWeights;

/// <summary>One row with what is drawn beside it.</summary>
public sealed record DailyListRow(DailyWeightRow Person, StripContent Strip, IReadOnlyList<RowFlag> Flags);

/// <summary>The part of the daily list that is on screen.</summary>
/// <param name="Total">How many rows the request has in all.</param>
public sealed record DailyList(DateOnly Today, DailyWeightsCounts Counts, int Total, IReadOnlyList<DailyListRow> Rows)
{
    public const int StripDays = 28;

    /// <summary>The first day of the strips.</summary>
    public DateOnly StripFrom => Today.AddDays(1 - StripDays);
}

/// <summary>Reads the daily list as a page shows it: counts, rows, and the strips and flags of just these rows.</summary>
public sealed class DailyListQuery(
    IDbContextFactory<ClinicDb> databases, DailyWeightsQuery list, WeightStripQuery strips, ClinicClock clock)
{
    /// <summary>The list as it stands now.</summary>
    public async Task<DailyList> ReadAsync(DailyWeightsRequest request, CancellationToken cancellation = default)
    {
        var today = clock.Today;
        var counts = await list.CountsAsync(request.NurseId, cancellation);
        var rows = await list.RowsAsync(request, cancellation);
        var total = rows.Count < request.Take && request.Skip == 0 ? rows.Count : await list.CountAsync(request, cancellation);
        long[] patients = [.. rows.Select(row => row.PatientId)];
        var weights = await strips.ReadAsync(patients, today.AddDays(1 - DailyList.StripDays), today, cancellation);
        await using var db = await databases.CreateDbContextAsync(cancellation);
        var flags = await RowFlag.ReadAsync(db, patients, cancellation);
        return new(today, counts, total, [.. rows.Select(row => new DailyListRow(row, weights[row.PatientId], [.. flags[row.PatientId]]))]);
    }
}
