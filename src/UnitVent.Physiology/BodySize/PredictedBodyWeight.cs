namespace UnitVent.Physiology;

/// <summary>Predicted body weight: lung size expressed as a body mass, from height and sex.</summary>
public static class PredictedBodyWeight
{
    private const double ReferenceHeightCm = 152.4; // 60 inches
    private const double KilogramsPerCm = 0.91;

    /// <summary>Computes the predicted body weight.</summary>
    /// <remarks><para>PBW [kg] = 50 (men) or 45.5 (women) + 0.91 × (height [cm] − 152.4).</para>
    /// <para>Source: ARDS Network, N Engl J Med 2000;342:1301-1308. Built on adults taller than 152.4 cm;
    /// outside its validated range below 140 cm. Actual weight never stands in for it.</para></remarks>
    /// <returns>The unrounded mass.</returns>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="height"/> is the default, 0 cm.</exception>
    public static BodyMass Compute(LungSizeSex sex, BodyHeight height)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(height, default);

        var atReferenceHeight = sex switch
        {
            LungSizeSex.Male => 50,
            LungSizeSex.Female => 45.5,
        };
        return BodyMass.FromKilograms(atReferenceHeight + (KilogramsPerCm * (height.Centimetres - ReferenceHeightCm)));
    }
}
