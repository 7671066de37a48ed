namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>When a venous pH counts as very low [common practice].</summary>
public sealed record VenousPHOptions
{
    /// <summary>Gets the venous pH under which it is a caution.</summary>
    [Threshold("venous pH under which it is a caution", 7.10, 7.30)]
    public double CautionUnder { get; init; } = 7.20;
}
