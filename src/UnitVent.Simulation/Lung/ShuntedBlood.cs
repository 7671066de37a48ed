using UnitVent.Physiology;

namespace UnitVent.Simulation.Lung;

/// <summary>Arterial oxygen as a mixture of blood from ventilated alveoli and of shunted blood.</summary>
/// <remarks>Qs/Qt = (Cc′O2 − CaO2) / (Cc′O2 − CvO2) [from memory: Berggren SM. Acta Physiol Scand 1942;4 suppl 11].</remarks>
public static class ShuntedBlood
{
    private const double RespiratoryQuotient = 0.8; // as in the alveolar gas equation

    /// <summary>CaO2 = Cc′O2 − s / (1 − s) × (CaO2 − CvO2), all in mL/dL; the last by Fick from oxygen uptake and cardiac output.</summary>
    public static PartialPressure ArterialPO2(
        PatientParameters patient, OxygenFraction fiO2, BarometricPressure barometric, BloodPH pH, PartialPressure paCO2)
    {
        var alveolar = AlveolarGas.AlveolarPO2(fiO2, barometric, paCO2);
        var capillary = Content(alveolar.MmHg, patient.HaemoglobinGDl, pH, paCO2);
        var arteriovenous = patient.CarbonDioxideOutputMlMin / RespiratoryQuotient / (10 * patient.CardiacOutputLMin);
        var wanted = capillary - (patient.ShuntFraction / (1 - patient.ShuntFraction) * arteriovenous);
        return PartialPressure.FromMmHg(TensionFor(wanted, alveolar.MmHg, patient.HaemoglobinGDl, pH, paCO2));
    }

    public static double Content(double pO2MmHg, double haemoglobinGDl, BloodPH pH, PartialPressure paCO2)
    {
        var pO2 = PartialPressure.FromMmHg(pO2MmHg);
        return OxygenContent.ArterialMlPerDl(HaemoglobinConcentration.FromGramsPerDecilitre(haemoglobinGDl), Saturation(pO2, pH, paCO2), pO2);
    }

    public static Saturation Saturation(PartialPressure pO2, BloodPH pH, PartialPressure paCO2) =>
        OxygenDissociation.Saturation(OxygenDissociation.VirtualPartialPressure(pO2, pH, 37, paCO2));

    private static double TensionFor(double contentMlDl, double highestMmHg, double haemoglobinGDl, BloodPH pH, PartialPressure paCO2)
    {
        var (low, high) = (1.0, highestMmHg);
        while (high - low > 1e-6)
        {
            var middle = (low + high) / 2;
            (low, high) = Content(middle, haemoglobinGDl, pH, paCO2) < contentMlDl ? (middle, high) : (low, middle);
        }

        return (low + high) / 2;
    }
}
