using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover.Parts;

/// <summary>Why the patient is ventilated, for how long, and what changes how the numbers are read.</summary>
internal static class SummaryPart
{
    public static IEnumerable<Block> Of(SheetPart part) =>
    [
        new Heading("Summary"),
        new KeyValues(
        [
            new("Word", "not set this shift"),
            new("Reason", part.Now.Window.Episode.Reason ?? "not recorded"),
            new("Ventilated", Ventilated(part)),
            new("Body size", Size(part.Now)),
            new("Context", Context(part.Now)),
            new("Course", $"{Words.Spelled(part.Now.Phase)}, {(part.Now.Prone ? "prone" : "not prone")}"),
        ]),
    ];

    private static string Ventilated(SheetPart part) =>
        $"{Printed.Bare(part.Now[ValueNames.VentilatorDays]) ?? "not known:"} days, since {part.Times.OnDay(part.Now.Window.Episode.AirwaySecuredAt)}";

    private static string Size(PatientPicture now)
    {
        var patient = now.Window.Episode.Patient;
        var estimated = patient.HeightEstimated == true ? " (estimated)" : "";
        return patient.HeightCm is { } height
            ? $"{Printed.Typed(height, "cm")}{estimated}, PBW {Predicted(now)}"
            : $"height not recorded, PBW {Predicted(now)}";
    }

    private static string Predicted(PatientPicture now)
    {
        var weight = now[ValueNames.PredictedBodyWeightKg];
        return Printed.Bare(weight) is { } kilograms ? Printed.WithUnit(kilograms, weight.Unit) : Printed.Known(weight);
    }

    private static string Context(PatientPicture now)
    {
        var inForce = now.Context.Select(context => context.Body.Flag!.Value)
            .Where(circumstance => circumstance != Circumstance.DifficultAirway)
            .Select(Words.Of)
            .Concat(now.Ongoing.Order().Select(Words.Ongoing))
            .ToList();
        return inForce.Count > 0 ? string.Join(" · ", inForce) : "none recorded";
    }
}
