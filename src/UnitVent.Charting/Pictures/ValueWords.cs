namespace UnitVent.Charting.Pictures;

/// <summary>How a value is called and how it is rounded when it is shown.</summary>
/// <param name="Name">Its name in the picture.</param>
/// <param name="Label">The trade's word.</param>
/// <param name="Decimals">How many decimals are shown.</param>
/// <param name="IsTension">Whether it is a gas tension, shown in the unit's own unit.</param>
public sealed record ValueWords(string Name, string Label, int Decimals, bool IsTension = false)
{
    /// <summary>The values in the groups in which they are read.</summary>
    public static IReadOnlyList<(string Title, IReadOnlyList<ValueWords> Values)> Groups { get; } =
    [
        ("Oxygenation",
        [
            new(ValueNames.PfRatio, "P/F", 0),
            new(ValueNames.OxygenationClass, "Oxygenation by the ARDS definition", 0),
            new(ValueNames.OxygenationIndex, "Oxygenation index", 1),
            new(ValueNames.SfRatio, "S/F", 0),
            new(ValueNames.ImputedPfRatio, "P/F imputed from S/F", 0),
            new(ValueNames.OxygenSaturationIndex, "Oxygen saturation index", 1),
            new(ValueNames.AlveolarPO2MmHg, "Alveolar PO2", 0, true),
            new(ValueNames.AlveolarArterialGradientMmHg, "A–a difference", 0, true),
            new(ValueNames.ArterialAlveolarRatio, "a/A ratio", 2),
            new(ValueNames.SaturationComputedPercent, "Saturation from PaO2", 1),
            new(ValueNames.OxygenContentMlDl, "Oxygen content", 1),
        ]),
        ("Ventilation and carbon dioxide",
        [
            new(ValueNames.VentilatoryRatio, "Ventilatory ratio", 2),
            new(ValueNames.ArterialEndTidalCO2GapMmHg, "PaCO2 − EtCO2", 0, true),
            new(ValueNames.BicarbonateComputedMmolL, "Bicarbonate, computed", 1),
            new(ValueNames.StandardBaseExcessMmolL, "Standard base excess", 1),
            new(ValueNames.BloodBaseExcessMmolL, "Base excess of blood", 1),
            new(ValueNames.StandardBicarbonateMmolL, "Standard bicarbonate", 1),
            new(ValueNames.AnionGapMmolL, "Anion gap", 0),
            new(ValueNames.GasConsistencyDeltaPH, "Gas against itself, ΔpH", 3),
        ]),
        ("Release mechanics",
        [
            new(ValueNames.MeanAirwayPressureComputed, "Mean airway pressure, computed", 1),
            new(ValueNames.MeanAirwayPressureMeasured, "Mean airway pressure, measured", 1),
            new(ValueNames.MeanAlveolarPressureCmH2O, "Mean alveolar pressure", 1),
            new(ValueNames.ReleaseRatePerMin, "Releases", 1),
            new(ValueNames.CycleTimeS, "Cycle", 1),
            new(ValueNames.TimeRatio, "T high : T low", 1),
            new(ValueNames.ShareAtPHighPercent, "Share of the cycle at P high", 0),
            new(ValueNames.EndReleaseFlowPercent, "End-release flow, % of peak", 0),
            new(ValueNames.ReleaseVolumePerKg, "Release volume per kg", 1),
            new(ValueNames.ExpiratoryTimeConstantS, "Expiratory time constant", 2),
            new(ValueNames.TLowFor75S, "T low that ends near 75 %", 2),
            new(ValueNames.TLowFor50S, "T low that ends near 50 %", 2),
            new(ValueNames.TLowFor25S, "T low that ends near 25 %", 2),
            new(ValueNames.EndReleaseAlveolarPressureCmH2O, "Alveolar pressure at the end of release", 1),
            new(ValueNames.EmptiedPercent, "Emptied in a release", 0),
            new(ValueNames.AlveolarSwingCmH2O, "Alveolar swing", 1),
            new(ValueNames.EffectiveCompliance, "Effective compliance", 0),
            new(ValueNames.EffectiveResistance, "Effective resistance", 0),
            new(ValueNames.PeakFlowModelLMin, "Peak flow of the model", 0),
        ]),
        ("Own breathing",
        [
            new(ValueNames.SpontaneousSharePercent, "Own share of minute volume", 0),
            new(ValueNames.SpontaneousMinuteVolumeLMin, "Own minute volume", 1),
            new(ValueNames.SpontaneousMinuteVolumeDerivedLMin, "Own minute volume, derived", 1),
            new(ValueNames.ReleaseMinuteVolumeLMin, "Release minute volume", 1),
            new(ValueNames.RapidShallowIndex, "Rate ÷ tidal volume", 0),
        ]),
        ("Conventional mechanics",
        [
            new(ValueNames.TidalVolumePerKg, "Tidal volume per kg", 1),
            new(ValueNames.DrivingPressureCmH2O, "Driving pressure", 0),
            new(ValueNames.StaticCompliance, "Static compliance", 0),
            new(ValueNames.MechanicalPowerJMin, "Mechanical power", 1),
        ]),
        ("Body and time",
        [
            new(ValueNames.PredictedBodyWeightKg, "Predicted body weight", 1),
            new(ValueNames.VentilatorDays, "Time on the ventilator", 1),
        ]),
    ];

    private static readonly Dictionary<string, ValueWords> ByName = Groups.SelectMany(g => g.Values).ToDictionary(v => v.Name);

    /// <summary>The words of a value; null when there is no value of that name.</summary>
    public static ValueWords? Of(string name) => ByName.GetValueOrDefault(name);
}
