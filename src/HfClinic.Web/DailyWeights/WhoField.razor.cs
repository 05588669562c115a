using HfClinic.Records;
using HfClinic.Records.Patients;
using HfClinic.Records.Settings;
using HfClinic.Web.Ui;
using Microsoft.AspNetCore.Components;
using Microsoft.AspNetCore.Components.Web;

namespace HfClinic.Web.DailyWeights;

/// <summary>Names one enrolled person by typing a part of the name or the number. Nobody is guessed: of several the person at the keys chooses.</summary>
public sealed partial class WhoField(PatientSearch search, ClinicClock clock, TimeProvider time) : IDisposable
{
    private const int MostShown = 8;
    private static readonly TimeSpan Settle = TimeSpan.FromMilliseconds(150);

    private ElementReference input;
    private Delayed? suggest;
    private string text = "";
    private PatientRow? chosen;
    private IReadOnlyList<PatientRow> found = [];
    private int at = -1;
    private bool focused;

    /// <summary>What is wrong with it, from the form.</summary>
    [Parameter, EditorRequired]
    public string? Problem { get; set; }

    /// <summary>Somebody was chosen.</summary>
    [Parameter, EditorRequired]
    public EventCallback OnChanged { get; set; }

    private ClinicClock Clock => clock;

    public void Dispose() => suggest?.Dispose();

    /// <summary>The one person meant; otherwise adds what is wrong.</summary>
    public async Task<PatientRow?> FindAsync(List<Problem> problems)
    {
        if (chosen is not null)
        {
            return chosen;
        }

        if (found.Count > 0 && at >= 0)
        {
            Choose(found[at]);
            return chosen;
        }

        if (string.IsNullOrWhiteSpace(text))
        {
            problems.Add(new(nameof(WhoField), "Nobody is named.", "Type a part of the name, or the clinic number."));
            return null;
        }

        var people = await search.RowsAsync(text, PatientsView.Enrolled, 0, MostShown);
        if (people.Count == 1)
        {
            Choose(people[0]);
            return chosen;
        }

        found = people;
        problems.Add(people.Count == 0
            ? new(nameof(WhoField), $"Nobody enrolled matches “{text.Trim()}”.", "Check the spelling, or use the clinic number.")
            : new(nameof(WhoField), $"{(people.Count == MostShown ? $"{MostShown} or more" : people.Count)} people match “{text.Trim()}”.", "Choose one with the arrow keys and Enter, or type more."));
        return null;
    }

    /// <summary>Empties the field and goes back to it for the next call.</summary>
    public async Task StartOverAsync()
    {
        (text, chosen, found, at) = ("", null, [], -1);
        StateHasChanged();
        await input.FocusAsync();
    }

    protected override void OnInitialized() => suggest = new(time, Settle, () => InvokeAsync(SuggestAsync));

    // Bound: a bound field is never overwritten by an answer that comes later than the next key.
    private string Text
    {
        get => text;
        set
        {
            (text, chosen, at) = (value ?? "", null, -1);
            suggest?.Start();
        }
    }

    private async Task SuggestAsync()
    {
        if (chosen is not null)
        {
            return;
        }

        try
        {
            var asked = text;
            var people = string.IsNullOrWhiteSpace(asked) ? [] : await search.RowsAsync(asked, PatientsView.Enrolled, 0, MostShown);
            if (asked == text && chosen is null)
            {
                (found, at) = focused ? (people, people.Count == 1 ? 0 : -1) : ([], -1);
                if (!focused && people.Count == 1)
                {
                    Choose(people[0]);
                }
            }
        }
        catch (Exception reason) when (DatabaseAway.Is(reason))
        {
            // Suggestions are a help only: the form itself says so when it is sent.
            found = [];
        }

        StateHasChanged();
    }

    private void KeyAsync(KeyboardEventArgs e)
    {
        if (e.Key is "ArrowDown" or "ArrowUp" && found.Count > 0)
        {
            at = e.Key == "ArrowDown" ? Math.Min(at + 1, found.Count - 1) : Math.Max(at - 1, 0);
        }
    }

    private void Left()
    {
        focused = false;
        if (chosen is null && at >= 0 && at < found.Count)
        {
            Choose(found[at]);
        }

        found = [];
    }

    private void Choose(PatientRow person)
    {
        (chosen, text, found, at) = (person, $"{person.FullName} · {person.ClinicNumber}", [], -1);
        _ = OnChanged.InvokeAsync();
    }
}
