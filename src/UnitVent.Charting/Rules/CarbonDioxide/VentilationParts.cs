using MathNet.Numerics.Statistics;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>The parts that ventilation is made of, compared between a gas and the gases before it.</summary>
internal static class VentilationParts
{
    private const double OwnBreathsMatterLMin = 0.5; // common practice

    private static readonly Part[] OfReleases =
    [
        new("release rate", "/min", 0, (_, g) => (double?)g.Check?.Body.ReleaseRatePerMin ?? (double?)(60 / (g.Settings?.Body.THighS + g.Settings?.Body.TLowS))),
        new("release volume", "mL", 0, (_, g) => (double?)g.Check?.Body.ReleaseVolumeMl),
        new("own breaths", "L/min", 1, (p, g) => g.Check is { } check ? new CheckValues(p.Window, check)[ValueNames.SpontaneousMinuteVolumeLMin]?.Value : null) { MattersFrom = OwnBreathsMatterLMin },
    ];

    private static readonly Part[] OfBreaths =
    [
        new("rate", "/min", 0, (_, g) => (double?)(g.Check?.Body.TotalRatePerMin ?? g.Settings?.Body.SetRatePerMin)),
        new("tidal volume", "mL", 0, (_, g) => (double?)g.Check?.Body.TidalVolumeMl),
    ];

    /// <summary>The clause that names which parts fell by a share or more; empty when none did or nothing was charted with the gas.</summary>
    public static string Fell(PatientPicture picture, PairedGas latest, IReadOnlyList<PairedGas> earlier, double share)
    {
        var parts = latest.Settings?.Body.Mode == VentilationMode.Aprv ? OfReleases : OfBreaths;
        return string.Concat(parts.Select(p => p.Fell(picture, latest, earlier, share)));
    }

    private sealed record Part(string Name, string Unit, int Decimals, Func<PatientPicture, PairedGas, double?> Of)
    {
        public double MattersFrom { get; init; }

        public string Fell(PatientPicture picture, PairedGas latest, IReadOnlyList<PairedGas> earlier, double share)
        {
            var known = earlier.Select(g => Of(picture, g)).OfType<double>().ToList();
            return known.Count > 0 && Of(picture, latest) is { } now && known.Median() is var before && before - now >= Math.Max(share * before, MattersFrom)
                ? $"; {Name} {Numbers.Fixed(before, Decimals)} → {Numbers.Fixed(now, Decimals)} {Unit}"
                : "";
        }
    }
}
