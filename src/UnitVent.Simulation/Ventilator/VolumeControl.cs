using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Ventilator;

/// <summary>Volume control with constant flow; a patient who breathes faster than the set rate triggers breaths like the set ones.</summary>
internal static class VolumeControl
{
    public static Delivered Deliver(SettingChange settings, PatientParameters patient, OwnBreathing own)
    {
        var (peep, volume) = ((double)settings.PeepCmH2O!, (double)settings.TidalVolumeMl!);
        var pause = (double)(settings.PauseTimeS ?? 0);
        var flowTime = (double)settings.InspiratoryTimeS! - pause;
        var rate = Math.Max((double)settings.SetRatePerMin!, own.RatePerMin);
        var trapped = Trapped(patient, volume, (60 / rate) - flowTime - pause);
        var plateau = peep + trapped + (volume / patient.ComplianceMlPerCmH2O);
        var peak = plateau + (patient.InspiratoryResistanceCmH2OSPerL * volume / 1000 / flowTime);
        return new Delivered
        {
            MeanPressureCmH2O = MeanAirwayPressure.VolumeControl(
                AirwayPressure.FromCmH2O(peak), AirwayPressure.FromCmH2O(plateau), AirwayPressure.FromCmH2O(peep),
                BreathTime.FromSeconds(flowTime), BreathTime.FromSeconds(pause), BreathRate.FromPerMinute(rate)).CmH2O,
            PeakPressureCmH2O = peak,
            MachineRatePerMin = rate,
            MachineVolumeMl = volume,
            PlateauPressureCmH2O = plateau,
            TrappedPressureCmH2O = trapped,
        };
    }

    /// <summary>In the steady state what is trapped decays from (trapped + V/C) back to itself: V/C × b / (1 − b), b = exp(−TE / τ).</summary>
    private static double Trapped(PatientParameters patient, double volumeMl, double expiratoryS)
    {
        var b = Math.Exp(-expiratoryS * 1000 / (patient.ExpiratoryResistanceCmH2OSPerL * patient.ComplianceMlPerCmH2O));
        return volumeMl / patient.ComplianceMlPerCmH2O * b / (1 - b);
    }
}
