using NodaTime;
using UnitVent.Physiology;
using UnitVent.Simulation.Demo;
using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation;

/// <summary>The invented unit: scenario files turned into consistent charting.</summary>
public static class DemoUnit
{
    private static readonly Duration Longest = Duration.FromDays(4);

    /// <summary>Creates the unit with what its staff recorded up to an instant.</summary>
    /// <remarks>
    /// <para>The same files, origin and end give the same entries with the same ids. A story is told once from the origin on and then repeats
    /// its last part for ever, and random numbers are looked up by minute, so that a later end gives the same entries and later ones:
    /// topping up is recording those that are not there yet.</para>
    /// <para>At most the last four days before the end are given, and before them each patient's setting change then in force, so that
    /// a unit that stood still for weeks goes on without weeks of catching up.</para>
    /// </remarks>
    /// <param name="seedFolder">The folder with <c>unit.json</c> and <c>patients</c>.</param>
    /// <param name="origin">When the unit began; its seconds are dropped.</param>
    /// <param name="until">The present; nothing recorded later is given.</param>
    /// <exception cref="InvalidDataException">A file cannot be read.</exception>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="until"/> lies before <paramref name="origin"/>.</exception>
    public static SimulatedUnit Create(string seedFolder, Instant origin, Instant until)
    {
        ArgumentOutOfRangeException.ThrowIfLessThan(until, origin);
        var unit = DemoFiles.Unit(seedFolder);
        var random = new KeyedRandom(unit.Seed);
        var barometric = BarometricPressure.FromAltitude(unit.AltitudeM);
        var start = Instant.FromUnixTimeSeconds(origin.ToUnixTimeSeconds() / 60 * 60);
        var from = Instant.Max(start, until - Longest);
        return new SimulatedUnit(
            unit.Code, unit.Name, unit.TimeZone, unit.AltitudeM, unit.Beds,
            [.. DemoFiles.Patients(seedFolder).Select(s => Teller(s, random.For(s.Patient.Mrn), barometric, start).Tell(from, until))]);
    }

    private static EpisodeTeller Teller(Scenario scenario, KeyedRandom random, BarometricPressure barometric, Instant start) =>
        new(scenario, random, barometric, start, new Plan(scenario, random).Until, new Unrest(random.For("unrest")).Of);
}
