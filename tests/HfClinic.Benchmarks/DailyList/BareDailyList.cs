using System.Data.Common;
using HfClinic.Benchmarks.Harness;
using HfClinic.Clinical.Rules;
using HfClinic.Testing;
using HfClinic.Testing.Databases;

namespace HfClinic.Benchmarks.DailyList;

/// <summary>The daily list by hand-written SQL: the same filters, order and columns, every value read in its own type, nothing made of them.</summary>
internal sealed class BareDailyList(TestClinic clinic, DateOnly today)
{
    private static readonly string Counts = $"""
        SELECT (SELECT COUNT(*) FROM "PatientSummaries" s JOIN "Patients" p ON p."Id" = s."PatientId" WHERE s."OnDailyWeights" AND p."NurseId" = @nurse),
            COUNT(*), COUNT(CASE WHEN "WorstUrgency" = {(int)Urgency.Today} THEN 1 END), COUNT(CASE WHEN "WorstUrgency" = {(int)Urgency.ThisWeek} THEN 1 END),
            COUNT(CASE WHEN "WorstUrgency" = {(int)Urgency.NextVisit} THEN 1 END), COUNT(CASE WHEN "IsSilent" THEN 1 END),
            COUNT(CASE WHEN "HeldReadings" > 0 THEN 1 END), COUNT(CASE WHEN "LastWeightDay" IS NULL OR "LastWeightDay" < @today THEN 1 END),
            COUNT(CASE WHEN "PutOffFlags" > 0 THEN 1 END)
        FROM "PatientSummaries" WHERE "OnDailyWeights"
        """;

    private static readonly Columns RowColumns = new(
        "p.Id:whole p.ClinicNumber:text p.FamilyName:text p.GivenName:text p.BirthDate:day p.Sex:whole p.Phone:text "
        + "s.PatientId:whole s.AsOf:day s.CheckFailed:yesno s.ExcessErrorGrams:whole s.ExcessGrams:whole s.FluidBandGrams:whole s.FluidGrams:whole s.FluidScore:number "
        + "s.IsFalling:yesno s.IsLearning:yesno s.IsRising:yesno s.ScatterGrams:whole s.SlopeBandGramsPerWeek:whole s.SlopeGramsPerWeek:whole "
        + "s.TrendDay:day s.TrendLine:text s.Gain1Day:whole s.Gain3Days:whole s.Gain7Days:whole s.HeldReadings:whole "
        + "s.IsSilent:yesno s.LastContact:text s.LastContactDay:day s.LastGrams:whole s.LastWeightAt:time s.LastWeightDay:day "
        + "s.LoopDiuretic:text s.NotChecked:text s.OnDailyWeights:yesno s.OpenFlags:whole s.OpenQuestions:whole s.OpenRules:text "
        + "s.PutOffFlags:whole s.TargetFrom:day s.TargetGrams:whole s.Version:whole s.Why:text s.WorstSince:time s.WorstUrgency:whole");

    private static readonly Columns ReadingColumns = new("r.Id:whole r.PatientId:whole r.MeasuredAt:time r.Value:whole r.State:whole r.HoldReason:whole r.RecordedAt:time");
    private static readonly Columns TargetColumns = new("t.PatientId:whole t.From:day t.Grams:whole");
    private static readonly Columns LineColumns = new("s.PatientId:whole s.TrendLine:text");
    private static readonly Columns CourseColumns = new("c.PatientId:whole c.From:day c.Medicine:text c.DoseMilligrams:number c.TimesDaily:number");

    private bool IsPostgreSql => clinic.Engine == DatabaseEngine.PostgreSql;

    public Task<long[]> CountsAsync() => WithCommandAsync(Counts, async command =>
    {
        Give(command, "nurse", InventedPatient.Nurse);
        Give(command, "today", today);
        await using var reader = await command.ExecuteReaderAsync();
        await reader.ReadAsync();
        return Enumerable.Range(0, reader.FieldCount).Select(reader.GetInt64).ToArray();
    });

    /// <summary>The patients of the rows, in order.</summary>
    public Task<List<long>> RowsAsync(int take) => WithCommandAsync($"""
        SELECT {RowColumns.List} FROM "PatientSummaries" s JOIN "Patients" p ON p."Id" = s."PatientId"
        WHERE s."OnDailyWeights"
        ORDER BY s."WorstUrgency" DESC NULLS LAST, s."WorstSince" NULLS LAST, p."Id" LIMIT {take}
        """, RowColumns.ReadAsync);

    public async Task StripsAsync(IReadOnlyCollection<long> patients)
    {
        var among = IsPostgreSql ? "= ANY (@patients)" : $"IN ({string.Join(',', patients)})";
        await WithCommandAsync($"""
            SELECT {ReadingColumns.List} FROM "Readings" r
            WHERE r."PatientId" {among} AND r."Kind" = 1 AND r."Day" >= @from AND r."Day" <= @today AND r."State" IN (1, 2)
            """, Read(ReadingColumns));
        await WithCommandAsync($"""
            SELECT {TargetColumns.List} FROM "TargetWeights" t
            WHERE t."PatientId" {among} AND t."StruckOutAt" IS NULL AND t."From" <= @today ORDER BY t."From", t."Id"
            """, Read(TargetColumns));
        await WithCommandAsync($"""SELECT {LineColumns.List} FROM "PatientSummaries" s WHERE s."PatientId" {among}""", Read(LineColumns));
        await WithCommandAsync($"""
            SELECT {CourseColumns.List} FROM "DoseCourses" c
            WHERE c."PatientId" {among} AND c."StruckOutAt" IS NULL AND c."Medicine" IN ('furosemide', 'bumetanide', 'torasemide')
                AND c."From" >= @from AND c."From" <= @today ORDER BY c."From"
            """, Read(CourseColumns));

        Func<DbCommand, Task<List<long>>> Read(Columns columns) => command =>
        {
            Give(command, "from", today.AddDays(1 - DailyListSpeed.StripDays));
            Give(command, "today", today);
            if (IsPostgreSql)
            {
                Give(command, "patients", patients.ToArray());
            }

            return columns.ReadAsync(command);
        };
    }

    private async Task<T> WithCommandAsync<T>(string sql, Func<DbCommand, Task<T>> read)
    {
        await using var connection = Engines.Connect(clinic);
        await connection.OpenAsync();
        await using var command = connection.CreateCommand();
        command.CommandText = sql;
        return await read(command);
    }

    private static void Give(DbCommand command, string name, object value)
    {
        var parameter = command.CreateParameter();
        (parameter.ParameterName, parameter.Value) = (name, value);
        command.Parameters.Add(parameter);
    }
}
