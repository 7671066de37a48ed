using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Randomness;
using UnitVent.Simulation.Staff;

namespace UnitVent.Simulation.Demo;

/// <summary>Lives through a scenario once, from its start, and keeps what was recorded in a span of it.</summary>
internal sealed class EpisodeTeller
{
    private const int StepMin = 5;

    private readonly Scenario scenario;
    private readonly KeyedRandom random;
    private readonly Instant start;
    private readonly BedsideStaff staff;
    private readonly Func<int, IReadOnlyList<PlannedMoment>> planUntil;
    private readonly Func<PatientParameters, double, PatientParameters> unrest;
    private readonly VentilatedPatient patient;
    private int minute;

    /// <summary>Draws up a telling.</summary>
    /// <param name="scenario">The story.</param>
    /// <param name="random">The patient's own random numbers.</param>
    /// <param name="barometric">Around the bed.</param>
    /// <param name="start">When the story begins.</param>
    /// <param name="planUntil">When the staff comes, up to a minute.</param>
    /// <param name="unrest">What the slow wander makes of calm parameters at an hour; asked in order of time.</param>
    public EpisodeTeller(
        Scenario scenario, KeyedRandom random, BarometricPressure barometric, Instant start,
        Func<int, IReadOnlyList<PlannedMoment>> planUntil, Func<PatientParameters, double, PatientParameters> unrest)
    {
        (this.scenario, this.random, this.start) = (scenario, random, start);
        staff = new BedsideStaff(scenario, random);
        (this.planUntil, this.unrest) = (planUntil, unrest);
        var first = scenario.Script.Where(s => s.Kind == EntryKind.SettingChange).MinBy(s => s.Minute)!;
        patient = new VentilatedPatient(ParametersNow(), (SettingChange)first.EntryAt(start), barometric);
    }

    /// <summary>What was recorded from one instant to another, and before it the setting change that was then in force.</summary>
    public SimulatedEpisode Tell(Instant from, Instant until)
    {
        var kept = new List<SimulatedAction>();
        SimulatedAction? inForceBefore = null;
        foreach (var planned in planUntil((int)(until - start).TotalMinutes))
        {
            LiveUntil(planned.Minute);
            var at = start + Duration.FromMinutes(minute);
            var (recordedAt, changes) = (staff.RecordedAt(planned, at), Apply(planned, at));
            if (recordedAt > until || (recordedAt < from && !changes))
            {
                continue;
            }

            var action = staff.Record(planned, scenario.Repeat.StoryHour(minute / 60.0), Look(at));
            if (recordedAt < from)
            {
                inForceBefore = action;
            }
            else
            {
                kept.Add(action);
            }
        }

        IEnumerable<SimulatedAction> all = inForceBefore is null ? kept : kept.Prepend(inForceBefore);
        return new SimulatedEpisode(scenario.Patient.AdmittedAt(start, scenario.Bed, random), start, [.. all.OrderBy(a => a.RecordedAt)]);
    }

    private void LiveUntil(int next)
    {
        while (minute < next)
        {
            var step = Math.Min(StepMin, next - minute);
            patient.Advance(step);
            minute += step;
            patient.Parameters = ParametersNow();
        }
    }

    private bool Apply(PlannedMoment planned, Instant at)
    {
        if (planned is not PlannedMoment.Scripted { Entry: { Kind: EntryKind.SettingChange } change })
        {
            return false;
        }

        patient.Settings = (SettingChange)change.EntryAt(at);
        return true;
    }

    private BedsideMoment Look(Instant at) => new(
        at, patient.Observe(), patient.Parameters, patient.Settings, scenario.Bedside, new Instruments(random.For("instruments").For(minute)));

    private PatientParameters ParametersNow()
    {
        var hour = minute / 60.0;
        return unrest(scenario.Course.At(scenario.Lung, scenario.Repeat.StoryHour(hour)), hour);
    }
}
