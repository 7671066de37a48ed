using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Staff;

namespace UnitVent.Simulation.Demo;

/// <summary>One invented patient's file: who, what the lung is like, what happens when, how it is charted. Hours count from the start of the unit.</summary>
internal sealed record Scenario
{
    /// <summary>What a reader of the board should find, in one sentence.</summary>
    public required string Story { get; init; }

    public required string Bed { get; init; }

    public required ScenarioPatient Patient { get; init; }

    public required PatientParameters Lung { get; init; }

    public Course Course { get; init; } = new();

    public required Bedside Bedside { get; init; }

    public required ChartingHabits Charting { get; init; }

    public required IReadOnlyList<ScriptedEntry> Script { get; init; }

    public IReadOnlyList<BicarbonateSlip> Slips { get; init; } = [];

    public required Repetition Repeat { get; init; }
}
