namespace UnitVent.Charting.Trends;

/// <summary>The smallest change of a quantity that matters: in its unit, as a share of where it stood, or by the two together.</summary>
public sealed record MinimumChange
{
    private readonly double units;
    private readonly double share;
    private readonly Func<double, double, double> pick;

    private MinimumChange(double units, double share, Func<double, double, double> pick) => (this.units, this.share, this.pick) = (units, share, pick);

    /// <summary>So much in the unit of the quantity, above zero.</summary>
    public static MinimumChange InUnits(double units) => Both(units, 0);

    /// <summary>Such a share of where it stood, above zero: 0.15 is 15 %.</summary>
    public static MinimumChange OfShare(double share) => Both(0, share);

    /// <summary>Both must be reached.</summary>
    public static MinimumChange Both(double units, double share) => new(units, share, Math.Max);

    /// <summary>One of the two is enough.</summary>
    public static MinimumChange Either(double units, double share) => new(units, share, Math.Min);

    /// <summary>The change that matters from a starting value on, in the unit of the quantity, zero or more.</summary>
    /// <param name="start">Where the quantity stood.</param>
    public double From(double start) => pick(units, share * Math.Abs(start));
}
