using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Staff;

/// <summary>An analyser's slip: measured figures with their noise, and the figures that the analyser computes from the measured ones as it prints them.</summary>
internal static class GasSlip
{
    public static BloodGas Of(BedsideMoment moment, int pHDecimals, string sampleNumber)
    {
        var (state, patient, read) = (moment.State, moment.Patient, moment.Read);
        var pH = Typed.Number(read.PH(state.PH), pHDecimals);
        var pCO2 = Typed.Number(read.PaCO2(state.PaCO2MmHg));
        var pO2 = Typed.Number(read.PaO2(state.PaO2MmHg));
        var bicarbonate = HendersonHasselbalch.Bicarbonate(BloodPH.FromPH((double)pH), PartialPressure.FromMmHg((double)pCO2));
        var sodium = Typed.Number(read.Shifted("sodium", 140, 1));
        return new BloodGas
        {
            DrawnAt = moment.At,
            Specimen = Specimen.Arterial,
            Site = moment.Bedside.ArterialSite,
            FiO2 = moment.Settings.FiO2,
            TemperatureC = 37.0m,
            TemperatureCorrected = false,
            TensionUnit = TensionUnit.MmHg,
            PH = pH,
            PCO2 = pCO2,
            PO2 = pO2,
            SO2Percent = Typed.Number(Saturation(pO2, pH, pCO2), 1),
            HaemoglobinGDl = Typed.Number(read.Shifted("haemoglobin", patient.HaemoglobinGDl, 0.1), 1),
            LactateMmolL = Typed.Within(read.Shifted("lactate", patient.LactateMmolL, 0.1), 0.3, 30, 1),
            BicarbonateMmolL = Typed.Number(bicarbonate, 1),
            BicarbonateKind = BicarbonateKind.Actual,
            BaseExcessMmolL = Typed.Number(BaseExcess.Standard(BloodPH.FromPH((double)pH), bicarbonate), 1),
            SodiumMmolL = sodium,
            ChlorideMmolL = Typed.Number((double)sodium - bicarbonate - AnionGapOf(patient)),
            SampleNumber = sampleNumber,
        };
    }

    private static double AnionGapOf(PatientParameters patient) => 9 + patient.LactateMmolL;

    private static double Saturation(decimal pO2, decimal pH, decimal pCO2) => ShuntedBlood.Saturation(
        PartialPressure.FromMmHg((double)pO2), BloodPH.FromPH((double)pH), PartialPressure.FromMmHg((double)pCO2)).Percent;
}
