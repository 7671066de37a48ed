using UnitVent.Charting.Pictures;

namespace UnitVent.Web.Bedside;

/// <summary>How a computed value is called, rounded and made, in words.</summary>
/// <param name="Name">Its name in the picture.</param>
/// <param name="Label">The trade's word.</param>
/// <param name="Decimals">How many decimals are shown.</param>
/// <param name="Formula">The formula in words.</param>
/// <param name="IsTension">Whether it is a gas tension, shown in the unit's own unit.</param>
public sealed record ValueWords(string Name, string Label, int Decimals, string Formula, bool IsTension = false)
{
    /// <summary>The values in the groups in which they are read.</summary>
    public static IReadOnlyList<(string Title, IReadOnlyList<ValueWords> Values)> Groups { get; } =
    [
        ("Oxygenation",
        [
            new(ValueNames.PfRatio, "P/F", 0, "PaO2 ÷ FiO2 at the draw"),
            new(ValueNames.OxygenationIndex, "Oxygenation index", 1, "100 × FiO2 × mean airway pressure ÷ PaO2"),
            new(ValueNames.SfRatio, "S/F", 0, "SpO2 ÷ FiO2"),
            new(ValueNames.ImputedPfRatio, "P/F imputed from S/F", 0, "(S/F − 64) ÷ 0.84"),
            new(ValueNames.OxygenSaturationIndex, "Oxygen saturation index", 1, "100 × FiO2 × mean airway pressure ÷ SpO2"),
            new(ValueNames.AlveolarPO2MmHg, "Alveolar PO2", 0, "FiO2 × (barometric pressure − 47) − PaCO2 × (FiO2 + (1 − FiO2) ÷ 0.8)", true),
            new(ValueNames.AlveolarArterialGradientMmHg, "A–a difference", 0, "alveolar PO2 − PaO2", true),
            new(ValueNames.ArterialAlveolarRatio, "a/A ratio", 2, "PaO2 ÷ alveolar PO2"),
            new(ValueNames.SaturationComputedPercent, "Saturation from PaO2", 1, "standard dissociation curve at the PaO2 corrected for pH and PaCO2"),
            new(ValueNames.OxygenContentMlDl, "Oxygen content", 1, "1.34 × haemoglobin × saturation + 0.0031 × PaO2"),
        ]),
        ("Ventilation and carbon dioxide",
        [
            new(ValueNames.VentilatoryRatio, "Ventilatory ratio", 2, "minute volume × PaCO2 ÷ (predicted weight × 100 × 37.5)"),
            new(ValueNames.ArterialEndTidalCO2GapMmHg, "PaCO2 − EtCO2", 0, "PaCO2 − end-tidal CO2", true),
            new(ValueNames.BicarbonateComputedMmolL, "Bicarbonate, computed", 1, "0.0307 × PaCO2 × 10^(pH − 6.105)"),
            new(ValueNames.StandardBaseExcessMmolL, "Standard base excess", 1, "bicarbonate − 24.8 + 16.2 × (pH − 7.40)"),
            new(ValueNames.BloodBaseExcessMmolL, "Base excess of blood", 1, "(1 − 0.014 × Hb) × (bicarbonate − 24.8 + (1.43 × Hb + 7.7) × (pH − 7.40))"),
            new(ValueNames.StandardBicarbonateMmolL, "Standard bicarbonate", 1, "from base excess, haemoglobin and saturation"),
            new(ValueNames.AnionGapMmolL, "Anion gap", 0, "sodium − chloride − bicarbonate"),
            new(ValueNames.GasConsistencyDeltaPH, "Gas against itself, ΔpH", 3, "pH from PaCO2 and the printed bicarbonate − printed pH"),
        ]),
        ("Release mechanics",
        [
            new(ValueNames.MeanAirwayPressureComputed, "Mean airway pressure, computed", 1, "pressure weighted by time over one cycle"),
            new(ValueNames.MeanAirwayPressureMeasured, "Mean airway pressure, measured", 1, ""),
            new(ValueNames.MeanAlveolarPressureCmH2O, "Mean alveolar pressure", 1, "mean airway pressure + minute volume × (expiratory − inspiratory resistance)"),
            new(ValueNames.ReleaseRatePerMin, "Releases", 1, "60 ÷ (T high + T low)"),
            new(ValueNames.CycleTimeS, "Cycle", 1, "T high + T low"),
            new(ValueNames.TimeRatio, "T high : T low", 1, "T high ÷ T low"),
            new(ValueNames.ShareAtPHighPercent, "Share of the cycle at P high", 0, "100 × T high ÷ (T high + T low)"),
            new(ValueNames.EndReleaseFlowPercent, "End-release flow, % of peak", 0, "100 × end-release flow ÷ peak expiratory flow"),
            new(ValueNames.ReleaseVolumePerKg, "Release volume per kg", 1, "release volume ÷ predicted body weight"),
            new(ValueNames.ExpiratoryTimeConstantS, "Expiratory time constant", 2, "T low ÷ ln(peak flow ÷ end-release flow)"),
            new(ValueNames.TLowFor75S, "T low that ends near 75 %", 2, "time constant × 0.288"),
            new(ValueNames.TLowFor50S, "T low that ends near 50 %", 2, "time constant × 0.693"),
            new(ValueNames.TLowFor25S, "T low that ends near 25 %", 2, "time constant × 1.386"),
            new(ValueNames.EndReleaseAlveolarPressureCmH2O, "Alveolar pressure at the end of release", 1, "P low + (P high − P low) × share of peak flow"),
            new(ValueNames.EmptiedPercent, "Emptied in a release", 0, "100 × (1 − share of peak flow)"),
            new(ValueNames.AlveolarSwingCmH2O, "Alveolar swing", 1, "(P high − P low) × (1 − share of peak flow)"),
            new(ValueNames.EffectiveCompliance, "Effective compliance", 0, "release volume ÷ alveolar swing"),
            new(ValueNames.EffectiveResistance, "Effective resistance", 0, "time constant ÷ compliance"),
            new(ValueNames.PeakFlowModelLMin, "Peak flow of the model", 0, "release volume ÷ (time constant × (1 − share of peak flow))"),
        ]),
        ("Own breathing",
        [
            new(ValueNames.SpontaneousSharePercent, "Own share of minute volume", 0, "100 × own minute volume ÷ total minute volume"),
            new(ValueNames.SpontaneousMinuteVolumeLMin, "Own minute volume", 1, "measured, or total − release minute volume"),
            new(ValueNames.SpontaneousMinuteVolumeDerivedLMin, "Own minute volume, derived", 1, "total minute volume − release minute volume"),
            new(ValueNames.ReleaseMinuteVolumeLMin, "Release minute volume", 1, "release volume × releases per minute"),
            new(ValueNames.RapidShallowIndex, "Rate ÷ tidal volume", 0, "own rate ÷ own tidal volume in litres"),
        ]),
        ("Conventional mechanics",
        [
            new(ValueNames.TidalVolumePerKg, "Tidal volume per kg", 1, "exhaled tidal volume ÷ predicted body weight"),
            new(ValueNames.DrivingPressureCmH2O, "Driving pressure", 0, "plateau − total PEEP"),
            new(ValueNames.StaticCompliance, "Static compliance", 0, "tidal volume ÷ (plateau − total PEEP)"),
            new(ValueNames.MechanicalPowerJMin, "Mechanical power", 1, "0.098 × rate × tidal volume × pressure, by the short form of the mode"),
        ]),
    ];

    private static readonly Dictionary<string, ValueWords> ByName = Groups.SelectMany(g => g.Values).ToDictionary(v => v.Name);

    public static ValueWords? Of(string name) => ByName.GetValueOrDefault(name);
}
