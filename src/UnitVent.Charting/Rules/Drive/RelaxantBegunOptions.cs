namespace UnitVent.Charting.Rules.Drive;

/// <summary>What follows a relaxant in APRV [common practice].</summary>
public sealed record RelaxantBegunOptions
{
    /// <summary>Gets the time within which a gas is due.</summary>
    [Threshold("time within which a gas is due", 0.5, 4, Unit = "h")]
    public double GasWithinHours { get; init; } = 1;
}
