using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Flags;
using HfClinic.Records.Settings;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;

namespace HfClinic.Web.DailyWeights;

/// <summary>Why one person stands on the list, and what can be done about it. Opening it marks the open flags as seen.</summary>
public sealed partial class WhyPanel(WhyQuery query, MarkFlagsSeen markSeen, ClinicClock clock) : IDisposable
{
    private readonly CancellationTokenSource gone = new();
    private WhyPanelData? data;
    private string? failure;
    private int shownRevision = -1;

    [Parameter, EditorRequired]
    public long PatientId { get; set; }

    [Parameter, EditorRequired]
    public Actor Actor { get; set; } = null!;

    [Parameter, EditorRequired]
    public PanelDrafts Drafts { get; set; } = null!;

    /// <summary>Raised by the page when something on record changed.</summary>
    [Parameter]
    public int Revision { get; set; }

    [Parameter, EditorRequired]
    public EventCallback OnClose { get; set; }

    [Parameter, EditorRequired]
    public EventCallback<Done> OnDone { get; set; }

    private ClinicClock Clock => clock;

    public void Dispose()
    {
        gone.Cancel();
        gone.Dispose();
    }

    protected override async Task OnParametersSetAsync()
    {
        if (shownRevision == Revision)
        {
            return;
        }

        shownRevision = Revision;
        await LoadAsync();
    }

    private async Task LoadAsync()
    {
        try
        {
            data = await query.ReadAsync(PatientId, gone.Token);
            failure = null;
            if (data.Flags.Any(shown => shown.Flag.SeenAt is null))
            {
                await markSeen.RunAsync(Actor, PatientId);
            }
        }
        catch (OperationCanceledException) when (gone.IsCancellationRequested)
        {
            // Another row was opened.
        }
        catch (NotFoundException reason)
        {
            failure = reason.Message;
        }
        catch (Exception reason) when (DatabaseAway.Is(reason))
        {
            failure = DatabaseAway.WhileReading;
        }
    }

    private async Task DecidedAsync(string said)
    {
        await LoadAsync();
        await OnDone.InvokeAsync(new(PatientId, said, data is { Flags.Count: 0, Held.Count: 0 }));
    }

    private async Task DidAsync(string said)
    {
        await LoadAsync();
        var left = data?.Flags.Any(flag => !flag.IsPutOff(clock.Today)) ?? true;
        await OnDone.InvokeAsync(new(PatientId, $"{said} for {data?.Patient.FullName}.", !left));
    }
}
