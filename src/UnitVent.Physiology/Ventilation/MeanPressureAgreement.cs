namespace UnitVent.Physiology;

/// <summary>How far a measured mean airway pressure lies from the one computed from settings.</summary>
public static class MeanPressureAgreement
{
    private const double ToleranceCmH2O = 2;
    private const double TolerancePercent = 10;

    /// <summary>Computes measured − computed, in cmH2O.</summary>
    public static double DifferenceCmH2O(AirwayPressure measured, AirwayPressure computed) => measured.CmH2O - computed.CmH2O;

    /// <summary>Computes the difference in percent of the computed pressure.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="computed"/> is not above 0 cmH2O.</exception>
    public static double DifferencePercent(AirwayPressure measured, AirwayPressure computed)
        => 100 * DifferenceCmH2O(measured, computed) / Guard.Positive(computed.CmH2O, nameof(computed));

    /// <summary>Says whether the two agree within the larger of 2 cmH2O and 10 %.</summary>
    /// <remarks>Source of the tolerance: common practice.</remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="computed"/> is not above 0 cmH2O.</exception>
    public static bool IsWithinTolerance(AirwayPressure measured, AirwayPressure computed)
        => Math.Abs(DifferencePercent(measured, computed)) <= TolerancePercent
            || Math.Abs(DifferenceCmH2O(measured, computed)) <= ToleranceCmH2O;
}
