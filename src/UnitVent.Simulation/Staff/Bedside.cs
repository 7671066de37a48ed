using UnitVent.Charting.Entries;

namespace UnitVent.Simulation.Staff;

/// <summary>What is seen at a bedside and does not come from the lung.</summary>
public sealed record Bedside
{
    public required AirwayKind Airway { get; init; }

    public required decimal TubeSizeMm { get; init; }

    public required decimal TubeDepthCm { get; init; }

    public required string TubeFixedAt { get; init; }

    public required Humidifier Humidifier { get; init; }

    public required Effort Effort { get; init; }

    public required Cough Cough { get; init; }

    public required Secretions Secretions { get; init; }

    public required Vasopressor Vasopressor { get; init; }

    /// <summary>An inspiratory hold is done at each check; only in patients who do not breathe themselves.</summary>
    public bool PlateauMeasured { get; init; }

    public string ArterialSite { get; init; } = "radial line";
}
