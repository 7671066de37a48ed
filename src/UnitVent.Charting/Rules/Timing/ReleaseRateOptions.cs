namespace UnitVent.Charting.Rules.Timing;

/// <summary>How many releases a minute are usual [common practice].</summary>
public sealed record ReleaseRateOptions
{
    /// <summary>Gets the fewest in the first 12 h.</summary>
    [Threshold("fewest in the first 12 h", 6, 12, Unit = "/min")]
    public double StartingFromPerMin { get; init; } = 10;

    /// <summary>Gets the fewest later on.</summary>
    [Threshold("fewest later on", 4, 10, Unit = "/min")]
    public double FromPerMin { get; init; } = 8;

    /// <summary>Gets the fewest in weaning.</summary>
    [Threshold("fewest in weaning", 1, 8, Unit = "/min")]
    public double WeaningFromPerMin { get; init; } = 4;

    /// <summary>Gets the most.</summary>
    [Threshold("most", 12, 20, Unit = "/min")]
    public double ToPerMin { get; init; } = 14;

    /// <summary>Gets the number above which it is a caution.</summary>
    [Threshold("number above which it is a caution", 15, 30, Unit = "/min")]
    public double CautionAbovePerMin { get; init; } = 20;

    /// <summary>Gets the number above which it is a caution when the flow trace guides.</summary>
    [Threshold("number above which it is a caution when the flow trace guides", 20, 40, Unit = "/min")]
    public double FlowGuidedCautionAbovePerMin { get; init; } = 30;
}
