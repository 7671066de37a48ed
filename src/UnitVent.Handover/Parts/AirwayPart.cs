using UnitVent.Charting.Entries;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>The airway: whether it is difficult first, then tube, cuff and humidifier.</summary>
internal static class AirwayPart
{
    public static IEnumerable<Block> Of(SheetPart part) => part.Now.Airway is { } check
        ? [new Heading("Airway", $"seen {part.Source(check)}"), Difficult(part), new KeyValues([.. Tube(check.Body)])]
        : [new Heading("Airway"), Difficult(part), new Paragraph("No airway check charted.")];

    private static Paragraph Difficult(SheetPart part)
    {
        var difficult = part.Now.Context.Where(context => context.Body.Flag == Circumstance.DifficultAirway).ToList();
        return difficult.Count > 0
            ? new Paragraph($"DIFFICULT AIRWAY. {difficult[0].Body.Reason ?? "How it was managed is not recorded."}", IsStrong: true)
            : new Paragraph("Not recorded as difficult.");
    }

    private static IEnumerable<KeyValue> Tube(AirwayCheck check)
    {
        var kind = check.Airway is { } airway ? Words.Of(airway) : "kind not recorded";
        yield return new("Tube", $"{kind}, {Printed.Typed(check.SizeMm, "mm")}, at {Printed.Typed(check.DepthCm, "cm")}");
        yield return new("Fixed", check.TubeFixedAt ?? "not recorded");
        yield return new("Cuff", Printed.Typed(check.CuffPressureCmH2O, "cmH2O"));
        yield return new("Humidifier", check.Humidifier is { } humidifier ? Words.Spelled(humidifier) : "not recorded");
    }
}
