namespace UnitVent.Simulation.Demo;

/// <summary>The unit's file.</summary>
internal sealed record UnitFile
{
    public required string Code { get; init; }

    public required string Name { get; init; }

    public required string TimeZone { get; init; }

    public required double AltitudeM { get; init; }

    public required IReadOnlyList<string> Beds { get; init; }

    public required ulong Seed { get; init; }
}
