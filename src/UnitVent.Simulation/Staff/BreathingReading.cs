using UnitVent.Charting.Entries;

namespace UnitVent.Simulation.Staff;

/// <summary>Looks at the patient: sedation, effort, own breaths.</summary>
internal static class BreathingReading
{
    private const double NoBreathsBelowPerMin = 0.5;

    public static BreathingCheck Of(BedsideMoment moment)
    {
        var (bedside, read) = (moment.Bedside, moment.Read);
        var own = moment.State.Delivered.OwnRatePerMin;
        var breathes = own >= NoBreathsBelowPerMin;
        return new BreathingCheck
        {
            ObservedAt = moment.At,
            Rass = (int)Math.Round(moment.Patient.Rass, MidpointRounding.AwayFromZero),
            Effort = breathes ? bedside.Effort : Effort.None,
            AccessoryMuscles = breathes && bedside.Effort == Effort.Strong,
            Comfort = Comfort.Comfortable,
            Relaxant = Relaxant.None,
            Cough = bedside.Cough,
            Secretions = bedside.Secretions,
            SpontaneousRatePerMin = Typed.Number(read.Rate("own rate", own)),
            SpO2Percent = Typed.Number(read.SpO2(moment.State.SaO2Percent)),
        };
    }
}
