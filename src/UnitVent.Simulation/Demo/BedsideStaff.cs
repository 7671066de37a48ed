using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Simulation.Randomness;
using UnitVent.Simulation.Staff;

namespace UnitVent.Simulation.Demo;

/// <summary>Turns what is planned and seen at a bed into what is recorded.</summary>
internal sealed class BedsideStaff(Scenario scenario, KeyedRandom random)
{
    public SimulatedAction Record(PlannedMoment planned, double storyHour, BedsideMoment seen)
    {
        var recordedAt = RecordedAt(planned, seen.At);
        var role = RoleOf(planned);
        var key = random.For("ids").For(planned.GetType().Name).For(planned.Minute).For((planned as PlannedMoment.Scripted)?.Index ?? 0);
        var entries = Bodies(planned, storyHour, seen).Select((body, i) =>
            new NewEntry(SeededId.At(recordedAt, key.For(i)), body) { Confirmed = Confirmations.Of(body, recordedAt) });
        return new SimulatedAction(seen.At, recordedAt, StaffMember.NameOf(role), role, [.. entries]);
    }

    /// <summary>A gas takes its way to the analyser, a round the time of typing; a bed kept on paper is typed late.</summary>
    public Instant RecordedAt(PlannedMoment planned, Instant at)
    {
        var (least, spread) = planned switch
        {
            PlannedMoment.Gas => (7, 5),
            PlannedMoment.Round => (2, 4),
            _ => (1, 2),
        };
        var typing = least + (int)(spread * random.For("typing").Uniform(planned.Minute));
        var late = planned.Minute >= scenario.Charting.TypedLateFromHour * 60 ? scenario.Charting.MinutesTypedLate : 0;
        return at + Duration.FromMinutes(typing + late);
    }

    private static UnitRoleName RoleOf(PlannedMoment planned) => planned switch
    {
        PlannedMoment.Scripted scripted => scripted.Entry.By,
        PlannedMoment.Gas => UnitRoleName.Nurse,
        _ => UnitRoleName.Therapist,
    };

    private IEnumerable<Entry> Bodies(PlannedMoment planned, double storyHour, BedsideMoment seen) => planned switch
    {
        PlannedMoment.Scripted scripted => [scripted.Entry.EntryAt(seen.At)],
        PlannedMoment.Gas => [Gas(storyHour, seen)],
        PlannedMoment.Round round => Round(round, seen),
        _ => throw new NotSupportedException($"{planned.GetType().Name} is not done by the staff."),
    };

    private BloodGas Gas(double storyHour, BedsideMoment seen)
    {
        var gas = GasSlip.Of(seen, scenario.Charting.PHDecimals, SampleNumber(seen.At));
        var slip = scenario.Slips.FirstOrDefault(s => storyHour >= s.FromHour && storyHour < s.ToHour);
        return slip is null ? gas : gas with { BicarbonateMmolL = gas.BicarbonateMmolL + slip.OffMmolL };
    }

    private string SampleNumber(Instant at) => $"{scenario.Patient.Mrn}-{at.ToUnixTimeSeconds() / 60}";

    private static IEnumerable<Entry> Round(PlannedMoment.Round round, BedsideMoment seen)
    {
        yield return VentilatorReading.Of(seen);
        yield return BreathingReading.Of(seen);
        if (round.WithAirway)
        {
            yield return AirwayReading.Of(seen);
        }

        if (round.WithSuction)
        {
            yield return new BedsideEvent { At = seen.At, What = EventKind.Suction };
        }
    }
}
