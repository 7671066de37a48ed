namespace UnitVent.Physiology;

/// <summary>The oxygen content of arterial blood.</summary>
public static class OxygenContent
{
    private const double MlPerGram = 1.34; // oxygen bound by 1 g of haemoglobin; 1.39 is also in use
    private const double MlPerDlPerMmHg = 0.0031; // oxygen dissolved in 1 dL of plasma at 37 °C

    /// <summary>Computes CaO2 [mL/dL] = 1.34 × Hb [g/dL] × SaO2 + 0.0031 × PaO2 [mmHg].</summary>
    /// <remarks>Source: common practice; both constants from memory.</remarks>
    public static double ArterialMlPerDl(HaemoglobinConcentration haemoglobin, Saturation saO2, PartialPressure paO2)
        => (MlPerGram * haemoglobin.GramsPerDecilitre * saO2.Fraction) + (MlPerDlPerMmHg * paO2.MmHg);
}
