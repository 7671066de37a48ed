using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>Saturation, the patient's own breathing, sedation and relaxant.</summary>
internal static class BreathingPart
{
    public static IEnumerable<Block> Of(SheetPart part) =>
    [
        new Heading("Breathing and sedation"),
        new KeyValues(
        [
            new("SpO2", Saturation(part)),
            part.Value("Own share of ventilation", ValueNames.SpontaneousSharePercent),
            new("RASS", Seen(part, check => check.RassNotAssessable == true ? "not assessable" : check.Rass is { } score ? Printed.Typed(score) : null)),
            new("Relaxant", Seen(part, check => check.Relaxant is { } relaxant ? Words.Spelled(relaxant) : null)),
        ]),
    ];

    /// <summary>The latest reading, from whichever check carries it.</summary>
    private static string Saturation(SheetPart part)
    {
        var (window, now) = (part.Now.Window, part.Now.AsOf);
        var byVentilator = window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, now, check => check.SpO2Percent is not null);
        var byBreathing = window.Latest<BreathingCheck>(EntryKind.BreathingCheck, now, check => check.SpO2Percent is not null);
        return (byVentilator, byBreathing) switch
        {
            (null, null) => "not recorded",
            ({ } v, { } b) when b.At > v.At => Text(b.Body.SpO2Percent, b.At),
            ({ } v, _) => Text(v.Body.SpO2Percent, v.At),
            (null, { } b) => Text(b.Body.SpO2Percent, b.At),
        };

        string Text(decimal? percent, NodaTime.Instant at) => $"{Printed.Typed(percent, "%")}, {part.Times.At(at)}";
    }

    /// <summary>The latest observation of its kind, however many checks ago.</summary>
    private static string Seen(SheetPart part, Func<BreathingCheck, string?> observation) =>
        part.Now.Window.Latest<BreathingCheck>(EntryKind.BreathingCheck, part.Now.AsOf, check => observation(check) is not null) is { } seen
            ? $"{observation(seen.Body)}, {part.Times.At(seen.At)}"
            : "not recorded";
}
