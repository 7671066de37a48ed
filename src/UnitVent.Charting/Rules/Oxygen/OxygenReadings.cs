using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>Where oxygen readings come from, and what they are held against.</summary>
internal static class OxygenReadings
{
    /// <summary>The youngest SpO2 of checks, breathing checks and gases; null when none is young enough.</summary>
    public static (double Percent, Instant At, Guid Entry)? SpO2(PatientPicture picture)
    {
        var window = picture.Window;
        var at = picture.AsOf;
        var youngest = new[]
        {
            Of(window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, at, c => c.SpO2Percent is not null), c => c.SpO2Percent),
            Of(window.Latest<BreathingCheck>(EntryKind.BreathingCheck, at, c => c.SpO2Percent is not null), c => c.SpO2Percent),
            Of(window.Latest<BloodGas>(EntryKind.BloodGas, at, g => g.SpO2Percent is not null), g => g.SpO2Percent),
        }.Where(r => r is not null && at - r.Value.At <= picture.Limits.Readings).OrderBy(r => r!.Value.At).ToList();
        return youngest.Count > 0 ? youngest[^1] : null;

        static (double Percent, Instant At, Guid Entry)? Of<T>(Charted<T>? charted, Func<T, decimal?> member)
            where T : Entry => charted is { } c ? ((double)member(c.Body)!, c.At, c.Id) : null;
    }

    /// <summary>SpO2 when a gas was drawn: the slip's own, else that of the check that goes with it.</summary>
    public static double? SpO2AtDraw(PairedGas gas) => (double?)(gas.Gas.Body.SpO2Percent ?? gas.Check?.Body.SpO2Percent);

    /// <summary>PaO2 of a gas in mmHg.</summary>
    public static double? PaO2(PairedGas gas) => gas.Gas.Body.PO2 is { } typed ? GasConsistency.Tension(typed, gas.Gas.Body.TensionUnit).MmHg : null;

    /// <summary>The lower edge of SpO2: the patient's target, else the unit's.</summary>
    public static double TargetLow(PatientPicture picture) =>
        (double?)picture.Targets?.Body.SpO2LowPercent ?? picture.Window.Unit.Thresholds.LowOxygen.SpO2LowPercent;
}
