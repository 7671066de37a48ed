namespace UnitVent.Simulation.Ventilator;

/// <summary>What a ventilator and the patient's own breaths bring about together, each breath like the next.</summary>
public sealed record Delivered
{
    public required double MeanPressureCmH2O { get; init; }

    public required double PeakPressureCmH2O { get; init; }

    /// <summary>Releases, or breaths that the ventilator delivers.</summary>
    public required double MachineRatePerMin { get; init; }

    public required double MachineVolumeMl { get; init; }

    public double OwnRatePerMin { get; init; }

    public double OwnVolumeMl { get; init; }

    /// <summary>What a hold at the end of inspiration would show; none where a release has no such end.</summary>
    public double? PlateauPressureCmH2O { get; init; }

    /// <summary>What stays in the alveoli above the lower pressure.</summary>
    public required double TrappedPressureCmH2O { get; init; }

    public double? PeakExpiratoryFlowLMin { get; init; }

    public double? EndReleaseFlowLMin { get; init; }

    public double MachineMinuteVolumeLMin => MachineRatePerMin * MachineVolumeMl / 1000;

    public double OwnMinuteVolumeLMin => OwnRatePerMin * OwnVolumeMl / 1000;

    public double TotalMinuteVolumeLMin => MachineMinuteVolumeLMin + OwnMinuteVolumeLMin;

    public double TotalRatePerMin => MachineRatePerMin + OwnRatePerMin;
}
