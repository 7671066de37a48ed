using UnitVent.Charting.Entries;

namespace UnitVent.Simulation.Staff;

/// <summary>Looks at tube, cuff and humidifier.</summary>
internal static class AirwayReading
{
    public static AirwayCheck Of(BedsideMoment moment) => new()
    {
        ObservedAt = moment.At,
        Airway = moment.Bedside.Airway,
        SizeMm = moment.Bedside.TubeSizeMm,
        DepthCm = moment.Bedside.TubeDepthCm,
        CuffPressureCmH2O = Typed.Number(moment.Read.Shifted("cuff", 26, 1.2)),
        SkinIntact = true,
        Humidifier = moment.Bedside.Humidifier,
        TubeFixedAt = moment.Bedside.TubeFixedAt,
    };
}
