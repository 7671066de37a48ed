namespace UnitVent.Charting.Rules.Drive;

/// <summary>When the patient's own share of minute ventilation counts as low [common practice].</summary>
public sealed record OwnShareLowOptions
{
    /// <summary>Gets the share under which it is low.</summary>
    [Threshold("own share under which it is low", 2, 20, Unit = "%")]
    public double UnderPercent { get; init; } = 10;

    /// <summary>Gets how long checks have to show it.</summary>
    [Threshold("how long checks have to show it", 2, 12, Unit = "h")]
    public double ForHours { get; init; } = 4;

    /// <summary>Gets the fall against the 12 h before that makes it a caution.</summary>
    [Threshold("fall against the 12 h before that makes it a caution", 10, 40, Unit = "points")]
    public double LostPoints { get; init; } = 15;

    /// <summary>Gets how long it is not judged after APRV began.</summary>
    [Threshold("how long it is not judged after APRV began", 0, 48, Unit = "h")]
    public double NotBeforeHours { get; init; } = 12;
}
