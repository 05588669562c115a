using HfClinic.Clinical.Flags;
using HfClinic.Clinical.Rules;
using HfClinic.Testing;
using HfClinic.Testing.Databases;
using Microsoft.EntityFrameworkCore;

namespace HfClinic.Records.Tests.Demo;

/// <summary>What each story is meant to show. Invented data: the rules themselves are checked against their sources elsewhere.</summary>
public class DemoStoriesTests
{
    private const string Gain3 = "volume.gain-3-days";
    private const string Gain7 = "volume.gain-7-days";
    private const string Loss7 = "volume.loss-7-days";
    private const string Above = "volume.above-target";
    private const string Told = "volume.symptoms";
    private const string Held = "volume.held-reading";
    private const string Silence = "volume.no-weight";
    private const string OldTarget = "volume.target-old";
    private const string Fluid = "volume.fluid-gain";
    private const string Dry = "volume.fluid-loss";
    private const string TrendAbove = "volume.above-target-trend";
    private const string StaleTarget = "volume.target-stale";

    private static readonly (string Family, string Given, Urgency? Worst, string[] Rules)[] Expected =
    [
        ("Samphire", "Rhoda", Urgency.Today, [Above, Fluid, Gain3, Gain7, Told]),
        ("Ó Maoilbhréanainn-Lågvattensstrand de la Peña y Zúñiga", "Gráinne Françoise Ágnes", Urgency.Today, [Above, Fluid, Gain3, Gain7]),
        ("Thrift", "Edmund", Urgency.ThisWeek, [Above, TrendAbove, Fluid, Gain7]),
        ("Ebb", "Lorcan", Urgency.ThisWeek, [Above, Fluid, Gain7]),
        ("Harbour", "Stella", Urgency.Today, [Above, Fluid, Gain3, Gain7]),
        ("Swell", "Ottilie", Urgency.Today, [Above, TrendAbove, Fluid, Gain7, Told, Told]),
        ("Wren", "Tilda", Urgency.Today, [Fluid, Gain3]),
        ("Kelp", "Anders", Urgency.Today, [Above, TrendAbove, Fluid, Gain3, Gain7, Held]),
        ("Quay", "Martin", Urgency.ThisWeek, [Held]),
        ("Quay", "Greta", null, []),
        ("Rill", "Noreen", Urgency.ThisWeek, [Held]),
        ("Buoy", "Norbert", Urgency.ThisWeek, [Held]),
        ("Mender", "Agatha", null, []),
        ("Visitor-Holm", "Ruben", null, []),
        ("Shoal", "Winifred", Urgency.Today, [Dry, Loss7, Told]),
        ("נחשול", "מירה", Urgency.ThisWeek, [Dry, Loss7]),
        ("Mellow", "Hugo", Urgency.ThisWeek, [Above, TrendAbove, OldTarget, StaleTarget]),
        ("Hush", "Ivor", Urgency.ThisWeek, [Silence]),
        ("Still", "Marie", Urgency.ThisWeek, [Silence]),
        ("Latch", "Roderick", Urgency.ThisWeek, [Silence]),
        ("Lull", "Prudence", Urgency.ThisWeek, [Silence]),
        ("Mist", "Leonora", Urgency.Today, [Told]),
        ("Drizzle", "Albert", Urgency.ThisWeek, [Told, Told]),
        ("Squall", "Ernest", Urgency.Today, [Told]),
        ("Tide", "Colm", Urgency.Today, [Above, Fluid, Gain3, Gain7]),
        ("Ferry", "Joan", null, []),
        ("Pier", "Basil", null, [Fluid, Gain7]),
        ("Jetty", "Miriam", Urgency.Today, [Fluid, Gain3, Gain7]),
        ("Sandbar", "Cyril", Urgency.ThisWeek, [Fluid, Gain7]),
        ("Dune", "Selma", null, []),
        ("Reed", "Oskar", null, []),
        ("Strand", "Beatrix", null, []),
        ("Cairn", "Duncan", null, []),
        ("Marsh", "Ingrid", null, []),
        ("Skerry", "Magnus", null, []),
    ];

    [Theory, BothDatabases]
    public async Task Each_story_shows_its_flags(DatabaseEngine engine) => await CheckAsync(engine, DemoTemplates.MadeInLateMorning);

    [Theory, BothDatabases]
    public async Task The_stories_can_be_found_at_night(DatabaseEngine engine) => await CheckAsync(engine, DemoTemplates.MadeAtNight);

    [Theory, BothDatabases]
    public async Task The_stories_can_be_found_on_another_day(DatabaseEngine engine) => await CheckAsync(engine, DemoTemplates.MadeOnSummerEvening);

    private static async Task CheckAsync(DatabaseEngine engine, DatabaseTemplate template)
    {
        await using var clinic = await TestClinic.StartAsync(engine, template, DemoTemplates.LateMorning);
        await using var db = clinic.OpenDb();
        var cancellation = TestContext.Current.CancellationToken;
        var patients = await db.Patients.AsNoTracking().ToListAsync(cancellation);
        var flags = (await db.Flags.AsNoTracking().Where(flag => flag.State == FlagState.Open).ToListAsync(cancellation)).ToLookup(flag => flag.PatientId);
        var worst = await db.PatientSummaries.AsNoTracking().ToDictionaryAsync(summary => summary.PatientId, summary => summary.WorstUrgency, cancellation);
        Assert.Multiple([.. Expected.Select(story => (Action)(() =>
        {
            var patient = Assert.Single(patients, p => p.FamilyName == story.Family && p.GivenName == story.Given);
            var rules = string.Join(' ', flags[patient.Id].Select(flag => flag.RuleId).Order());
            var expected = $"{story.Family}: {story.Worst}: {string.Join(' ', story.Rules.Order())}";
            var shown = $"{story.Family}: {worst[patient.Id]}: {rules}";
            Assert.True(expected == shown, $"expected {expected}\n   shown {shown}");
        }))]);
    }
}
