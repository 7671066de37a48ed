namespace UnitVent.Charting.Projections;

/// <summary>What follows from settings that are considered: never an advice.</summary>
/// <param name="Now">The releases under the settings in force.</param>
/// <param name="Then">The releases under the settings considered.</param>
/// <param name="PaCO2">Where PaCO2 would go; null exactly when there are refusals.</param>
/// <param name="HeldMean">What T high would keep the mean pressure at the P high considered.</param>
/// <param name="StepDown">Stages from the settings in force, those first.</param>
/// <param name="Assumptions">What is taken to be so, one sentence each.</param>
/// <param name="Refusals">Why nothing is said of volumes and PaCO2, one sentence each.</param>
public sealed record Projection(
    ProjectedRelease Now,
    ProjectedRelease Then,
    ProjectedPaCO2? PaCO2,
    HeldMean HeldMean,
    IReadOnlyList<StepDownSetting> StepDown,
    IReadOnlyList<string> Assumptions,
    IReadOnlyList<string> Refusals);

/// <summary>Releases under one set of settings; what needs the model of the lung is null when that is refused.</summary>
/// <param name="MeanAirwayPressureCmH2O">Mean airway pressure from the settings.</param>
/// <param name="ReleaseRatePerMin">Releases a minute.</param>
/// <param name="ReleaseVolumeMl">Release volume.</param>
/// <param name="EndReleaseFlowPercent">End-release flow in % of peak.</param>
/// <param name="AlveolarVentilationLMin">Ventilation beyond the dead space, releases and own breaths together.</param>
public sealed record ProjectedRelease(
    double MeanAirwayPressureCmH2O, double ReleaseRatePerMin, double? ReleaseVolumeMl, double? EndReleaseFlowPercent, double? AlveolarVentilationLMin);

/// <summary>Where PaCO2 would go.</summary>
/// <param name="NowMmHg">PaCO2 of the gas.</param>
/// <param name="ExpectedMmHg">With the dead space as assumed.</param>
/// <param name="LowestMmHg">The lowest with 0.7 to 1.3 times that dead space.</param>
/// <param name="HighestMmHg">The highest of the same.</param>
/// <param name="WithoutOwnBreathsMmHg">If the own breaths stopped as well; null when that alone would be too large a change.</param>
/// <param name="Says">The same in words; no direction is claimed below 5 mmHg.</param>
public sealed record ProjectedPaCO2(double NowMmHg, double ExpectedMmHg, double LowestMmHg, double HighestMmHg, double? WithoutOwnBreathsMmHg, string Says);

/// <summary>The T high that would keep the mean airway pressure at the P high considered.</summary>
/// <param name="MeanAirwayPressureCmH2O">The mean pressure to keep.</param>
/// <param name="THighS">T high; null when none keeps it within the limits.</param>
/// <param name="Says">The same in words.</param>
public sealed record HeldMean(double MeanAirwayPressureCmH2O, double? THighS, string Says);

/// <summary>One stage of a stepwise reduction; P low and T low stay.</summary>
/// <param name="PHighCmH2O">P high.</param>
/// <param name="THighS">T high.</param>
/// <param name="MeanAirwayPressureCmH2O">Mean airway pressure.</param>
/// <param name="ReleaseRatePerMin">Releases a minute.</param>
public sealed record StepDownSetting(double PHighCmH2O, double THighS, double MeanAirwayPressureCmH2O, double ReleaseRatePerMin);
