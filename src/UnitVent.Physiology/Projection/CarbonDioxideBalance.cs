namespace UnitVent.Physiology;

/// <summary>Alveolar ventilation before and after a change for one assumed dead space, and the PaCO2 that follows.</summary>
internal sealed class CarbonDioxideBalance
{
    private const double LowestVentilationRatio = 0.5;
    private const double HighestVentilationRatio = 2;
    private const double LowestPaCO2MmHg = 15;
    private const double HighestPaCO2MmHg = 150;

    private readonly double paCO2MmHg;
    private readonly double smallestBeyondDeadSpaceMl;
    private readonly double releasesAfter;

    public CarbonDioxideBalance(ReleaseReading present, AprvSettings planned, GasVolume plannedVolume, double deadSpaceFactor)
    {
        var deadSpaceMl = present.DeadSpace.Millilitres * deadSpaceFactor;
        var ownDeadSpace = present.OwnRate.PerMinute * deadSpaceMl / 1000;
        var own = Math.Max(present.OwnVentilation.LitresPerMinute - ownDeadSpace, 0);
        paCO2MmHg = present.PaCO2.MmHg;
        smallestBeyondDeadSpaceMl = Math.Min(present.Volume.Millilitres, plannedVolume.Millilitres) - deadSpaceMl;
        releasesAfter = Releases(planned, plannedVolume, deadSpaceMl);
        Before = Releases(present.Settings, present.Volume, deadSpaceMl) + own;
        After = releasesAfter + own;
    }

    /// <summary>Gets the present alveolar ventilation in L/min.</summary>
    public double Before { get; }

    /// <summary>Gets the alveolar ventilation after the change in L/min.</summary>
    public double After { get; }

    public PartialPressure PaCO2 => PartialPressure.FromMmHg(MmHgAt(After));

    public PartialPressure? PaCO2WithoutOwnBreaths
        => RefusalsAt(releasesAfter).Any() ? null : PartialPressure.FromMmHg(MmHgAt(releasesAfter));

    /// <summary>Gives the reasons why there is no answer; the last two presuppose that gas reaches the alveoli at all.</summary>
    public IEnumerable<ProjectionRefusal> Refusals() => smallestBeyondDeadSpaceMl > 0 ? RefusalsAt(After) : [ProjectionRefusal.DeadSpace];

    private static double Releases(AprvSettings settings, GasVolume volume, double deadSpaceMl)
        => ReleaseCycle.Rate(settings.TimeHigh, settings.TimeLow).PerMinute * (volume.Millilitres - deadSpaceMl) / 1000;

    private double MmHgAt(double after) => paCO2MmHg * Before / after;

    private IEnumerable<ProjectionRefusal> RefusalsAt(double after)
    {
        if (!Guard.IsWithin(after / Before, LowestVentilationRatio, HighestVentilationRatio))
        {
            yield return ProjectionRefusal.AlveolarVentilation;
        }

        if (!Guard.IsWithin(MmHgAt(after), LowestPaCO2MmHg, HighestPaCO2MmHg))
        {
            yield return ProjectionRefusal.PaCO2;
        }
    }
}
