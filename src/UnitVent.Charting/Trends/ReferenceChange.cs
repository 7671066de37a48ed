using MathNet.Numerics.Distributions;

namespace UnitVent.Charting.Trends;

/// <summary>How far two results of one stable patient may lie apart by analysis and by nature alone.</summary>
/// <remarks>
/// <para>RCV = √2 z √(CVₐ² + CVᵢ²), z of the two-sided confidence.</para>
/// <para>Source: Harris EK, Yasaka T. Clin Chem 1983;29:25-30 [from memory]. Spread of repeated gases in stable patients: Thorson SH, et al. Chest 1983;84:14;
/// Hess D, Agarwal NN. J Clin Monit 1992;8:111.</para>
/// </remarks>
public static class ReferenceChange
{
    /// <summary>The reference change value in per cent of the earlier result, zero or more.</summary>
    /// <param name="analyticalPercent">The coefficient of variation of the analysis, per cent, zero or more.</param>
    /// <param name="withinPatientPercent">The coefficient of variation within a stable patient, per cent, zero or more.</param>
    /// <param name="confidence">The two-sided confidence, in (0, 1).</param>
    /// <exception cref="ArgumentOutOfRangeException">A number is not finite or outside its range.</exception>
    public static double Percent(double analyticalPercent, double withinPatientPercent, double confidence = 0.95)
    {
        Finite.Ensure([analyticalPercent, withinPatientPercent, confidence]);
        ArgumentOutOfRangeException.ThrowIfNegative(analyticalPercent);
        ArgumentOutOfRangeException.ThrowIfNegative(withinPatientPercent);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(confidence);
        ArgumentOutOfRangeException.ThrowIfGreaterThanOrEqual(confidence, 1);
        var z = Normal.InvCDF(0, 1, (1 + confidence) / 2);
        return Math.Sqrt(2) * z * double.Hypot(analyticalPercent, withinPatientPercent);
    }
}
