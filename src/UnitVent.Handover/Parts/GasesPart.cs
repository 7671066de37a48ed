using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>The last four arterial gases, each with the settings in force when it was drawn. Venous and capillary gases never stand here.</summary>
internal static class GasesPart
{
    private const int Most = 4;

    public static IEnumerable<Block> Of(SheetPart part)
    {
        var gases = part.Now.Gases.TakeLast(Most).Reverse().ToList();
        if (gases.Count == 0)
        {
            return [new Heading("Arterial gases"), new Paragraph("No arterial gas charted.")];
        }

        var units = gases.Select(gas => gas.Gas.Body.TensionUnit).Distinct().ToList();
        var shared = units.Count == 1 ? Unit(units[0]) : null;
        Column[] columns =
        [
            new("Drawn"),
            .. new[] { "pH", Tension("PaCO2", shared), Tension("PaO2", shared), "Lactate\nmmol/L", "FiO2", "P/F\nmmHg", "Mean press.\ncmH2O" }
                .Select(head => new Column(head, Align.Right)),
            new("Position"),
        ];
        return
        [
            new Heading("Arterial gases", $"newest first, each with the settings at its draw · latest {part.Times.AtAndAge(gases[0].Gas.At)}"),
            new Table(columns, [.. gases.Select(gas => Line(part, gas, shared))]),
            .. gases.SelectMany(gas => Missing(part, gas)).Select(text => new Paragraph(text)),
        ];
    }

    private static Row Line(SheetPart part, PairedGas gas, string? sharedUnit)
    {
        var (slip, unit) = (gas.Gas.Body, sharedUnit is null ? Unit(gas.Gas.Body.TensionUnit) : "");
        return Row.Of(
            part.Times.At(gas.Gas.At),
            slip.PH is { } pH ? Printed.AcidBase(pH) : "–",
            slip.PCO2 is { } pCO2 ? Printed.WithUnit(Printed.Typed(pCO2), unit) : "–",
            slip.PO2 is { } pO2 ? Printed.WithUnit(Printed.Typed(pO2), unit) : "–",
            slip.LactateMmolL is { } lactate ? Printed.Typed(lactate) : "–",
            (slip.FiO2 ?? gas.Settings?.Body.FiO2) is { } fiO2 ? Printed.Typed(fiO2) : "–",
            new Cell(Printed.Bare(gas.Values[ValueNames.PfRatio]) ?? "–", IsStrong: true),
            MeanPressure(gas),
            $"{(gas.Prone ? "prone" : "not prone")}{(gas.Unsettled ? ", not settled" : "")}");
    }

    private static string MeanPressure(PairedGas gas) =>
        Printed.Bare(gas.Values[ValueNames.MeanAirwayPressureComputed])
        ?? (Printed.Bare(gas.Values[ValueNames.MeanAirwayPressureMeasured]) is { } measured ? $"{measured} measured" : "–");

    private static IEnumerable<string> Missing(SheetPart part, PairedGas gas)
    {
        foreach (var (label, name) in new[] { ("P/F", ValueNames.PfRatio), ("Mean pressure", ValueNames.MeanAirwayPressureComputed) })
        {
            if (gas.Values[name] is { Value: null, Because: { } why })
            {
                yield return $"{label} at {part.Times.At(gas.Gas.At)}: {why}";
            }
        }
    }

    private static string Tension(string name, string? unit) => unit is null ? name : $"{name}\n{unit}";

    private static string Unit(TensionUnit? unit) => unit == TensionUnit.KPa ? "kPa" : "mmHg";
}
