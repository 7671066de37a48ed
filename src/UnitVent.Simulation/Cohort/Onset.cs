using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Demo;

namespace UnitVent.Simulation.Cohort;

/// <summary>When what was planted matters: the model without wander and without measurement says.</summary>
internal static class Onset
{
    private const int StepMin = 5;

    /// <summary>The hour at which the truth passes the minimum important change; null when it never does.</summary>
    public static double? HourOf(CohortPatient patient, PlantedKind kind, BarometricPressure barometric)
    {
        var scenario = patient.Scenario;
        var truth = new VentilatedPatient(scenario.Lung, SettingsAt(scenario, 0), barometric);
        var before = TrueValues.Of(truth);
        for (var hour = patient.PlantedHour; hour < CohortPatient.Hours; hour += StepMin / 60.0)
        {
            (truth.Parameters, truth.Settings) = (scenario.Course.At(scenario.Lung, hour), SettingsAt(scenario, hour));
            if (kind.Passed(before, TrueValues.Of(truth)))
            {
                return hour;
            }

            truth.Advance(StepMin);
        }

        return null;
    }

    private static SettingChange SettingsAt(Scenario scenario, double hour) =>
        (SettingChange)scenario.Script.Last(s => s.Minute <= hour * 60 + 0.5).EntryAt(default);
}
