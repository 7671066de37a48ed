using UnitVent.Simulation.Ventilator;

namespace UnitVent.Simulation.Lung;

/// <summary>What of the minute volume reaches alveoli that meet blood.</summary>
public static class AlveolarVentilation
{
    public static double LitresPerMinute(Delivered delivered, PatientParameters patient) =>
        (1 - patient.AlveolarDeadSpaceFraction)
        * ((delivered.MachineRatePerMin * Beyond(delivered.MachineVolumeMl, patient)) + (delivered.OwnRatePerMin * Beyond(delivered.OwnVolumeMl, patient)))
        / 1000;

    private static double Beyond(double volumeMl, PatientParameters patient) => Math.Max(0, volumeMl - patient.AirwayDeadSpaceMl);
}
