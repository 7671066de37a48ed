using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Stories;

/// <summary>A chart told hour by hour, with the ledger carrying the flags on, and what must stand open of the families it is about.</summary>
internal sealed class Story(params Family[] about)
{
    private static readonly Instant Begin = Chart.Now - Duration.FromDays(2);

    private readonly Chart chart = new();
    private List<Flag> open = [];

    /// <summary>What is charted at an hour; nothing when only time passes.</summary>
    public Story At(double hour, params Entry[] charted)
    {
        var at = Begin + Duration.FromHours(hour);
        chart.With([.. charted.Select(e => e.EffectiveFrom(at))]);
        var flags = open.ToDictionary(f => f.Id);
        foreach (var step in FlagLedger.Next(open, chart.Picture(at), Guid.NewGuid))
        {
            flags[step.FlagId] = FlagLedger.Apply(flags.GetValueOrDefault(step.FlagId), step, Guid.Empty, at);
        }

        open = [.. flags.Values.Where(f => f.State == FlagState.Open)];
        return this;
    }

    /// <summary>What stands open then, as "R01 Caution", in any order.</summary>
    public Story Stands(params string[] expected)
    {
        Assert.Equal(
            expected.Order(StringComparer.Ordinal),
            open.Where(f => about.Contains(f.Finding.Family)).Select(f => $"{f.Finding.Rule} {f.Finding.Severity}").Order(StringComparer.Ordinal));
        return this;
    }
}
