using HfClinic.Records;
using HfClinic.Web.Ui;
using Microsoft.Extensions.Logging.Abstractions;

namespace HfClinic.Web.Tests.Ui;

public class SavingTests
{
    private readonly Saving saving = new(NullLogger.Instance);

    [Fact]
    public async Task A_refusal_is_said_beside_its_field()
    {
        Assert.False(await saving.RunAsync(() => throw new RefusedException(new Problem("Reason", "The reason is missing.", "Fill it in."))));
        Assert.Equal("The reason is missing. Fill it in.", saving.For("Reason"));
        Assert.Null(saving.For("Value"));
        Assert.Null(saving.ForAllBut("Reason"));
        Assert.Null(saving.Failure);
    }

    [Fact]
    public async Task A_conflict_carries_what_the_other_saved()
    {
        Assert.False(await saving.RunAsync(() => throw new ChangedMeanwhileException("Changed meanwhile.", "theirs")));
        Assert.Equal(("Changed meanwhile.", (object)"theirs"), (saving.Failure, saving.Theirs!));
    }

    [Fact]
    public async Task A_database_away_says_that_nothing_was_saved_and_a_later_try_may_do()
    {
        Assert.False(await saving.RunAsync(() => throw new InvalidOperationException("outer", new TimeoutException())));
        Assert.Equal(DatabaseAway.WhileSaving, saving.Failure);
        Assert.True(await saving.RunAsync(() => Task.CompletedTask));
        Assert.Null(saving.Failure);
    }

    [Fact]
    public Task A_fault_in_the_program_is_not_hidden() =>
        Assert.ThrowsAsync<InvalidOperationException>(() => saving.RunAsync(() => throw new InvalidOperationException("a fault")));

    [Fact]
    public async Task A_second_click_does_not_save_twice()
    {
        var first = new TaskCompletionSource();
        var running = saving.RunAsync(() => first.Task);
        Assert.True(saving.Busy);
        Assert.False(await saving.RunAsync(() => throw new InvalidOperationException("never begun")));
        first.SetResult();
        Assert.True(await running);
        Assert.False(saving.Busy);
    }
}
