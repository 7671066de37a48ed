using UnitVent.Charting.Entries;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>The targets in force, with their author.</summary>
internal static class TargetsPart
{
    public static IEnumerable<Block> Of(SheetPart part)
    {
        if (part.Now.Targets is not { } targets)
        {
            return [new Heading("Targets"), new Paragraph("No targets set.")];
        }

        var until = targets.Body.ExpiresAt is { } expires ? $" · until {part.Times.At(expires)}" : "";
        return
        [
            new Heading("Targets", $"set {part.Source(targets)}{until}"),
            new Paragraph(string.Join(" · ", Aims(targets.Body).OfType<string>().Append($"because: {targets.Body.Reason}"))),
        ];
    }

    private static IEnumerable<string?> Aims(TargetSet set) =>
    [
        Range("SpO2", set.SpO2LowPercent, set.SpO2HighPercent, "%"),
        Range("PaO2", set.PaO2LowMmHg, set.PaO2HighMmHg, "mmHg"),
        Range("PaCO2", set.PaCO2LowMmHg, set.PaCO2HighMmHg, "mmHg"),
        set.PHFloor is { } floor ? $"pH not below {Printed.AcidBase(floor)}" : null,
        set.PHighLimitCmH2O is { } limit ? $"P high not above {Printed.Typed(limit, "cmH2O")}" : null,
        set.EndReleaseFlowPercent is { } percent ? $"end of release at {Printed.Typed(percent, "% of peak")}" : null,
        Range("RASS", set.RassLow, set.RassHigh, ""),
        set.MeanArterialPressureMmHg is { } pressure ? $"mean arterial pressure {Printed.Typed(pressure, "mmHg")}" : null,
    ];

    private static string? Range(string name, decimal? low, decimal? high, string unit) => (low, high) switch
    {
        ({ } from, { } to) => $"{name} {Printed.Typed(from)} to {Printed.Typed(to, unit)}",
        ({ } from, null) => $"{name} not below {Printed.Typed(from, unit)}",
        (null, { } to) => $"{name} not above {Printed.Typed(to, unit)}",
        _ => null,
    };
}
