namespace UnitVent.Physiology.Tests;

/// <summary>Short names for unit types, so that a row of numbers reads like the line it was taken from.</summary>
internal static class Given
{
    public static AirwayPressure CmH2O(double value) => AirwayPressure.FromCmH2O(value);

    public static PartialPressure MmHg(double value) => PartialPressure.FromMmHg(value);

    public static BreathTime Seconds(double value) => BreathTime.FromSeconds(value);

    public static GasVolume Ml(double value) => GasVolume.FromMillilitres(value);

    public static GasFlow FlowLMin(double value) => GasFlow.FromLitresPerMinute(value);

    public static MinuteVentilation LMin(double value) => MinuteVentilation.FromLitresPerMinute(value);

    public static BreathRate PerMin(double value) => BreathRate.FromPerMinute(value);

    public static BodyMass Kg(double value) => BodyMass.FromKilograms(value);

    public static BodyHeight Cm(double value) => BodyHeight.FromCentimetres(value);

    public static OxygenFraction FiO2(double value) => OxygenFraction.FromFraction(value);

    public static Saturation SatPercent(double value) => Saturation.FromPercent(value);

    public static Compliance MlPerCmH2O(double value) => Compliance.FromMlPerCmH2O(value);

    public static Resistance CmH2OSPerL(double value) => Resistance.FromCmH2OSecondsPerLitre(value);

    public static HaemoglobinConcentration GPerDl(double value) => HaemoglobinConcentration.FromGramsPerDecilitre(value);

    public static Bicarbonate MmolPerL(double value) => Bicarbonate.FromMmolPerLitre(value);

    public static BloodPH Ph(double value) => BloodPH.FromPH(value);
}
