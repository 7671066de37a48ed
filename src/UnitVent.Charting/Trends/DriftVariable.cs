namespace UnitVent.Charting.Trends;

/// <summary>A quantity whose drift is looked for.</summary>
/// <param name="Name">Its name as the HTTP interface spells it.</param>
/// <param name="Label">The trade's word.</param>
/// <param name="Unit">Its unit; empty for pure numbers.</param>
/// <param name="Worse">Which way it gets worse.</param>
/// <param name="TrendMinimum">The smallest change that matters over a series.</param>
/// <param name="StepMinimum">The smallest change that matters from one value to the next.</param>
/// <param name="Source">Where the two come from.</param>
public sealed record DriftVariable(
    string Name, string Label, string Unit, WorseWhen Worse, MinimumChange TrendMinimum, MinimumChange StepMinimum, string Source)
{
    /// <summary>Gets the normal value of a quantity that gets worse by leaving it.</summary>
    public double Normal { get; init; }

    /// <summary>How much worse a value is than another, in the unit of the quantity: below zero when it is better; the distance when neither way is worse.</summary>
    public double Worsening(double from, double to) => Worse switch
    {
        WorseWhen.Falling => from - to,
        WorseWhen.Rising => to - from,
        WorseWhen.LeavingNormal => Math.Abs(to - Normal) - Math.Abs(from - Normal),
        WorseWhen.Either => Math.Abs(to - from),
    };
}
