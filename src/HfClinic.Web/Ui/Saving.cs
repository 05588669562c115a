using HfClinic.Records;

namespace HfClinic.Web.Ui;

/// <summary>One form's saving: carries a change out and keeps what stood in its way, so that it can be said beside what was typed.</summary>
public sealed class Saving(ILogger log)
{
    private IReadOnlyList<Problem> problems = [];

    /// <summary>A change is under way; a second one is not begun.</summary>
    public bool Busy { get; private set; }

    /// <summary>What stood in the way of the whole; null when nothing did.</summary>
    public string? Failure { get; private set; }

    /// <summary>What somebody else saved meanwhile, where the change names it.</summary>
    public object? Theirs { get; private set; }

    /// <summary>What is wrong with a field, or null.</summary>
    public string? For(string field)
    {
        var texts = problems.Where(problem => problem.Field == field).Select(problem => problem.Text).ToList();
        return texts.Count == 0 ? null : string.Join(" ", texts);
    }

    /// <summary>What is wrong with anything but the fields named: for the main field of a form.</summary>
    public string? ForAllBut(params ReadOnlySpan<string> fields)
    {
        var texts = new List<string>();
        foreach (var problem in problems)
        {
            if (!fields.Contains(problem.Field))
            {
                texts.Add(problem.Text);
            }
        }

        return texts.Count == 0 ? null : string.Join(" ", texts);
    }

    /// <summary>Says what is wrong before anything is tried.</summary>
    /// <returns>Whether nothing is.</returns>
    public bool Check(IReadOnlyList<Problem> found)
    {
        (problems, Failure, Theirs) = (found, null, null);
        return found.Count == 0;
    }

    /// <summary>Carries the change out.</summary>
    /// <returns>Whether it is saved; if not, the form stays as it is and says why.</returns>
    public async Task<bool> RunAsync(Func<Task> change)
    {
        if (Busy)
        {
            return false;
        }

        (Busy, problems, Failure, Theirs) = (true, [], null, null);
        try
        {
            await change();
            return true;
        }
        catch (RefusedException refusal)
        {
            problems = refusal.Problems;
            Failure = For("");
        }
        catch (ChangedMeanwhileException conflict)
        {
            (Failure, Theirs) = (conflict.Message, conflict.Theirs);
        }
        catch (Exception refusal) when (refusal is NotAllowedException or NotFoundException)
        {
            Failure = refusal.Message;
        }
        catch (Exception away) when (DatabaseAway.Is(away))
        {
            log.LogError(away, "A change could not be saved: the database did not answer.");
            Failure = DatabaseAway.WhileSaving;
        }
        finally
        {
            Busy = false;
        }

        return false;
    }
}
