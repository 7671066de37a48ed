namespace UnitVent.Physiology;

/// <summary>A breath's volume related to predicted body weight.</summary>
public static class VolumePerKilogram
{
    /// <summary>Computes volume over mass, in mL/kg.</summary>
    /// <remarks>Source: the unit of the ARDS Network protocol, N Engl J Med 2000;342:1301-1308.
    /// The volume is the release volume in APRV, the expired tidal volume in other modes.</remarks>
    /// <param name="volume">Release or expired tidal volume.</param>
    /// <param name="predictedBodyMass">Predicted, not actual, body mass.</param>
    /// <returns>The unrounded quotient, zero or more.</returns>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="predictedBodyMass"/> is the default, 0 kg.</exception>
    public static double Compute(GasVolume volume, BodyMass predictedBodyMass)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(predictedBodyMass, default);

        return volume.Millilitres / predictedBodyMass.Kilograms;
    }
}
