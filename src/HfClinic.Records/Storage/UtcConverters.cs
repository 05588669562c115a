using Microsoft.EntityFrameworkCore.Storage.ValueConversion;

namespace HfClinic.Records.Storage;

/// <summary>Keeps every stored time UTC on both databases.</summary>
internal sealed class UtcConverter() : ValueConverter<DateTime, DateTime>(
    value => value.Kind == DateTimeKind.Local ? value.ToUniversalTime() : DateTime.SpecifyKind(value, DateTimeKind.Utc),
    value => DateTime.SpecifyKind(value, DateTimeKind.Utc));

/// <summary>Stores an offset time as UTC, so that SQLite can order and compare it.</summary>
internal sealed class UtcOffsetConverter() : ValueConverter<DateTimeOffset, DateTime>(
    value => value.UtcDateTime,
    value => new DateTimeOffset(DateTime.SpecifyKind(value, DateTimeKind.Utc)));
