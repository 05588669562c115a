using HfClinic.Web.Ui;
using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Web.Tests.Ui;

public class DatabaseAwayTests
{
    [Fact]
    public void A_file_that_cannot_be_opened_is_away_however_deep_it_is_told() =>
        Assert.True(DatabaseAway.Is(new InvalidOperationException("x", new SqliteException("unable to open database file", 14))));

    [Fact]
    public void A_refused_row_is_a_fault_and_not_away() =>
        Assert.False(DatabaseAway.Is(new DbUpdateException("x", new SqliteException("constraint failed", 19))));

    [Fact]
    public void A_fault_of_the_program_is_not_away() => Assert.False(DatabaseAway.Is(new InvalidOperationException("x")));
}
