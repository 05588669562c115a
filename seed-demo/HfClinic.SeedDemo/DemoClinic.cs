namespace HfClinic.SeedDemo;

public static class DemoClinic
{
    public static Task SeedAsync(IServiceProvider services, int patients, CancellationToken cancellation) => Task.CompletedTask;
}
