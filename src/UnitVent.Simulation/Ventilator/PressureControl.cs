using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Ventilator;

/// <summary>Pressure control; a patient who breathes faster than the set rate triggers breaths like the set ones.</summary>
internal static class PressureControl
{
    public static Delivered Deliver(SettingChange settings, PatientParameters patient, OwnBreathing own)
    {
        var (peep, above) = ((double)settings.PeepCmH2O!, (double)settings.InspiratoryPressureAbovePeepCmH2O!);
        var inspiratory = (double)settings.InspiratoryTimeS!;
        var rate = Math.Max((double)settings.SetRatePerMin!, own.RatePerMin);
        var lung = new TwoPressures(patient, peep + above, peep, inspiratory, (60 / rate) - inspiratory);
        return new Delivered
        {
            MeanPressureCmH2O = MeanAirwayPressure.PressureControl(
                AirwayPressure.FromCmH2O(peep), AirwayPressure.FromCmH2O(above), BreathTime.FromSeconds(inspiratory),
                BreathRate.FromPerMinute(rate), BreathTime.FromSeconds((double)(settings.RiseTimeS ?? 0))).CmH2O,
            PeakPressureCmH2O = peep + above,
            MachineRatePerMin = rate,
            MachineVolumeMl = lung.VolumeMl,
            PlateauPressureCmH2O = lung.FullCmH2O,
            TrappedPressureCmH2O = lung.TrappedCmH2O,
        };
    }
}
