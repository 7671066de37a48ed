namespace UnitVent.Physiology;

/// <summary>The stages of a stepwise reduction: P high a step lower each time, T high a stretch longer.</summary>
/// <remarks><para>Usual are 1–2 cmH2O and 0.5 s for each cmH2O (common practice); 2–3 cmH2O and 0.5–2 s are in Habashi NM. Crit Care
/// Med 2005;33(3 Suppl):S228-S240 (from memory). The stretch slows the loss of mean pressure, it does not prevent it.</para>
/// <para>The schedule ends with the last stage that has at least 5 releases a minute (<see cref="MeanPressureTrade.IsWithinLimits"/>)
/// and a P high above P low. A published-style table from 28 cmH2O runs one stage further, to 12 cmH2O, 12.5 s and 4.6 a minute; there
/// the limit is kept and not the table, since what follows so few releases is CPAP, chosen at the bedside, and not one more stage.</para>
/// <para>Arithmetic only: it does not know whether a stage is tolerated, and says nothing of carbon dioxide.</para></remarks>
public static class StepDownSchedule
{
    private const double SmallestStepCmH2O = 0.5;
    private const double LargestStepCmH2O = 5;

    /// <summary>Lists the stages, the present settings first whether or not they keep to the limits.</summary>
    /// <param name="present">The settings to start from.</param>
    /// <param name="step">How much lower P high is at each stage, in [0.5, 5] cmH2O.</param>
    /// <param name="stretch">How much longer T high is at each stage; may be 0 s.</param>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="step"/> is outside its range, or <paramref name="present"/> has
    /// P high not above P low, a time of 0 s, or a cycle outside [0.4, 60] s.</exception>
    public static IReadOnlyList<StepDownStage> From(AprvSettings present, AirwayPressure step, BreathTime stretch)
    {
        Guard.InRange(step.CmH2O, SmallestStepCmH2O, LargestStepCmH2O, nameof(step));

        var stages = new List<StepDownStage> { Stage(present) };
        var high = present.High.CmH2O - step.CmH2O;
        var timeHigh = present.TimeHigh.Seconds + stretch.Seconds;
        while (high > present.Low.CmH2O + Guard.Rounding && MeanPressureTrade.KeepsRate(timeHigh + present.TimeLow.Seconds))
        {
            stages.Add(Stage(present with { High = AirwayPressure.FromCmH2O(high), TimeHigh = BreathTime.FromSeconds(timeHigh) }));
            high -= step.CmH2O;
            timeHigh += stretch.Seconds;
        }

        return stages;
    }

    private static StepDownStage Stage(AprvSettings settings)
        => new(
            settings.High,
            settings.TimeHigh,
            MeanAirwayPressure.Aprv(settings.High, settings.Low, settings.TimeHigh, settings.TimeLow),
            ReleaseCycle.Rate(settings.TimeHigh, settings.TimeLow));
}
