namespace UnitVent.Charting.Rules.Slips;

/// <summary>When PaO2 and the oximeter do not fit together [common practice].</summary>
public sealed record OxygenDoesNotFitOptions
{
    /// <summary>Gets how far the oximeter may lie from the saturation computed from PaO2.</summary>
    [Threshold("how far SpO2 may lie from the saturation computed from PaO2", 3, 10, Unit = "points")]
    public double MayDifferPoints { get; init; } = 5;

    /// <summary>Gets the lowest SpO2 at which the two are compared.</summary>
    [Threshold("lowest SpO2 at which the two are compared", 80, 94, Unit = "%")]
    public double FromSpO2Percent { get; init; } = 90;

    /// <summary>Gets the highest SpO2 at which the two are compared.</summary>
    [Threshold("highest SpO2 at which the two are compared", 95, 99, Unit = "%")]
    public double ToSpO2Percent { get; init; } = 97;

    /// <summary>Gets how far the two readings may lie apart.</summary>
    [Threshold("how far the two readings may lie apart", 5, 30, Unit = "min")]
    public double WithinMinutes { get; init; } = 15;
}
