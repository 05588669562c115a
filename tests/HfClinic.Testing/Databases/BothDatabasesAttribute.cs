using System.Reflection;
using Xunit;
using Xunit.Sdk;
using Xunit.v3;

namespace HfClinic.Testing.Databases;

/// <summary>
/// Runs a theory once on each engine: the first parameter is a <see cref="DatabaseEngine"/>,
/// the others are the values given here. May be repeated for several sets of values.
/// </summary>
[AttributeUsage(AttributeTargets.Method, AllowMultiple = true)]
public sealed class BothDatabasesAttribute(params object?[] values) : DataAttribute
{
    private readonly object?[] _values = values;

    public override ValueTask<IReadOnlyCollection<ITheoryDataRow>> GetData(MethodInfo testMethod, DisposalTracker disposalTracker) =>
        new([.. Enum.GetValues<DatabaseEngine>().Select(engine => new TheoryDataRow([engine, .. _values]))]);

    public override bool SupportsDiscoveryEnumeration() => true;
}
