namespace UnitVent.Physiology;

/// <summary>What a change of APRV pressures or times would do to release volume, mean pressure and PaCO2: a what-if, never an advice.</summary>
/// <remarks><para>The present releases give time constant and compliance, these the new release volume C × swing. Alveolar ventilation
/// VA = releases × (volume − dead space) + own ventilation − own rate × dead space, and PaCO2' = PaCO2 × VA / VA'. Own breaths smaller
/// than the dead space move no alveolar gas, and take none away.</para>
/// <para>Where T high is shorter than four time constants, before or after, <see cref="IncompleteRefilling"/> stands for both states:
/// so no change leaves PaCO2 as it is, and crossing that limit is not answered by a change of formula.</para>
/// <para>Taken to be constant: carbon dioxide output, dead space of a breath, compliance and time constant (no recruitment, no
/// collapse), own breathing. A new balance needs up to an hour. Gas mixed out at P high is ignored: the direction is more reliable
/// than the size. Not for obstruction, an air leak, extracorporeal support, or a change of sedation, relaxation or position since the
/// gas; these are for the caller to know.</para>
/// <para>Source: one-compartment model, Burke WC, et al. J Appl Physiol 1993;74:922-933; PaCO2 inversely as alveolar ventilation is
/// standard physiology; the limits that refuse are common practice.</para></remarks>
public static class AprvProjection
{
    private const double LowestRatio = 0.05;
    private const double HighestRatio = 0.90;
    private const double LargestPressureStepChange = 0.30;
    private const double LargestTimeLowChange = 0.50;
    private const double LowestMlPerCmH2O = 5;
    private const double HighestMlPerCmH2O = 150;
    private const double SmallerDeadSpace = 0.7;
    private const double LargerDeadSpace = 1.3;

    /// <summary>Projects the change, or gives the reasons why the numbers do not allow it.</summary>
    /// <remarks>Reasons that need the time constant, and those that need the compliance, are told only when these can be trusted.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">P high is not above P low, a time is 0 s, a cycle is outside [0.4, 60] s, the
    /// release volume or PaCO2 is 0, or a derived quantity leaves the range of its type (above all 60 s, 5000 mL, 60 L/min).</exception>
    public static ProjectionAnswer Project(ReleaseReading present, AprvSettings planned)
    {
        ArgumentNullException.ThrowIfNull(present);
        ArgumentOutOfRangeException.ThrowIfEqual(present.Volume, default, nameof(present));
        ArgumentOutOfRangeException.ThrowIfEqual(present.PaCO2, default, nameof(present));
        _ = ReleaseCycle.Rate(present.Settings.TimeHigh, present.Settings.TimeLow);
        _ = ReleaseCycle.Rate(planned.TimeHigh, planned.TimeLow);

        var refusals = SizeRefusals(present, planned).ToList();
        if (refusals.Count > 0)
        {
            return new(refusals);
        }

        var model = new ReleaseModel(present, planned);
        return Guard.IsWithin(model.MlPerCmH2O, LowestMlPerCmH2O, HighestMlPerCmH2O)
            ? Weigh(present, planned, model)
            : new([ProjectionRefusal.Compliance]);
    }

    private static IEnumerable<ProjectionRefusal> SizeRefusals(ReleaseReading present, AprvSettings planned)
    {
        if (!Guard.IsWithin(present.TerminationRatio, LowestRatio, HighestRatio))
        {
            yield return ProjectionRefusal.TerminationRatio;
        }

        if (present.OwnVentilation != default && present.OwnRate == default)
        {
            yield return ProjectionRefusal.OwnRate;
        }

        var stepNow = PressureStep.CmH2O(present.Settings.High, present.Settings.Low, nameof(present));
        if (ChangesBeyond(LargestPressureStepChange, stepNow, PressureStep.CmH2O(planned.High, planned.Low, nameof(planned))))
        {
            yield return ProjectionRefusal.PressureStep;
        }

        if (ChangesBeyond(LargestTimeLowChange, present.Settings.TimeLow.Seconds, planned.TimeLow.Seconds))
        {
            yield return ProjectionRefusal.TimeLow;
        }
    }

    private static bool ChangesBeyond(double share, double now, double then) => !Guard.IsWithin(then / now, 1 - share, 1 + share);

    private static ProjectionAnswer Weigh(ReleaseReading present, AprvSettings planned, ReleaseModel model)
    {
        var volume = model.Volume(planned);
        var balance = new CarbonDioxideBalance(present, planned, volume, 1);
        var smaller = new CarbonDioxideBalance(present, planned, volume, SmallerDeadSpace);
        var larger = new CarbonDioxideBalance(present, planned, volume, LargerDeadSpace);
        var refusals = balance.Refusals().ToList();
        if (refusals.Count > 0)
        {
            return new(refusals);
        }

        if (smaller.Refusals().Concat(larger.Refusals()).Any())
        {
            return new([ProjectionRefusal.DeadSpaceBand]);
        }

        return new(new ProjectedChange(
            model.Tau,
            Compliance.FromMlPerCmH2O(model.MlPerCmH2O),
            State(present.Settings, present.Volume, present.TerminationRatio, balance.Before),
            State(planned, volume, model.TerminationRatio(planned), balance.After),
            Band(balance, smaller, larger)));
    }

    private static ReleaseState State(AprvSettings settings, GasVolume volume, double ratio, double alveolarLitresPerMinute)
        => new(
            volume,
            ReleaseCycle.Rate(settings.TimeHigh, settings.TimeLow),
            MeanAirwayPressure.Aprv(settings.High, settings.Low, settings.TimeHigh, settings.TimeLow),
            ratio,
            MinuteVentilation.FromLitresPerMinute(alveolarLitresPerMinute));

    private static PaCO2Band Band(CarbonDioxideBalance expected, CarbonDioxideBalance smaller, CarbonDioxideBalance larger)
    {
        double[] mmHg = [smaller.PaCO2.MmHg, expected.PaCO2.MmHg, larger.PaCO2.MmHg];
        return new(
            expected.PaCO2,
            PartialPressure.FromMmHg(mmHg.Min()),
            PartialPressure.FromMmHg(mmHg.Max()),
            expected.PaCO2WithoutOwnBreaths);
    }
}
