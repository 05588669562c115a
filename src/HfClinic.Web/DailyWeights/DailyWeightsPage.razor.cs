using HfClinic.Records;
using HfClinic.Records.Access;
using HfClinic.Records.DailyWeights;
using HfClinic.Records.Reassessment;
using HfClinic.Records.Settings;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Authorization;

namespace HfClinic.Web.DailyWeights;

/// <summary>The nurse's morning: everyone on home weighing, the most urgent first, and beside the list why a person stands on it.</summary>
public sealed partial class DailyWeightsPage(
    DailyListQuery lists, ClinicFeed feed, ClinicClock clock, TimeProvider time, Keys keys, NavigationManager navigation) : IDisposable
{
    /// <summary>How many rows come at a time.</summary>
    public const int RowsAtATime = 60;

    /// <summary>No more rows than this are held for one page; the search reaches the others.</summary>
    public const int MostRows = 600;

    private static readonly TimeSpan Settle = TimeSpan.FromMilliseconds(300);

    private readonly Dictionary<long, PanelDrafts> drafts = [];
    private readonly CancellationTokenSource gone = new();
    private IDisposable? subscription;
    private Delayed? refresh;
    private Delayed? search;
    private Actor? actor;
    private DailyList? list;
    private ListAddress address = ListAddress.Read(null, null, null);
    private string typedSearch = "";
    private string sentSearch = "";
    private string? failure;
    private string said = "";
    private DateTime readAt;
    private long? open;
    private int take = RowsAtATime;
    private int revision;
    private int loads;

    [CascadingParameter]
    private Task<AuthenticationState> Authentication { get; set; } = null!;

    [SupplyParameterFromQuery(Name = "view")]
    private string? View { get; set; }

    [SupplyParameterFromQuery(Name = "q")]
    private string? Search { get; set; }

    [SupplyParameterFromQuery(Name = "sort")]
    private string? Sort { get; set; }

    private ClinicClock Clock => clock;

    public void Dispose()
    {
        subscription?.Dispose();
        refresh?.Dispose();
        search?.Dispose();
        gone.Cancel();
        gone.Dispose();
    }

    protected override async Task OnInitializedAsync()
    {
        actor = (await Authentication).User.ActorOrNull();
        refresh = new(time, Settle, () => InvokeAsync(RefreshAsync));
        search = new(time, Settle, () => InvokeAsync(SearchNow));
        subscription = feed.Subscribe(_ => refresh.Start());
    }

    protected override async Task OnParametersSetAsync()
    {
        var wanted = ListAddress.Read(View, Search, Sort);
        if (wanted == address && list is not null)
        {
            return;
        }

        if (wanted.Search != address.Search && wanted.Search != sentSearch)
        {
            typedSearch = sentSearch = wanted.Search;
        }

        (address, take) = (wanted, RowsAtATime);
        await LoadAsync();
    }

    private async Task LoadAsync()
    {
        var mine = ++loads;
        try
        {
            var read = await lists.ReadAsync(new(address.View, address.Search, address.Sort, actor?.UserId, 0, take), gone.Token);
            if (mine == loads)
            {
                (list, failure, readAt) = (read, null, clock.ToLocal(clock.Now));
            }
        }
        catch (OperationCanceledException) when (gone.IsCancellationRequested)
        {
            // The page was left.
        }
        catch (Exception reason) when (DatabaseAway.Is(reason))
        {
            failure = DatabaseAway.WhileReading;
        }
    }

    private async Task RefreshAsync()
    {
        await LoadAsync();
        revision++;
        StateHasChanged();
    }

    private Task MoreAsync()
    {
        take = Math.Min(take + RowsAtATime, MostRows);
        return LoadAsync();
    }

    private void SearchTyped() => search?.Start();

    private void SearchNow()
    {
        sentSearch = typedSearch.Trim();
        navigation.NavigateTo((address with { Search = sentSearch }).Href, replace: true);
    }

    private void OpenAsync(long patient) => (open, said) = (patient, "");

    private async Task CloseAsync()
    {
        var closed = open;
        open = null;
        StateHasChanged();
        if (closed is { } patient)
        {
            await keys.FocusRowAsync(RowId(patient));
        }
    }

    /// <summary>Something was done for the open patient; with nothing left to settle, the work goes on at the next row.</summary>
    private async Task DoneAsync(Done done)
    {
        said = done.Said;
        if (!done.NothingLeft)
        {
            await keys.FocusRowAsync(RowId(done.PatientId));
            return;
        }

        drafts.Remove(done.PatientId);
        var at = list?.Rows.ToList().FindIndex(row => row.Person.PatientId == done.PatientId) ?? -1;
        if (list is null || at < 0)
        {
            return;
        }

        await keys.FocusRowAfterAsync(RowId(done.PatientId));
        open = at + 1 < list.Rows.Count ? list.Rows[at + 1].Person.PatientId : null;
    }

    private PanelDrafts DraftsOf(long patient) => drafts.TryGetValue(patient, out var known) ? known : drafts[patient] = new();

    private static string RowId(long patient) => patient.ToString(System.Globalization.CultureInfo.InvariantCulture);
}
