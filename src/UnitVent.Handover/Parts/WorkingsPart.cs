using UnitVent.Charting.Pictures;
using UnitVent.Handover.Layout.Blocks;

namespace UnitVent.Handover.Parts;

/// <summary>How the computed numbers of the sheet were made: each equation with its numbers put in, as the screen shows it. Only where the page has room.</summary>
internal static class WorkingsPart
{
    private static readonly string[] Values =
    [
        ValueNames.PfRatio,
        ValueNames.MeanAirwayPressureComputed,
        ValueNames.ReleaseVolumePerKg,
        ValueNames.EndReleaseFlowPercent,
        ValueNames.ExpiratoryTimeConstantS,
        ValueNames.EffectiveCompliance,
        ValueNames.SpontaneousSharePercent,
        ValueNames.TidalVolumePerKg,
        ValueNames.DrivingPressureCmH2O,
        ValueNames.StaticCompliance,
    ];

    public static IEnumerable<Block> Of(SheetPart part)
    {
        List<string> workings = [.. Values
            .Select(name => part.Now[name])
            .Where(value => value.Working is not null)
            .Select(value => $"{ValueWords.Of(value.Name)!.Label}: {value.Working}")];
        return workings.Count == 0 ? [] : [new IfRoom([new Heading("How the numbers were made"), new Paragraph(string.Join(" · ", workings))])];
    }
}
