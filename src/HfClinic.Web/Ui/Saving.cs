using HfClinic.Records;

namespace HfClinic.Web.Ui;

/// <summary>Saves what one form holds and keeps what went wrong, so that the form can say it and nothing typed is lost.</summary>
public sealed class Saving
{
    /// <summary>What is wrong with single fields, or with the whole.</summary>
    public IReadOnlyList<Problem> Problems { get; private set; } = [];

    /// <summary>Why nothing was saved, where no field is at fault.</summary>
    public string? Notice { get; private set; }

    /// <summary>Whether the very same may succeed a moment later.</summary>
    public bool CanTryAgain { get; private set; }

    /// <summary>A second press while the first is under way does nothing.</summary>
    public bool IsRunning { get; private set; }

    /// <summary>What to show beside the field, or null.</summary>
    public string? For(string field) => Problems.MessageFor(field);

    /// <summary>Runs the change.</summary>
    /// <returns>Whether it was carried out.</returns>
    public async Task<bool> RunAsync(Func<Task> change)
    {
        if (IsRunning)
        {
            return false;
        }

        Clear();
        IsRunning = true;
        try
        {
            await change();
            return true;
        }
        catch (RefusedException refused)
        {
            Problems = refused.Problems;
        }
        catch (Exception reason) when (reason is NotAllowedException or ChangedMeanwhileException or NotFoundException)
        {
            Notice = reason.Message;
        }
        catch (Exception reason) when (DatabaseAway.Says(reason))
        {
            (Notice, CanTryAgain) = (DatabaseAway.WhileSaving, true);
        }
        finally
        {
            IsRunning = false;
        }

        return false;
    }

    /// <summary>Forgets what went wrong.</summary>
    public void Clear() => (Problems, Notice, CanTryAgain) = ([], null, false);
}
