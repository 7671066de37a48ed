namespace UnitVent.Physiology;

/// <summary>Reads pH, PCO2 and bicarbonate of an arterial gas in the usual order: fit, pH, primary side, answer of the other side.</summary>
/// <remarks><para>Usual ranges: pH 7.35–7.45, PCO2 35–45 mmHg, bicarbonate 22–26 mmol/L, ends included (common practice). The answer of
/// the other side is that of <see cref="Compensation"/>, with its source and its limits in ventilated patients.</para>
/// <para>It states and never diagnoses. A venous or capillary gas has no place here.</para></remarks>
public static class AcidBaseInterpretation
{
    private const double LargestMisfitPH = 0.06;
    private const double LowestUsualPH = 7.35;
    private const double HighestUsualPH = 7.45;
    private const double LowestUsualPCO2MmHg = 35;
    private const double HighestUsualPCO2MmHg = 45;
    private const double LowestUsualMmolL = 22;
    private const double HighestUsualMmolL = 26;

    /// <summary>Reads a gas. One whose pH is more than 0.06 from what the other two give is not read at all.</summary>
    /// <remarks>The limit is that of figures which do not fit together (common practice); a doubt from 0.03 on is for the caller to say.</remarks>
    /// <exception cref="ArgumentOutOfRangeException">An argument is its default, 0.</exception>
    public static AcidBaseReading Read(BloodPH pH, PartialPressure pCO2, Bicarbonate bicarbonate, RespiratoryOnset onset)
    {
        var pattern = Pattern(pH, pCO2, bicarbonate);
        return pattern switch
        {
            AcidBasePattern.MetabolicAcidosis => Held(pattern, Compensation.PCO2InMetabolicAcidosis(bicarbonate), pCO2.MmHg),
            AcidBasePattern.MetabolicAlkalosis => Held(pattern, Compensation.PCO2InMetabolicAlkalosis(bicarbonate), pCO2.MmHg),
            AcidBasePattern.RespiratoryAcidosis or AcidBasePattern.RespiratoryAlkalosis
                => Held(pattern, Compensation.BicarbonateInRespiratory(pCO2, onset), bicarbonate.MmolPerLitre),
            _ => new(pattern, null, null),
        };
    }

    private static AcidBasePattern Pattern(BloodPH pH, PartialPressure pCO2, Bicarbonate bicarbonate)
    {
        if (Math.Abs(HendersonHasselbalch.ConsistencyDeltaPH(pH, pCO2, bicarbonate)) > LargestMisfitPH)
        {
            return AcidBasePattern.DoesNotFit;
        }

        var (lowPCO2, highPCO2) = (pCO2.MmHg < LowestUsualPCO2MmHg, pCO2.MmHg > HighestUsualPCO2MmHg);
        var (lowBicarbonate, highBicarbonate) = (bicarbonate.MmolPerLitre < LowestUsualMmolL, bicarbonate.MmolPerLitre > HighestUsualMmolL);
        return pH.Value switch
        {
            < LowestUsualPH => Acidosis(highPCO2, lowBicarbonate),
            > HighestUsualPH => Alkalosis(lowPCO2, highBicarbonate),
            _ => (lowPCO2 || highPCO2) && (lowBicarbonate || highBicarbonate) ? AcidBasePattern.MixedOrCompensated : AcidBasePattern.Usual,
        };
    }

    private static AcidBasePattern Acidosis(bool respiratory, bool metabolic) => (respiratory, metabolic) switch
    {
        (true, true) => AcidBasePattern.CombinedAcidosis,
        (true, false) => AcidBasePattern.RespiratoryAcidosis,
        (false, true) => AcidBasePattern.MetabolicAcidosis,
        (false, false) => AcidBasePattern.Unexplained,
    };

    private static AcidBasePattern Alkalosis(bool respiratory, bool metabolic) => (respiratory, metabolic) switch
    {
        (true, true) => AcidBasePattern.CombinedAlkalosis,
        (true, false) => AcidBasePattern.RespiratoryAlkalosis,
        (false, true) => AcidBasePattern.MetabolicAlkalosis,
        (false, false) => AcidBasePattern.Unexplained,
    };

    private static AcidBaseReading Held(AcidBasePattern pattern, ExpectedRange expected, double actual)
        => new(pattern, expected, actual < expected.Lowest ? CompensationFinding.Below
            : actual > expected.Highest ? CompensationFinding.Above
            : CompensationFinding.AsExpected);
}
