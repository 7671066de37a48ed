using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Ventilator;

/// <summary>Airway pressure release ventilation; the patient's own breaths ride on P high.</summary>
internal static class PressureRelease
{
    public static Delivered Deliver(SettingChange settings, PatientParameters patient, OwnBreathing own)
    {
        var (high, low) = ((double)settings.PHighCmH2O!, (double)settings.PLowCmH2O!);
        var (timeHigh, timeLow) = ((double)settings.THighS!, (double)settings.TLowS!);
        var lung = new TwoPressures(patient, high, low, timeHigh, timeLow);
        return new Delivered
        {
            MeanPressureCmH2O = MeanAirwayPressure.Aprv(
                AirwayPressure.FromCmH2O(high), AirwayPressure.FromCmH2O(low), BreathTime.FromSeconds(timeHigh), BreathTime.FromSeconds(timeLow)).CmH2O,
            PeakPressureCmH2O = high,
            MachineRatePerMin = 60 / (timeHigh + timeLow),
            MachineVolumeMl = lung.VolumeMl,
            OwnRatePerMin = own.RatePerMin,
            OwnVolumeMl = own.VolumeMl,
            TrappedPressureCmH2O = lung.TrappedCmH2O,
            PeakExpiratoryFlowLMin = lung.PeakFlowLMin,
            EndReleaseFlowLMin = lung.PeakFlowLMin * lung.EndOfPeak,
        };
    }
}
