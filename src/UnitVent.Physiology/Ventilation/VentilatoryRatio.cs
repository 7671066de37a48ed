namespace UnitVent.Physiology;

/// <summary>The ventilatory ratio, a dimensionless bedside index of impaired carbon dioxide clearance.</summary>
public static class VentilatoryRatio
{
    private const double PredictedMlPerMinPerKg = 100;
    private const double PredictedPaCO2MmHg = 37.5;

    /// <summary>Computes the ratio of measured to predicted (minute ventilation × PaCO2).</summary>
    /// <remarks><para>VR = (VE [mL/min] × PaCO2 [mmHg]) / (PBW [kg] × 100 mL/min/kg × 37.5 mmHg).</para>
    /// <para>Source: Sinha P, et al. Am J Respir Crit Care Med 2019;199:333-341; kPa form in Crit Care 2013;17:R34.
    /// For mandatory ventilation at steady state; not validated in APRV.</para></remarks>
    /// <param name="ventilation">Expired minute ventilation.</param>
    /// <param name="paCO2">Arterial carbon dioxide tension, drawn while <paramref name="ventilation"/> held.</param>
    /// <param name="predictedBodyMass">Predicted, not actual, body mass.</param>
    /// <returns>The unrounded ratio, zero or more; 1 when measured equals predicted.</returns>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="predictedBodyMass"/> is the default, 0 kg.</exception>
    public static double Compute(MinuteVentilation ventilation, PartialPressure paCO2, BodyMass predictedBodyMass)
    {
        ArgumentOutOfRangeException.ThrowIfEqual(predictedBodyMass, default);

        var predicted = predictedBodyMass.Kilograms * PredictedMlPerMinPerKg * PredictedPaCO2MmHg;
        return ventilation.MillilitresPerMinute * paCO2.MmHg / predicted;
    }
}
