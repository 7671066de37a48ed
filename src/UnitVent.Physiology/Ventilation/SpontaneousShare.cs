namespace UnitVent.Physiology;

/// <summary>The patient's own part of the minute ventilation, derived by subtraction.</summary>
/// <param name="Spontaneous">Minute ventilation by the patient's own breaths.</param>
/// <param name="SharePercent">Its share of the total, in [0, 100] percent.</param>
/// <param name="WithinMeasurementError">True when the release part came out up to 5 % above the total and 0 is shown instead.</param>
public readonly record struct SpontaneousShare(MinuteVentilation Spontaneous, double SharePercent, bool WithinMeasurementError);
