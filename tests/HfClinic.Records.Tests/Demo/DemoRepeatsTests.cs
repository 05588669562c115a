using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Metadata;

namespace HfClinic.Records.Tests.Demo;

public class DemoRepeatsTests
{
    [Theory, BothDatabases]
    public async Task Two_demos_made_at_the_same_time_are_equal_row_for_row(DatabaseEngine engine)
    {
        await using var one = await TestClinic.StartAsync(engine, DemoTemplates.MadeInLateMorning);
        await using var other = await TestClinic.StartAsync(engine, DemoTemplates.MadeInLateMorningAgain);
        await using var oneDb = one.OpenDb();
        await using var otherDb = other.OpenDb();
        foreach (var type in oneDb.Model.GetEntityTypes().Where(type => type.ClrType.Namespace!.StartsWith("HfClinic.", StringComparison.Ordinal)
            && type.ClrType.Name is not ("ClinicUser" or "AuditHead")))
        {
            var first = await RowsAsync(oneDb, type);
            var second = await RowsAsync(otherDb, type);
            Assert.Equal(first.Count, second.Count);
            var difference = first.Zip(second).FirstOrDefault(pair => pair.First != pair.Second);
            Assert.True(difference == default, $"{type.ClrType.Name}: {difference.First} is not {difference.Second}");
        }
    }

    /// <summary>Every row in the order of its key, without what is drawn anew for each database: people's identifiers and what hangs on them.</summary>
    private static async Task<List<string>> RowsAsync(ClinicDb db, IEntityType type)
    {
        var compared = type.GetProperties()
            .Where(property => property.ClrType != typeof(Guid) && property.ClrType != typeof(Guid?)
                && property.Name is not ("Hash" or "Before" or "After") && property.PropertyInfo is not null)
            .ToList();
        var set = (IQueryable<object>)typeof(DbContext).GetMethod(nameof(DbContext.Set), 1, [])!.MakeGenericMethod(type.ClrType).Invoke(db, null)!;
        var rows = await set.AsNoTracking().ToListAsync(TestContext.Current.CancellationToken);
        return [.. rows.Select(row => string.Join('|', compared.Select(property => property.PropertyInfo!.GetValue(row)))).Order(StringComparer.Ordinal)];
    }
}
