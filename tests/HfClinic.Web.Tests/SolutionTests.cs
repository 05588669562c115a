namespace HfClinic.Web.Tests;

public class SolutionTests
{
    [Fact]
    public void Runs() => Assert.NotNull(typeof(SolutionTests).Assembly);
}
