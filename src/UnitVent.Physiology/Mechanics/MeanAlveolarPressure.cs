namespace UnitVent.Physiology;

/// <summary>The mean alveolar pressure, which differs from the mean airway pressure when expiration is the more resistive phase.</summary>
public static class MeanAlveolarPressure
{
    /// <summary>Computes mean airway pressure + (VE / 60) × (RE − RI), VE in L/min and R in cmH2O·s/L.</summary>
    /// <remarks>Source: Marini JJ, Ravenscraft SA. Crit Care Med 1992;20:1461-1472. In APRV the ventilation is that of the releases.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">The result is outside the range of <see cref="AirwayPressure"/>.</exception>
    public static AirwayPressure Compute(AirwayPressure mean, MinuteVentilation ventilation, Resistance expiratory, Resistance inspiratory)
    {
        var excess = expiratory.CmH2OSecondsPerLitre - inspiratory.CmH2OSecondsPerLitre;
        return AirwayPressure.FromCmH2O(mean.CmH2O + (ventilation.LitresPerMinute / 60 * excess));
    }
}
