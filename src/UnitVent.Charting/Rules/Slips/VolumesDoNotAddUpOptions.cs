namespace UnitVent.Charting.Rules.Slips;

/// <summary>When minute volume and its parts do not add up [common practice].</summary>
public sealed record VolumesDoNotAddUpOptions
{
    /// <summary>Gets by how much of the total the releases may exceed it.</summary>
    [Threshold("share of the total by which the releases may exceed it", 0.02, 0.2)]
    public double ReleasesMayExceed { get; init; } = 0.05;

    /// <summary>Gets how far the measured own minute volume may lie from the derived one.</summary>
    [Threshold("how far measured and derived own minute volume may differ", 0.5, 3, Unit = "L/min")]
    public double OwnMayDifferLMin { get; init; } = 1;

    /// <summary>Gets how far, as a share of the total.</summary>
    [Threshold("how far, as a share of the total", 0.05, 0.5)]
    public double OwnMayDifferShare { get; init; } = 0.20;
}
