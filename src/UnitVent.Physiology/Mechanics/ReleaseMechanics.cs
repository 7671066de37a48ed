namespace UnitVent.Physiology;

/// <summary>Estimates of lung mechanics from one passive release and its termination ratio r, in [0, 1).</summary>
/// <remarks><para>Model and limits as for <see cref="ExpiratoryTimeConstant"/>; the lung is taken to start at P high
/// (otherwise <see cref="IncompleteRefilling"/>). Every result is an estimate and never a plateau pressure.</para>
/// <para>Source: one-compartment model; formulas of this family followed simulated driving pressure in
/// Mistry S, et al. Respir Res 2022;23:101.</para></remarks>
public static class ReleaseMechanics
{
    private const double HighestComplianceMlPerCmH2O = 500; // what a Compliance holds
    private const double HighestFlowLitresPerMinute = 300; // what a GasFlow holds

    /// <summary>Computes the alveolar pressure at the end of the release: P low + (P high − P low) × r.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="high"/> is not above <paramref name="low"/>, or
    /// <paramref name="ratio"/> is NaN or outside [0, 1).</exception>
    public static AirwayPressure EndReleaseAlveolarPressure(AirwayPressure high, AirwayPressure low, double ratio)
        => AirwayPressure.FromCmH2O(low.CmH2O + (PressureStep.CmH2O(high, low) * Defined(ratio)));

    /// <summary>Computes the part of the releasable volume that left, 1 − r, in percent.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="ratio"/> is NaN or outside [0, 1).</exception>
    public static double EmptiedPercent(double ratio) => 100 * (1 - Defined(ratio));

    /// <summary>Computes the swing of alveolar pressure, an estimate of driving pressure: (P high − P low) × (1 − r).</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="EndReleaseAlveolarPressure"/>.</exception>
    public static AirwayPressure AlveolarSwing(AirwayPressure high, AirwayPressure low, double ratio)
        => AirwayPressure.FromCmH2O(PressureStep.CmH2O(high, low) * (1 - Defined(ratio)));

    /// <summary>Says whether <see cref="EffectiveCompliance"/> gives a value, that is one in (0, 500] mL/cmH2O.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="EndReleaseAlveolarPressure"/>.</exception>
    public static bool CanEstimateCompliance(GasVolume release, AirwayPressure high, AirwayPressure low, double ratio)
        => release != default && MlPerCmH2O(release, high, low, ratio) <= HighestComplianceMlPerCmH2O;

    /// <summary>Computes release volume / alveolar swing.</summary>
    /// <exception cref="ArgumentOutOfRangeException">As for <see cref="EndReleaseAlveolarPressure"/>, or see
    /// <see cref="CanEstimateCompliance"/>.</exception>
    public static Compliance EffectiveCompliance(GasVolume release, AirwayPressure high, AirwayPressure low, double ratio)
        => Compliance.FromMlPerCmH2O(MlPerCmH2O(release, high, low, ratio));

    /// <summary>Computes the resistance of airways, tube and valve: tau / C.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="compliance"/> is its default, 0, or the result
    /// exceeds 20 000 cmH2O·s/L.</exception>
    public static Resistance EffectiveResistance(BreathTime tau, Compliance compliance)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(compliance, default);

        return Resistance.FromCmH2OSecondsPerLitre(tau.Seconds / (compliance.MlPerCmH2O / 1000));
    }

    /// <summary>Says whether <see cref="ModelPeakFlow"/> gives a value: a tau above 0 s and a flow of at most 300 L/min.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="ratio"/> is NaN or outside [0, 1).</exception>
    public static bool CanModelPeakFlow(GasVolume release, BreathTime tau, double ratio)
        => PeakLitresPerMinute(release, tau, ratio) <= HighestFlowLitresPerMinute;

    /// <summary>Computes the peak flow the model implies, to be held against the one read: volume / [tau × (1 − r)].</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="ratio"/> is NaN or outside [0, 1), or see
    /// <see cref="CanModelPeakFlow"/>.</exception>
    public static GasFlow ModelPeakFlow(GasVolume release, BreathTime tau, double ratio)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(tau, default);

        return GasFlow.FromLitresPerMinute(PeakLitresPerMinute(release, tau, ratio));
    }

    private static double Defined(double ratio) => Guard.InRange(ratio, 0, Guard.JustBelowOne);

    private static double MlPerCmH2O(GasVolume release, AirwayPressure high, AirwayPressure low, double ratio)
        => release.Millilitres / AlveolarSwing(high, low, ratio).CmH2O;

    private static double PeakLitresPerMinute(GasVolume release, BreathTime tau, double ratio)
        => 60 * release.Litres / (tau.Seconds * (1 - Defined(ratio)));
}
