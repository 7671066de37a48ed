namespace UnitVent.Charting.Pictures;

/// <summary>The equations behind the picture's values, by value name.</summary>
public static class Equations
{
    private const string Identity = "standard identity";

    private static readonly Dictionary<string, Equation> ByValue = new()
    {
        [ValueNames.PredictedBodyWeightKg] = new("A1", "male 50, female 45.5, + 0.91 × (height in cm − 152.4)", "N Engl J Med 2000;342:1301-1308"),
        [ValueNames.ReleaseVolumePerKg] = new("A2", "release volume ÷ predicted body weight", Identity),
        [ValueNames.TidalVolumePerKg] = new("A2", "tidal volume ÷ predicted body weight", Identity),
        [ValueNames.PfRatio] = new("A3", "PaO2 in mmHg ÷ FiO2", "JAMA 2012;307:2526-2533"),
        [ValueNames.SfRatio] = new("A4", "SpO2 in % ÷ FiO2, up to 97 %", "Chest 2007;132:410-417"),
        [ValueNames.ImputedPfRatio] = new("A4", "(S/F − 64) ÷ 0.84", "Chest 2007;132:410-417"),
        [ValueNames.OxygenationIndex] = new("A5", "100 × FiO2 × mean airway pressure ÷ PaO2", "Chest 2017;152:1151-1158"),
        [ValueNames.OxygenSaturationIndex] = new("A5", "100 × FiO2 × mean airway pressure ÷ SpO2, up to 97 %", "J Clin Med 2018;7:205"),
        [ValueNames.MeanAirwayPressureComputed] = new("A6, A7", "APRV: (P high × T high + P low × T low) ÷ (T high + T low)", Identity),
        [ValueNames.MeanAlveolarPressureCmH2O] = new("A15", "mean airway pressure + VE ÷ 60 × (R expiratory − R inspiratory)", "Crit Care Med 1992;20:1461-1472"),
        [ValueNames.CycleTimeS] = new("A9", "T high + T low", Identity),
        [ValueNames.ReleaseRatePerMin] = new("A9", "60 ÷ (T high + T low)", Identity),
        [ValueNames.TimeRatio] = new("A9", "T high ÷ T low", Identity),
        [ValueNames.ShareAtPHighPercent] = new("A9", "100 × T high ÷ (T high + T low)", Identity),
        [ValueNames.ReleaseMinuteVolumeLMin] = new("A10", "release volume × release rate", Identity),
        [ValueNames.SpontaneousMinuteVolumeDerivedLMin] = new("A10", "total minute volume − release minute volume", Identity),
        [ValueNames.SpontaneousMinuteVolumeLMin] = new("A10", "measured; without a measurement total − release minute volume", Identity),
        [ValueNames.SpontaneousSharePercent] = new("A10", "100 × own minute volume ÷ total minute volume", Identity),
        [ValueNames.EndReleaseFlowPercent] = new("A11", "100 × end-release flow ÷ peak expiratory flow", "Crit Care Med 2005;33:S228-S240"),
        [ValueNames.ExpiratoryTimeConstantS] = new("A12", "T low ÷ ln(peak flow ÷ end-release flow)", "single exponential; common practice"),
        [ValueNames.TLowFor75S] = new("A12", "time constant × ln(1 ÷ 0.75)", "single exponential; common practice"),
        [ValueNames.TLowFor50S] = new("A12", "time constant × ln(1 ÷ 0.50)", "single exponential; common practice"),
        [ValueNames.TLowFor25S] = new("A12", "time constant × ln(1 ÷ 0.25)", "single exponential; common practice"),
        [ValueNames.EndReleaseAlveolarPressureCmH2O] = new("A13", "P low + (P high − P low) × end-release share of peak flow", "Respir Res 2022;23:101"),
        [ValueNames.EmptiedPercent] = new("A13", "100 − end-release flow in % of peak", "Respir Res 2022;23:101"),
        [ValueNames.AlveolarSwingCmH2O] = new("A13", "(P high − P low) × (1 − end-release share of peak flow)", "Respir Res 2022;23:101"),
        [ValueNames.EffectiveCompliance] = new("A13", "release volume ÷ alveolar swing", "Respir Res 2022;23:101"),
        [ValueNames.EffectiveResistance] = new("A13", "time constant ÷ compliance", Identity),
        [ValueNames.PeakFlowModelLMin] = new("A13", "release volume ÷ (time constant × emptied share)", "single exponential; common practice"),
        [ValueNames.StaticCompliance] = new("A18", "tidal volume ÷ (plateau − total PEEP)", "N Engl J Med 2000;342:1301-1308"),
        [ValueNames.DrivingPressureCmH2O] = new("A18", "plateau − total PEEP", "N Engl J Med 2015;372:747-755"),
        [ValueNames.VentilatoryRatio] = new("A19", "minute volume in mL × PaCO2 ÷ (predicted body weight × 100 × 37.5)", "Am J Respir Crit Care Med 2019;199:333-341"),
        [ValueNames.AlveolarPO2MmHg] = new("A20", "FiO2 × (barometric pressure − 47) − PaCO2 × (FiO2 + (1 − FiO2) ÷ 0.8)", "alveolar gas equation, standard"),
        [ValueNames.AlveolarArterialGradientMmHg] = new("A20", "alveolar PO2 − PaO2", Identity),
        [ValueNames.ArterialAlveolarRatio] = new("A20", "PaO2 ÷ alveolar PO2", Identity),
        [ValueNames.BicarbonateComputedMmolL] = new("A22", "0.0307 × PaCO2 × 10^(pH − 6.105)", "CLSI C46 constants"),
        [ValueNames.GasConsistencyDeltaPH] = new("A22", "6.105 + log10(bicarbonate ÷ (0.0307 × PaCO2)) − pH", "CLSI C46 constants"),
        [ValueNames.StandardBaseExcessMmolL] = new("A23", "bicarbonate − 24.8 + 16.2 × (pH − 7.40)", "CLSI C46"),
        [ValueNames.BloodBaseExcessMmolL] = new("A23", "(1 − 0.014 Hb) × (bicarbonate − 24.8 + (1.43 Hb + 7.7) × (pH − 7.40))", "CLSI C46"),
        [ValueNames.StandardBicarbonateMmolL] = new("A23", "24.47 + 0.919 Z + Z a (Z − 8)", "CLSI C46 family"),
        [ValueNames.AnionGapMmolL] = new("A27", "sodium − chloride − bicarbonate", "from memory"),
        [ValueNames.SaturationComputedPercent] = new("A25", "1 ÷ (23400 ÷ (P³ + 150 P) + 1) at the virtual PO2", "J Appl Physiol 1979;46:599-602"),
        [ValueNames.OxygenContentMlDl] = new("A25", "1.34 × Hb × SaO2 + 0.0031 × PaO2", "from memory"),
        [ValueNames.RapidShallowIndex] = new("A29", "own rate ÷ own tidal volume in L", "N Engl J Med 1991;324:1445-1450"),
        [ValueNames.MechanicalPowerJMin] = new("A30", "0.098 × rate × volume × pressure", "Intensive Care Med 2016;42:1567-1575"),
        [ValueNames.ArterialEndTidalCO2GapMmHg] = new("A26", "PaCO2 − EtCO2", Identity),
        [ValueNames.VentilatorDays] = new("A31", "now − airway secured", Identity),
    };

    /// <summary>The equation behind a value; null for values that are read, not computed.</summary>
    public static Equation? Behind(string valueName) => ByValue.GetValueOrDefault(valueName);
}
