using UnitVent.Charting.Pictures;
using UnitVent.Handover.Layout.Blocks;

namespace UnitVent.Handover.Parts;

/// <summary>What the releases, or the breaths of a conventional mode, say about the lung.</summary>
internal static class MechanicsPart
{
    private static readonly (string Label, string Name)[] Values =
    [
        ("Release volume", ValueNames.ReleaseVolumePerKg),
        ("End-release flow, of peak", ValueNames.EndReleaseFlowPercent),
        ("Time constant, estimate", ValueNames.ExpiratoryTimeConstantS),
        ("Compliance, estimate", ValueNames.EffectiveCompliance),
        ("Tidal volume", ValueNames.TidalVolumePerKg),
        ("Driving pressure", ValueNames.DrivingPressureCmH2O),
        ("Compliance", ValueNames.StaticCompliance),
    ];

    /// <summary>The values that this mode has; each with its time, or why it is not known.</summary>
    public static IEnumerable<Block> Of(SheetPart part) =>
    [
        new Heading("Mechanics"),
        new KeyValues([.. Values.Where(value => part.Now[value.Name].State != ValueState.Mode).Select(value => part.Value(value.Label, value.Name))]),
    ];
}
