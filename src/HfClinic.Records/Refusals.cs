namespace HfClinic.Records;

/// <summary>One thing wrong with what was asked for.</summary>
/// <param name="Field">The field it belongs to, as the form names it; empty when it concerns the whole.</param>
/// <param name="What">What is wrong, in words for the person.</param>
/// <param name="Mend">How to mend it; may be empty when that is plain.</param>
public sealed record Problem(string Field, string What, string Mend = "")
{
    /// <summary>What and mend as one text.</summary>
    public string Text => Mend.Length == 0 ? What : $"{What} {Mend}";
}

/// <summary>Reads problems beside their fields.</summary>
public static class Problems
{
    /// <summary>What to show beside the field; null when nothing is wrong with it.</summary>
    public static string? MessageFor(this IReadOnlyList<Problem> problems, string field) =>
        problems.Where(problem => problem.Field == field).Select(problem => problem.Text) is var texts && texts.Any() ? string.Join(" ", texts) : null;
}

/// <summary>A request that cannot be carried out as it stands. Nothing was saved.</summary>
public sealed class RefusedException(params IReadOnlyList<Problem> problems)
    : Exception(string.Join(" ", problems.Select(problem => problem.Text)))
{
    public IReadOnlyList<Problem> Problems => problems;
}

/// <summary>The person may not do this. Nothing was saved.</summary>
public sealed class NotAllowedException(string message) : Exception(message);

/// <summary>Somebody else changed the same thing meanwhile. Nothing was saved; <see cref="Theirs"/> is what stands now.</summary>
public sealed class ChangedMeanwhileException(string message, object? theirs = null) : Exception(message)
{
    public object? Theirs => theirs;
}

/// <summary>There is no such thing, for example an unknown number in the address.</summary>
public sealed class NotFoundException(string message) : Exception(message);
