namespace HfClinic.Benchmarks.Harness;

/// <summary>One measure of the program.</summary>
/// <param name="RunAsync">Takes the words after the name.</param>
internal sealed record Command(string Name, string What, Func<string[], Task> RunAsync)
{
    /// <summary>A measure without asynchronous work.</summary>
    public static Command Plain(string name, string what, Action<string[]> run) => new(name, what, words =>
    {
        run(words);
        return Task.CompletedTask;
    });
}
