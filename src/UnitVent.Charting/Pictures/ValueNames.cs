namespace UnitVent.Charting.Pictures;

/// <summary>The names of the picture's values as the HTTP interface spells them.</summary>
public static class ValueNames
{
    /// <summary>predicted Body Weight Kg.</summary>
    public const string PredictedBodyWeightKg = "predictedBodyWeightKg";

    /// <summary>release Volume Per Kg.</summary>
    public const string ReleaseVolumePerKg = "releaseVolumePerKg";

    /// <summary>tidal Volume Per Kg.</summary>
    public const string TidalVolumePerKg = "tidalVolumePerKg";

    /// <summary>pf Ratio.</summary>
    public const string PfRatio = "pfRatio";

    /// <summary>sf Ratio.</summary>
    public const string SfRatio = "sfRatio";

    /// <summary>imputed Pf Ratio.</summary>
    public const string ImputedPfRatio = "imputedPfRatio";

    /// <summary>oxygenation Index.</summary>
    public const string OxygenationIndex = "oxygenationIndex";

    /// <summary>oxygen Saturation Index.</summary>
    public const string OxygenSaturationIndex = "oxygenSaturationIndex";

    /// <summary>mean Airway Pressure Computed.</summary>
    public const string MeanAirwayPressureComputed = "meanAirwayPressureComputed";

    /// <summary>mean Airway Pressure Measured.</summary>
    public const string MeanAirwayPressureMeasured = "meanAirwayPressureMeasured";

    /// <summary>mean Alveolar Pressure Cm H2O.</summary>
    public const string MeanAlveolarPressureCmH2O = "meanAlveolarPressureCmH2O";

    /// <summary>cycle Time S.</summary>
    public const string CycleTimeS = "cycleTimeS";

    /// <summary>release Rate Per Min.</summary>
    public const string ReleaseRatePerMin = "releaseRatePerMin";

    /// <summary>time Ratio.</summary>
    public const string TimeRatio = "timeRatio";

    /// <summary>share At PHigh Percent.</summary>
    public const string ShareAtPHighPercent = "shareAtPHighPercent";

    /// <summary>release Minute Volume LMin.</summary>
    public const string ReleaseMinuteVolumeLMin = "releaseMinuteVolumeLMin";

    /// <summary>spontaneous Minute Volume LMin.</summary>
    public const string SpontaneousMinuteVolumeLMin = "spontaneousMinuteVolumeLMin";

    /// <summary>spontaneous Minute Volume Derived LMin.</summary>
    public const string SpontaneousMinuteVolumeDerivedLMin = "spontaneousMinuteVolumeDerivedLMin";

    /// <summary>spontaneous Share Percent.</summary>
    public const string SpontaneousSharePercent = "spontaneousSharePercent";

    /// <summary>end Release Flow Percent.</summary>
    public const string EndReleaseFlowPercent = "endReleaseFlowPercent";

    /// <summary>expiratory Time Constant S.</summary>
    public const string ExpiratoryTimeConstantS = "expiratoryTimeConstantS";

    /// <summary>t Low For75S.</summary>
    public const string TLowFor75S = "tLowFor75S";

    /// <summary>t Low For50S.</summary>
    public const string TLowFor50S = "tLowFor50S";

    /// <summary>t Low For25S.</summary>
    public const string TLowFor25S = "tLowFor25S";

    /// <summary>end Release Alveolar Pressure Cm H2O.</summary>
    public const string EndReleaseAlveolarPressureCmH2O = "endReleaseAlveolarPressureCmH2O";

    /// <summary>emptied Percent.</summary>
    public const string EmptiedPercent = "emptiedPercent";

    /// <summary>effective Compliance.</summary>
    public const string EffectiveCompliance = "effectiveCompliance";

    /// <summary>effective Resistance.</summary>
    public const string EffectiveResistance = "effectiveResistance";

    /// <summary>peak Flow Model LMin.</summary>
    public const string PeakFlowModelLMin = "peakFlowModelLMin";

    /// <summary>alveolar Swing Cm H2O.</summary>
    public const string AlveolarSwingCmH2O = "alveolarSwingCmH2O";

    /// <summary>static Compliance.</summary>
    public const string StaticCompliance = "staticCompliance";

    /// <summary>driving Pressure Cm H2O.</summary>
    public const string DrivingPressureCmH2O = "drivingPressureCmH2O";

    /// <summary>ventilatory Ratio.</summary>
    public const string VentilatoryRatio = "ventilatoryRatio";

    /// <summary>alveolar PO2Mm Hg.</summary>
    public const string AlveolarPO2MmHg = "alveolarPO2MmHg";

    /// <summary>alveolar Arterial Gradient Mm Hg.</summary>
    public const string AlveolarArterialGradientMmHg = "alveolarArterialGradientMmHg";

    /// <summary>arterial Alveolar Ratio.</summary>
    public const string ArterialAlveolarRatio = "arterialAlveolarRatio";

    /// <summary>bicarbonate Computed Mmol L.</summary>
    public const string BicarbonateComputedMmolL = "bicarbonateComputedMmolL";

    /// <summary>standard Bicarbonate Mmol L.</summary>
    public const string StandardBicarbonateMmolL = "standardBicarbonateMmolL";

    /// <summary>blood Base Excess Mmol L.</summary>
    public const string BloodBaseExcessMmolL = "bloodBaseExcessMmolL";

    /// <summary>standard Base Excess Mmol L.</summary>
    public const string StandardBaseExcessMmolL = "standardBaseExcessMmolL";

    /// <summary>anion Gap Mmol L.</summary>
    public const string AnionGapMmolL = "anionGapMmolL";

    /// <summary>gas Consistency Delta PH.</summary>
    public const string GasConsistencyDeltaPH = "gasConsistencyDeltaPH";

    /// <summary>saturation Computed Percent.</summary>
    public const string SaturationComputedPercent = "saturationComputedPercent";

    /// <summary>oxygen Content Ml Dl.</summary>
    public const string OxygenContentMlDl = "oxygenContentMlDl";

    /// <summary>rapid Shallow Index.</summary>
    public const string RapidShallowIndex = "rapidShallowIndex";

    /// <summary>mechanical Power JMin.</summary>
    public const string MechanicalPowerJMin = "mechanicalPowerJMin";

    /// <summary>arterial End Tidal CO2Gap Mm Hg.</summary>
    public const string ArterialEndTidalCO2GapMmHg = "arterialEndTidalCO2GapMmHg";

    /// <summary>oxygenation class.</summary>
    public const string OxygenationClass = "oxygenationClass";

    /// <summary>ventilator Days.</summary>
    public const string VentilatorDays = "ventilatorDays";
}
