namespace UnitVent.Physiology;

/// <summary>The answer of the other side expected in a single acid-base disturbance.</summary>
/// <remarks><para>Source: Berend K, et al. N Engl J Med 2014;371:1434-1445, through summaries, which differ for chronic respiratory
/// acidosis (2.5–5 mmol/L); the limits of 38 mmol/L and 55 mmHg are common practice.</para>
/// <para>The rules assume free breathing. Where the ventilator sets PaCO2, a value off the expected one says nothing of the patient.</para></remarks>
public static class Compensation
{
    private const double UsualPCO2MmHg = 40;
    private const double UsualBicarbonateMmolL = 24;
    private const double Band = 2;
    private const double AlkalosisBandMmHg = 5;
    private const double HighestPCO2MmHg = 55;
    private const double HighestAcuteMmolL = 38;

    /// <summary>Computes the PCO2 expected in metabolic acidosis, in mmHg: 1.5 × HCO3 + 8, ± 2.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="bicarbonate"/> is its default, 0.</exception>
    public static ExpectedRange PCO2InMetabolicAcidosis(Bicarbonate bicarbonate)
        => Around((1.5 * Guard.Positive(bicarbonate.MmolPerLitre, nameof(bicarbonate))) + 8, Band);

    /// <summary>Computes the PCO2 expected in metabolic alkalosis, in mmHg: 0.7 × (HCO3 − 24) + 40, at most 55, ± 5.</summary>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="bicarbonate"/> is its default, 0.</exception>
    public static ExpectedRange PCO2InMetabolicAlkalosis(Bicarbonate bicarbonate)
    {
        var aboveUsual = Guard.Positive(bicarbonate.MmolPerLitre, nameof(bicarbonate)) - UsualBicarbonateMmolL;
        return Around(Math.Min((0.7 * aboveUsual) + UsualPCO2MmHg, HighestPCO2MmHg), AlkalosisBandMmHg);
    }

    /// <summary>Computes the bicarbonate expected in a respiratory disturbance, in mmol/L.</summary>
    /// <remarks>For each 10 mmHg above 40 it rises by 1 at once (up to 38, ± 2), by 3.5–5 in days; for each 10 mmHg below 40 it falls by 2
    /// at once (± 2), by 4–5 in days. Between, the range reaches from the acute to the chronic answer.</remarks>
    /// <exception cref="ArgumentOutOfRangeException"><paramref name="pCO2"/> is its default, 0.</exception>
    public static ExpectedRange BicarbonateInRespiratory(PartialPressure pCO2, RespiratoryOnset onset)
    {
        var tens = (Guard.Positive(pCO2.MmHg, nameof(pCO2)) - UsualPCO2MmHg) / 10;
        var acute = Around(Math.Min(UsualBicarbonateMmolL + (tens * (tens > 0 ? 1 : 2)), HighestAcuteMmolL), Band);
        var less = UsualBicarbonateMmolL + (tens * (tens > 0 ? 3.5 : 4));
        var more = UsualBicarbonateMmolL + (tens * 5);
        var chronic = new ExpectedRange(Math.Min(less, more), Math.Max(less, more));
        return onset switch
        {
            RespiratoryOnset.Acute => acute,
            RespiratoryOnset.Chronic => chronic,
            RespiratoryOnset.Between => new(Math.Min(acute.Lowest, chronic.Lowest), Math.Max(acute.Highest, chronic.Highest)),
        };
    }

    private static ExpectedRange Around(double expected, double band) => new(expected - band, expected + band);
}
