using System.Collections.Concurrent;

namespace HfClinic.Testing.Databases;

/// <summary>Prepares each template once, whichever of the tests running side by side asks first.</summary>
internal sealed class TemplateOnce(Func<DatabaseTemplate, Task<string>> prepare)
{
    private readonly ConcurrentDictionary<string, Lazy<Task<string>>> _prepared = new(StringComparer.Ordinal);

    /// <summary>Where the prepared template is: a file or a database name. A failed preparation fails every test that needs it.</summary>
    public Task<string> PrepareAsync(DatabaseTemplate template) =>
        _prepared.GetOrAdd(template.Name, _ => new(() => prepare(template))).Value;
}
