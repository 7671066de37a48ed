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

    /// <summary>Somebody takes what a rule raised in hand for an hour.</summary>
    public Story TakenInHand(double hour, string rule)
    {
        var at = Begin + Duration.FromHours(hour);
        open = [.. open.Select(f => f.Finding.Rule == rule ? f with { InHand = new(at, "Tester", null, at + Duration.FromHours(1), null, null) } : f)];
        return this;
    }

    /// <summary>Whether what a rule raised is in hand.</summary>
    public Story IsInHand(string rule, bool expected)
    {
        Assert.Equal(expected, open.Single(f => f.Finding.Rule == rule).InHand is not null);
        return this;
    }

    /// <summary>What a rule says.</summary>
    public Story Says(string rule, string words)
    {
        Assert.Contains(words, open.Single(f => f.Finding.Rule == rule).Finding.Says, StringComparison.Ordinal);
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
