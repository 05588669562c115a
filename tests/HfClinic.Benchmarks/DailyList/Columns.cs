using System.Data.Common;

namespace HfClinic.Benchmarks.DailyList;

/// <summary>Columns to select, each with how its values are read.</summary>
/// <param name="described">"p.Id:whole p.Phone:text", separated by spaces.</param>
internal sealed class Columns(string described)
{
    private readonly string[][] columns = [.. described.Split(' ').Select(column => column.Split('.', ':'))];

    public string List => string.Join(", ", columns.Select(column => $"{column[0]}.\"{column[1]}\""));

    /// <summary>Reads every value of every row in its own type.</summary>
    /// <returns>The first column, row by row.</returns>
    public async Task<List<long>> ReadAsync(DbCommand command)
    {
        await using var reader = await command.ExecuteReaderAsync();
        List<long> first = [];
        long sum = 0;
        while (await reader.ReadAsync())
        {
            first.Add(reader.GetInt64(0));
            for (var at = 1; at < columns.Length; at++)
            {
                sum += reader.IsDBNull(at) ? 0 : Value(reader, at);
            }
        }

        GC.KeepAlive(sum);
        return first;
    }

    private long Value(DbDataReader reader, int at) => columns[at][2] switch
    {
        "whole" => reader.GetInt64(at),
        "text" => reader.GetString(at).Length,
        "day" => reader.GetFieldValue<DateOnly>(at).DayNumber,
        "time" => reader.GetDateTime(at).Ticks,
        "yesno" => reader.GetBoolean(at) ? 1 : 0,
        "number" => (long)reader.GetDecimal(at),
        var kind => throw new InvalidOperationException($"No way to read a '{kind}'."),
    };
}
