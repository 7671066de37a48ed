using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Simulation.Tests.Demo;

/// <summary>The unit of the seed files, as it is first loaded: four days old.</summary>
internal static class Demonstration
{
    public static readonly Instant Origin = Instant.FromUtc(2026, 3, 1, 6, 30) + Duration.FromSeconds(17);
    public static readonly Instant FirstLoad = Origin + Duration.FromDays(4);

    private static readonly Lazy<SimulatedUnit> Loaded = new(() => At(FirstLoad));

    public static SimulatedUnit Unit => Loaded.Value;

    public static string SeedFolder { get; } = Path.Combine(AppContext.BaseDirectory, "demo-seed");

    public static SimulatedUnit At(Instant until) => DemoUnit.Create(SeedFolder, Origin, until);

    public static SimulatedEpisode Bed(string bed, SimulatedUnit? unit = null) => (unit ?? Unit).Episodes.Single(e => e.Admission.Bed == bed);

    public static double HourOf(Instant at) => (at - Origin).TotalHours;

    public static IReadOnlyList<(double Hour, T Body)> Of<T>(this SimulatedEpisode episode)
        where T : Entry =>
        [.. episode.Actions.SelectMany(a => a.Entries.Select(e => (HourOf(a.At), Body: e.Body as T))).Where(e => e.Body is not null).Select(e => (e.Item1, e.Body!))];

    public static IEnumerable<(SimulatedAction Action, NewEntry Entry)> Entries(this SimulatedUnit unit) =>
        unit.Episodes.SelectMany(e => e.Actions).SelectMany(a => a.Entries.Select(e => (a, e)));
}
