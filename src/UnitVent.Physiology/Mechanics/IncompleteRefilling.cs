namespace UnitVent.Physiology;

/// <summary>The steady state when T high is too short for the lung to refill to P high.</summary>
/// <remarks><para>With a = exp(−T high / tau inspiratory) and b = exp(−T low / tau expiratory). When only one time constant
/// is known it stands for both.</para>
/// <para>Source: pressure-controlled one-compartment model, Burke WC, et al. J Appl Physiol 1993;74:922-933.</para></remarks>
public static class IncompleteRefilling
{
    private const double TimeConstantsToRefill = 4;

    /// <summary>Says whether T high is shorter than four time constants, so that the simple form no longer holds.</summary>
    public static bool Needed(BreathTime timeHigh, BreathTime tau) => timeHigh.Seconds < TimeConstantsToRefill * tau.Seconds;

    /// <summary>Computes the release volume: C × (P high − P low) × (1 − a)(1 − b) / (1 − ab).</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="compliance"/> or a time is 0, <paramref name="high"/> is
    /// not above <paramref name="low"/>, or the result exceeds 5000 mL.</exception>
    public static GasVolume ReleaseVolume(
        Compliance compliance,
        AirwayPressure high,
        AirwayPressure low,
        BreathTime timeHigh,
        BreathTime timeLow,
        BreathTime tauInspiratory,
        BreathTime tauExpiratory)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(compliance, default);
        var step = PressureStep.CmH2O(high, low);
        var a = Decay(timeHigh, tauInspiratory);
        var b = Decay(timeLow, tauExpiratory);

        return GasVolume.FromMillilitres(compliance.MlPerCmH2O * step * (1 - a) * (1 - b) / (1 - (a * b)));
    }

    /// <summary>Computes the alveolar pressure above P low at the end of the release: (P high − P low) × (1 − a) b / (1 − ab).</summary>
    /// <exception cref="ArgumentOutOfRangeException">A time is 0 s, or <paramref name="high"/> is not above <paramref name="low"/>.</exception>
    public static AirwayPressure TrappedPressure(
        AirwayPressure high,
        AirwayPressure low,
        BreathTime timeHigh,
        BreathTime timeLow,
        BreathTime tauInspiratory,
        BreathTime tauExpiratory)
    {
        var step = PressureStep.CmH2O(high, low);
        var a = Decay(timeHigh, tauInspiratory);
        var b = Decay(timeLow, tauExpiratory);

        return AirwayPressure.FromCmH2O(step * (1 - a) * b / (1 - (a * b)));
    }

    private static double Decay(BreathTime time, BreathTime tau)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(time, default);
        ArgumentOutOfRangeException.ThrowIfEqual(tau, default);

        return Math.Exp(-time.Seconds / tau.Seconds);
    }
}
