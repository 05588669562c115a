using HfClinic.Web.Hosting;

var start = StartOptions.Parse(args);
if (start.Fault is { } fault)
{
    await Console.Error.WriteLineAsync(fault);
    return 2;
}

var builder = WebApplication.CreateBuilder(start.HostArguments);
builder.AddClinic(start);
var app = builder.Build();
try
{
    await app.PrepareClinicAsync(start);
}
catch (CannotStartException reason)
{
    await Console.Error.WriteLineAsync(reason.Message);
    return 2;
}

if (start.Command == StartCommand.VerifyAudit)
{
    return await app.VerifyAuditAsync();
}

app.UseClinic();
await app.RunAsync();
return 0;
