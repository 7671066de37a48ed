using UnitVent.Charting.Entries;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Ventilator;

/// <summary>Pressure support: every breath is the patient's own, lifted by the set pressure.</summary>
/// <remarks>One compartment filled by support and muscles together for a third of the cycle [common practice], never longer than 1.2 s.</remarks>
internal static class PressureSupport
{
    private const double InspiratoryShare = 1.0 / 3;
    private const double LongestInspirationS = 1.2;
    private const double SlowestPerMin = 4; // an apnoea backup is not modelled

    public static Delivered Deliver(SettingChange settings, PatientParameters patient, OwnBreathing own)
    {
        var (peep, support) = ((double)settings.PeepCmH2O!, (double)settings.PressureSupportCmH2O!);
        var rate = Math.Max(SlowestPerMin, own.RatePerMin);
        var inspiratory = Math.Min(LongestInspirationS, InspiratoryShare * 60 / rate);
        var filled = 1 - Math.Exp(-inspiratory * 1000 / (patient.InspiratoryResistanceCmH2OSPerL * patient.ComplianceMlPerCmH2O));
        return new Delivered
        {
            MeanPressureCmH2O = peep + (support * inspiratory * rate / 60),
            PeakPressureCmH2O = peep + support,
            MachineRatePerMin = 0,
            MachineVolumeMl = 0,
            OwnRatePerMin = rate,
            OwnVolumeMl = patient.ComplianceMlPerCmH2O * (support + own.MusclePressureCmH2O) * filled,
            TrappedPressureCmH2O = 0,
        };
    }
}
