using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Tests.Documents;

/// <summary>Equations that stand behind no value of the picture: projections, what is shown only when it is asked for, and the statistics of drift.</summary>
internal static class FurtherEquations
{
    private const string FromMemory = ", from memory";

    /// <summary>Each with the member of the code that computes it.</summary>
    public static IReadOnlyList<(Equation Equation, string Code)> All { get; } =
    [
        (new("A16", "Projected release volume", "mL", "C × swing, C = release volume ÷ swing now; swing as A13, as A14 when T high is below four time constants before or after", "end-release flow 5–90 % of peak, P high − P low within 30 %, T low within 50 % of now, compliance 5–150 mL/cmH2O; else refused", "J Appl Physiol 1993;74:922-933"), "AprvProjection.Project"),
        (new("A16", "Projected PaCO2", "mmHg", "PaCO2 × VA ÷ VA then; VA = release rate × (release volume − dead space) + own minute volume − own rate × dead space", "dead space 2.2 mL/kg predicted body weight (from memory), band with 0.7 and 1.3 times that; refused with a leak, obstruction, ECMO, an own share above 50 % or changing, a turn, sedation or relaxant since the gas, an unsettled gas or one older than 6 h, one release, VA beyond half or twice, PaCO2 beyond 15–150 mmHg; no direction below 5 mmHg", "alveolar ventilation equation, standard"), "AprvProjection.Project"),
        (new("A17", "T high that keeps the mean pressure", "s", "T low × (mean − P low) ÷ (P high − mean)", "P low < mean < P high; at least 5 releases a minute", "solved from A6"), "MeanPressureTrade.TimeHigh"),
        (new("A17", "P high that keeps the mean pressure", "cmH2O", "(mean × (T high + T low) − P low × T low) ÷ T high", "mean above P low", "solved from A6"), "MeanPressureTrade.High"),
        (new("A17", "Step-down stages", "", "P high − step, T high + stretch, each with A6 and A9", "ends at 5 releases a minute or at P low; 2 cmH2O and 1 s unless asked otherwise", "Crit Care Med 2005;33(3 Suppl):S228-S240" + FromMemory), "StepDownSchedule.From"),
        (new("A20", "Alveolar–arterial difference expected on air", "mmHg", "age in years ÷ 4 + 4", "room air only, 18–120 years; not compared with at more oxygen", "from memory"), "AlveolarGas.ExpectedGradientOnAirMmHg"),
        (new("A21", "Barometric pressure", "mmHg", "760 × (1 − 2.25577e−5 × altitude)^5.25588", "altitude in m up to 11 000; the unit's altitude", "ISO 2533:1975, standard atmosphere"), "BarometricPressure.FromAltitude"),
        (new("A21", "Barometric pressure where people live high", "mmHg", "exp(6.63268 − 0.1112 × h − 0.00149 × h^2), h in km", "4–13 mmHg above the standard atmosphere; not the default", "J Appl Physiol 1996;81:1850-1854" + FromMemory), "BarometricPressure.FromInhabitedAltitude"),
        (new("A23", "Base excess after Van Slyke", "mmol/L", "(1 − 0.0143 × Hb) × (0.0304 × PCO2 × 10^(pH − 6.1) − 24.26 + (9.5 + 1.63 × Hb) × (pH − 7.4)) − 0.2 × Hb × (1 − sO2)", "for comparison; not shown by default", "Clin Chem Lab Med 2002;40:404-410"), "BaseExcess.Zander"),
        (new("A23", "Standard base excess after Van Slyke", "mmol/L", "0.9287 × (HCO3 − 24.4 + 14.83 × (pH − 7.4))", "for comparison; not shown by default", "from memory"), "BaseExcess.StandardVanSlyke"),
        (new("A24", "pH at the patient's temperature", "", "pH + (−0.0147 + 0.0065 × (7.40 − pH)) × (T − 37)", "25–43 °C; beside the value at 37 °C, never in a trend", "CLSI C46 family" + FromMemory), "TemperatureCorrection.PH"),
        (new("A24", "PCO2 at the patient's temperature", "mmHg", "PCO2 × 10^(0.019 × (T − 37))", "25–43 °C; beside the value at 37 °C, never in a trend", "CLSI C46 family" + FromMemory), "TemperatureCorrection.PCO2"),
        (new("A24", "PO2 at the patient's temperature", "mmHg", "PO2 × 10^((5.49e−11 × PO2^3.88 + 0.071) ÷ (9.72e−9 × PO2^3.88 + 2.30) × (T − 37))", "25–43 °C; beside the value at 37 °C, never in a trend", "CLSI C46 family" + FromMemory), "TemperatureCorrection.PO2"),
        (new("A26", "Dead space from mixed expired gas", "", "(PaCO2 − PECO2) ÷ PaCO2", "PECO2 at most 0.9 × PaCO2: an end-tidal tension is refused", "Uppsala Läkareforen Förh 1938;44:191-218" + FromMemory), "DeadSpace.Enghoff"),
        (new("A26", "Dead space from carbon dioxide output", "", "1 − 0.863 × VCO2 ÷ (VE × PaCO2)", "not shown by default: predicted output did not go with outcome", "Crit Care Med 2015;43:1026-1035" + FromMemory + "; Ann Intensive Care 2019;9:128"), "DeadSpace.FromCarbonDioxideOutput"),
        (new("A27", "PaCO2 expected in metabolic acidosis", "mmHg", "1.5 × HCO3 + 8, ± 2", "assumes free breathing", "N Engl J Med 2014;371:1434-1445"), "Compensation.PCO2InMetabolicAcidosis"),
        (new("A27", "PaCO2 expected in metabolic alkalosis", "mmHg", "0.7 × (HCO3 − 24) + 40, at most 55, ± 5", "assumes free breathing", "N Engl J Med 2014;371:1434-1445"), "Compensation.PCO2InMetabolicAlkalosis"),
        (new("A27", "Bicarbonate expected when PaCO2 is high", "mmol/L", "24 + 1 for each 10 mmHg above 40 within a day (± 2, at most 38); 24 + 3.5 to 5 after days", "between the two when the onset is not known", "N Engl J Med 2014;371:1434-1445"), "Compensation.BicarbonateInRespiratory"),
        (new("A27", "Bicarbonate expected when PaCO2 is low", "mmol/L", "24 − 2 for each 10 mmHg below 40 within a day (± 2); 24 − 4 to 5 after days", "between the two when the onset is not known", "N Engl J Med 2014;371:1434-1445"), "Compensation.BicarbonateInRespiratory"),
        (new("A27", "Anion gap for albumin", "mmol/L", "anion gap + 0.25 × (40 − albumin in g/L)", "", "Crit Care Med 1998;26:1807-1810" + FromMemory), "AnionGap.AlbuminCorrected"),
        (new("A31", "Ventilator-free days", "d", "28 − days ventilated in the first 28; 0 on death within them", "elapsed time; re-intubation within 48 h continues the spell; a measure of groups", "Crit Care Med 2002;30:1772-1777" + FromMemory), "VentilatorFreeDays.Compute"),
        (new("A32", "Unit conversions", "", "1 mmHg = 101.325 ÷ 760 kPa; 1 cmH2O = 0.980665 hPa", "exact", "standard"), "PartialPressure.FromKilopascals"),
        (new("B1", "Slope", "per h", "median of (yj − yi) ÷ (tj − ti) over all pairs; interval from ranks (N ± K) ÷ 2", "at least 4 values; K exact to 12 values without ties, normal beyond; range where no interval exists", "J Am Stat Assoc 1968;63:1379-1389"), "TheilSen.Of"),
        (new("B2", "Trend", "", "S = sum of sign(yj − yi), p two-sided from the exact null distribution, ties by the q-multinomial", "exact to 30 values; beyond, normal with tie-corrected variance and continuity", "Kendall, Rank Correlation Methods; Econometrica 1945;13:245-259"), "MannKendall.Of"),
        (new("B3", "Step", "", "value − median of the values of the previous settings epoch within 12 h", "the first settled value after a change", "common practice"), "Step.Of"),
        (new("B4", "Moving average and cumulative sum", "", "z = λ × x + (1 − λ) × z before; hi = max(0, hi before + x − target − k), lo likewise", "dense ventilator readings only, never gases", "NIST/SEMATECH e-Handbook 6.3.2.3 and 6.3.2.4"), "Ewma.Of"),
        (new("B5", "Reference change value", "%", "√2 × 1.96 × √(CVa^2 + CVi^2)", "two values of one quantity", "Clin Chem 1987;33:1416"), "ReferenceChange.Percent"),
        (new("B6", "Drift", "", "B2 with p ≤ 0.10 and |slope × span| at least the minimum important change", "at least 4 values over 4 h in one epoch; advisory by itself", "minimum changes: see docs/rules.md"), "Drift.Of"),
    ];
}
