using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Wording;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>How a gas reads as acid and base (A27), in words: what the numbers look like, never a diagnosis.</summary>
internal static class AcidBaseWords
{
    private const string MachineSets = " These expectations assume free breathing; the ventilator may set PaCO2.";

    public static string? Of(PictureSources s)
    {
        if (s.LatestArterial is not { Gas: { Body: { PH: { } pH, PCO2: { } typed } } gas } || s.Now - gas.At > s.Limits.Gas)
        {
            return null;
        }

        var pCO2 = GasConsistency.Tension(typed, gas.Body.TensionUnit);
        var bicarbonate = gas.Body is { BicarbonateMmolL: { } printed, BicarbonateKind: not BicarbonateKind.Standard }
            ? (double)printed
            : HendersonHasselbalch.Bicarbonate(BloodPH.FromPH((double)pH), pCO2);
        if (bicarbonate > 100)
        {
            return null;
        }

        var onset = s.Has(Circumstance.ChronicRetainer) ? RespiratoryOnset.Chronic : RespiratoryOnset.Between;
        var reading = AcidBaseInterpretation.Read(BloodPH.FromPH((double)pH), pCO2, Bicarbonate.FromMmolPerLitre(bicarbonate), onset);
        return Pattern(reading.Pattern, $"pH {Numbers.Fixed((double)pH, 2)}", $"PaCO2 {Numbers.Fixed(pCO2.MmHg)} mmHg", $"bicarbonate {Numbers.Fixed(bicarbonate, 1)} mmol/L")
            + (reading is { Expected: { } expected, Finding: { } finding } ? Compensated(reading.Pattern, expected, finding) + MachineSets : "");
    }

    private static string Pattern(AcidBasePattern pattern, string pH, string pCO2, string bicarbonate) => pattern switch
    {
        AcidBasePattern.DoesNotFit => $"{pH}, {pCO2} and {bicarbonate} do not fit together; nothing is read from them.",
        AcidBasePattern.Usual => $"{pH} in the usual range.",
        AcidBasePattern.MixedOrCompensated => $"{pH} in the usual range with {pCO2} and {bicarbonate} both outside theirs: mixed, or fully compensated.",
        AcidBasePattern.MetabolicAcidosis => $"{pH}, explained by {bicarbonate}: pattern of a metabolic acidosis.",
        AcidBasePattern.MetabolicAlkalosis => $"{pH}, explained by {bicarbonate}: pattern of a metabolic alkalosis.",
        AcidBasePattern.RespiratoryAcidosis => $"{pH}, explained by {pCO2}: pattern of a respiratory acidosis.",
        AcidBasePattern.RespiratoryAlkalosis => $"{pH}, explained by {pCO2}: pattern of a respiratory alkalosis.",
        AcidBasePattern.CombinedAcidosis => $"{pH}, explained by both {pCO2} and {bicarbonate}: pattern of a combined acidosis.",
        AcidBasePattern.CombinedAlkalosis => $"{pH}, explained by both {pCO2} and {bicarbonate}: pattern of a combined alkalosis.",
        AcidBasePattern.Unexplained => $"{pH} outside its usual range; neither {pCO2} nor {bicarbonate} is outside theirs.",
    };

    private static string Compensated(AcidBasePattern pattern, ExpectedRange expected, CompensationFinding finding)
    {
        var metabolic = pattern is AcidBasePattern.MetabolicAcidosis or AcidBasePattern.MetabolicAlkalosis;
        var (side, cause) = metabolic ? ("PaCO2", "bicarbonate") : ("Bicarbonate", "PaCO2");
        var range = $"{Numbers.Fixed(expected.Lowest, metabolic ? 0 : 1)}–{Numbers.Fixed(expected.Highest, metabolic ? 0 : 1)} {(metabolic ? "mmHg" : "mmol/L")}";
        return finding switch
        {
            CompensationFinding.AsExpected => $" {side} is as expected for it ({range}).",
            CompensationFinding.Above => $" {side} is higher than expected for this {cause} ({range}): an added {(metabolic ? "respiratory acidosis" : "metabolic alkalosis")} is possible.",
            CompensationFinding.Below => $" {side} is lower than expected for this {cause} ({range}): an added {(metabolic ? "respiratory alkalosis" : "metabolic acidosis")} is possible.",
        };
    }
}
