namespace UnitVent.Simulation.Demo;

/// <summary>What the staff does at a minute of the unit's life.</summary>
internal abstract record PlannedMoment(int Minute)
{
    /// <summary>The script says so.</summary>
    public sealed record Scripted(int Minute, int Index, ScriptedEntry Entry) : PlannedMoment(Minute);

    /// <summary>A gas is drawn.</summary>
    public sealed record Gas(int Minute) : PlannedMoment(Minute);

    /// <summary>Ventilator and patient are looked at.</summary>
    public sealed record Round(int Minute, bool WithAirway = false, bool WithSuction = false) : PlannedMoment(Minute);
}
