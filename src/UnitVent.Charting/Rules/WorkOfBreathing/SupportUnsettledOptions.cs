namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>When breathing on pressure support counts as unsettled [common practice where no source is printed].</summary>
public sealed record SupportUnsettledOptions
{
    /// <summary>Gets the rate above which it is unsettled.</summary>
    [Threshold("rate above which it is unsettled", 25, 50, Unit = "/min")]
    public double RateAbovePerMin { get; init; } = 35;

    /// <summary>Gets the tidal volume under which it is unsettled.</summary>
    [Threshold("tidal volume under which it is unsettled", 2, 6, Unit = "mL/kg")]
    public double VolumeUnderMlPerKg { get; init; } = 4;

    /// <summary>Gets the ratio of rate and tidal volume above which it is unsettled.</summary>
    [Threshold("rate by tidal volume above which it is unsettled", 80, 150, Unit = "/min/L", Source = "N Engl J Med 1991;324:1445-1450")]
    public double RapidShallowAbove { get; init; } = 105;

    /// <summary>Gets how long after the mode began a reading does not count.</summary>
    [Threshold("how long after the mode began a reading does not count", 0, 60, Unit = "min")]
    public double SettlesMinutes { get; init; } = 10;
}
