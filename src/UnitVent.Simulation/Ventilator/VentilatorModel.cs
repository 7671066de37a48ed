using UnitVent.Charting.Entries;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Ventilator;

/// <summary>What settings do with a lung: one compartment, square pressures or constant flow.</summary>
public static class VentilatorModel
{
    public static Delivered Deliver(SettingChange settings, PatientParameters patient, OwnBreathing own) => settings.Mode switch
    {
        VentilationMode.Aprv => PressureRelease.Deliver(settings, patient, own),
        VentilationMode.PressureControl => PressureControl.Deliver(settings, patient, own),
        VentilationMode.VolumeControl => VolumeControl.Deliver(settings, patient, own),
        VentilationMode.PressureSupport => PressureSupport.Deliver(settings, patient, own),
        _ => throw new NotSupportedException($"There is no model of {settings.Mode}."),
    };
}
