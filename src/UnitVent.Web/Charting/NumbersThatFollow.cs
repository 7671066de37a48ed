using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Charting;

/// <summary>The numbers that would follow from what was typed so far, computed as they will be once it is saved.</summary>
public static class NumbersThatFollow
{
    private static readonly (string Name, string Label, int Decimals)[] Shown =
    [
        (ValueNames.PfRatio, "P/F", 0),
        (ValueNames.MeanAirwayPressureComputed, "mean pressure", 1),
        (ValueNames.ReleaseRatePerMin, "releases/min", 1),
        (ValueNames.EndReleaseFlowPercent, "end of release, % of peak", 0),
        (ValueNames.ReleaseVolumePerKg, "release mL/kg", 1),
        (ValueNames.TidalVolumePerKg, "tidal volume mL/kg", 1),
        (ValueNames.SpontaneousSharePercent, "own share %", 0),
        (ValueNames.BicarbonateComputedMmolL, "bicarbonate from pH and pCO2", 1),
    ];

    /// <summary>The numbers that changed, as words; empty when none did.</summary>
    public static IReadOnlyList<string> Of(PatientPicture before, IEnumerable<NewEntry> typed, Instant now)
    {
        var entries = typed.Select((e, i) => new ChartEntry(e.Id, before.Window.Episode.Id, e.Body.EffectiveAt() ?? now, now, "", long.MaxValue - 10 + i, e.Body) { Corrects = e.Corrects }).ToList();
        if (entries.Count == 0)
        {
            return [];
        }

        var after = PatientPicture.At(before.Window.With(entries), Instant.Max(now, entries.Max(e => e.EffectiveAt)));
        return [.. Shown
            .Where(s => Changed(before, after, s.Name))
            .Select(s => $"{s.Label} {Format.Number(after.Values[s.Name].Value, s.Decimals)}")];
    }

    private static bool Changed(PatientPicture before, PatientPicture after, string name) =>
        after.Values.TryGetValue(name, out var value) && value.Value is { } now
        && !(before.Values.TryGetValue(name, out var earlier) && earlier.Value is { } was && Math.Abs(was - now) < 1e-9);
}
