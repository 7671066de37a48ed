using UnitVent.Charting.Entries;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Tests;

/// <summary>A patient and settings to start from; a test says what it changes.</summary>
internal static class Given
{
    public static PatientParameters Patient { get; } = new()
    {
        ComplianceMlPerCmH2O = 40,
        InspiratoryResistanceCmH2OSPerL = 12,
        ExpiratoryResistanceCmH2OSPerL = 24,
        AnatomicalDeadSpaceMl = 100,
        ApparatusDeadSpaceMl = 50,
        AlveolarDeadSpaceFraction = 0.1,
        ShuntFraction = 0.25,
        CarbonDioxideOutputMlMin = 190,
        CardiacOutputLMin = 5.5,
        HaemoglobinGDl = 10.5,
        StandardBaseExcessMmolL = 0,
        Drive = 0,
        OwnRatePerMin = 10,
        OwnVolumeMl = 250,
        OwnRatePerMmHg = 0.3,
        CarbonDioxideSetPointMmHg = 42,
        MusclePressureCmH2O = 2,
        MeanArterialPressureMmHg = 78,
        LactateMmolL = 1,
        Rass = -2,
    };

    public static SettingChange Aprv { get; } = new()
    {
        Mode = VentilationMode.Aprv,
        FiO2 = 0.50m,
        PHighCmH2O = 26,
        PLowCmH2O = 0,
        THighS = 5.0m,
        TLowS = 0.5m,
    };

    public static SettingChange PressureControl { get; } = new()
    {
        Mode = VentilationMode.PressureControl,
        FiO2 = 0.50m,
        SetRatePerMin = 20,
        InspiratoryPressureAbovePeepCmH2O = 14,
        InspiratoryTimeS = 1.0m,
        PeepCmH2O = 10,
    };

    public static SettingChange VolumeControl { get; } = new()
    {
        Mode = VentilationMode.VolumeControl,
        FiO2 = 0.50m,
        SetRatePerMin = 20,
        TidalVolumeMl = 400,
        InspiratoryTimeS = 1.0m,
        PauseTimeS = 0.2m,
        PeepCmH2O = 10,
    };

    public static SettingChange PressureSupport { get; } = new()
    {
        Mode = VentilationMode.PressureSupport,
        FiO2 = 0.40m,
        PressureSupportCmH2O = 10,
        PeepCmH2O = 8,
    };
}
