using HfClinic.Web.Hosting;
using Microsoft.AspNetCore.Connections;

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
try
{
    await app.RunAsync();
}
catch (IOException taken) when (taken.InnerException is AddressInUseException)
{
    await Console.Error.WriteLineAsync($"{taken.Message} Is the program running already? Name another address with --urls http://127.0.0.1:8080");
    return 2;
}

return 0;
