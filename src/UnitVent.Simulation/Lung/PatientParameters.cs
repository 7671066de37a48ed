namespace UnitVent.Simulation.Lung;

/// <summary>What a simulated patient is like at one moment.</summary>
public sealed record PatientParameters
{
    public required double ComplianceMlPerCmH2O { get; init; }

    public required double InspiratoryResistanceCmH2OSPerL { get; init; }

    /// <summary>Includes tube and valve, as the release sees them.</summary>
    public required double ExpiratoryResistanceCmH2OSPerL { get; init; }

    public required double AnatomicalDeadSpaceMl { get; init; }

    public required double ApparatusDeadSpaceMl { get; init; }

    /// <summary>Share of the gas beyond the airways that meets no blood.</summary>
    public required double AlveolarDeadSpaceFraction { get; init; }

    /// <summary>Share of the cardiac output that passes no ventilated alveolus.</summary>
    public required double ShuntFraction { get; init; }

    public required double CarbonDioxideOutputMlMin { get; init; }

    public required double CardiacOutputLMin { get; init; }

    public required double HaemoglobinGDl { get; init; }

    public required double StandardBaseExcessMmolL { get; init; }

    /// <summary>0 with no drive of their own, 1 as rested and awake.</summary>
    public required double Drive { get; init; }

    public required double OwnRatePerMin { get; init; }

    public required double OwnVolumeMl { get; init; }

    /// <summary>How much faster the patient breathes for each mmHg of PaCO2 above the set point.</summary>
    public required double OwnRatePerMmHg { get; init; }

    public required double CarbonDioxideSetPointMmHg { get; init; }

    /// <summary>What the muscles add to a supported breath.</summary>
    public required double MusclePressureCmH2O { get; init; }

    public required double MeanArterialPressureMmHg { get; init; }

    public required double LactateMmolL { get; init; }

    /// <summary>Richmond agitation–sedation score, before rounding.</summary>
    public required double Rass { get; init; }

    public double AirwayDeadSpaceMl => AnatomicalDeadSpaceMl + ApparatusDeadSpaceMl;
}
