using System.Reflection;
using System.Reflection.Emit;
using System.Runtime.CompilerServices;
using HfClinic.Clinical.Rules;

namespace HfClinic.Clinical.Tests;

/// <summary>The clinical core answers from its arguments alone.</summary>
public class PurityTests
{
    private static readonly Assembly Clinical = typeof(IRule).Assembly;

    [Fact]
    public void It_references_only_the_base_library() =>
        Assert.All(Clinical.GetReferencedAssemblies(), reference =>
            Assert.True(reference.Name!.StartsWith("System.", StringComparison.Ordinal) || reference.Name is "netstandard", reference.Name));

    [Theory]
    [InlineData("System.IO.FileSystem")]
    [InlineData("System.Net.")]
    [InlineData("System.Data")]
    [InlineData("System.Diagnostics.Process")]
    [InlineData("System.Threading.Timer")]
    public void It_reaches_for_nothing_outside(string library) =>
        Assert.DoesNotContain(Clinical.GetReferencedAssemblies(), reference => reference.Name!.StartsWith(library, StringComparison.Ordinal));

    [Fact]
    public void It_calls_no_clock_no_file_and_no_environment()
    {
        Type[] forbidden = [typeof(File), typeof(Directory), typeof(Environment), typeof(Thread), typeof(Console)];
        string[] clocks = ["get_Now", "get_UtcNow", "get_Today", "get_System"];
        const string ByEveryIterator = "get_CurrentManagedThreadId";

        Assert.All(Clinical.GetTypes().SelectMany(Calls).Where(call => call.Name != ByEveryIterator), call => Assert.False(
            forbidden.Contains(call.DeclaringType) || clocks.Contains(call.Name), $"{call.DeclaringType}.{call.Name}"));
    }

    [Fact]
    public void The_reader_of_calls_sees_a_clock_when_there_is_one() =>
        Assert.Contains(Calls(typeof(WithClock)), call => call.Name == "get_UtcNow");

    [Fact]
    public void Nothing_static_can_change() =>
        Assert.All(
            Clinical.GetTypes()
                .Where(type => !type.IsDefined(typeof(CompilerGeneratedAttribute)))
                .SelectMany(type => type.GetFields(BindingFlags.Static | BindingFlags.Public | BindingFlags.NonPublic)),
            field => Assert.True(
                field.IsLiteral || field.IsInitOnly || field.IsDefined(typeof(CompilerGeneratedAttribute)), $"{field.DeclaringType}.{field.Name}"));

    /// <summary>Every method a type's code calls, read from its instructions.</summary>
    private static IEnumerable<MethodBase> Calls(Type type)
    {
        const BindingFlags Own = BindingFlags.Static | BindingFlags.Instance | BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.DeclaredOnly;
        var bodies = type.GetMethods(Own).Cast<MethodBase>().Concat(type.GetConstructors(Own));
        foreach (var body in bodies)
        {
            var code = body.GetMethodBody()?.GetILAsByteArray() ?? [];
            for (var at = 0; at + 4 < code.Length; at++)
            {
                if (code[at] is var op && (op == OpCodes.Call.Value || op == OpCodes.Callvirt.Value)
                    && Resolve(body, BitConverter.ToInt32(code, at + 1)) is { } called)
                {
                    yield return called;
                }
            }
        }
    }

    private static MethodBase? Resolve(MethodBase body, int token)
    {
        try
        {
            return body.Module.ResolveMethod(token, body.DeclaringType?.GetGenericArguments(), body.IsGenericMethod ? body.GetGenericArguments() : null);
        }
        catch (Exception fault) when (fault is ArgumentException or BadImageFormatException)
        {
            return null;
        }
    }

    private static class WithClock
    {
        public static DateTime Read() => DateTime.UtcNow;
    }
}
