namespace UnitVent.Charting.Pictures;

/// <summary>What the chart looks like. Nothing follows from it until a person confirms it.</summary>
/// <param name="Value">What is proposed.</param>
/// <param name="Because">What in the chart speaks for it.</param>
public sealed record Proposal<T>(T Value, string Because)
    where T : struct, Enum;
