namespace UnitVent.Simulation.Demo;

/// <summary>A time of the story in which bicarbonate is typed wrongly.</summary>
internal sealed record BicarbonateSlip
{
    public required double FromHour { get; init; }

    public required double ToHour { get; init; }

    public required decimal OffMmolL { get; init; }
}
