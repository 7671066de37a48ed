namespace UnitVent.Simulation.Cohort;

/// <summary>What is true of a patient, without wander and without measurement.</summary>
internal sealed record TrueValues(
    double PaO2OverFiO2, double PaCO2MmHg, double EndOfPeakPercent, double OwnSharePercent, double Compliance, double TimeConstantS)
{
    public static TrueValues Of(VentilatedPatient patient)
    {
        var (state, lung) = (patient.Observe(), patient.Parameters);
        return new(
            state.PaO2MmHg / (double)patient.Settings.FiO2!,
            state.PaCO2MmHg,
            100 * state.Delivered.EndReleaseFlowLMin!.Value / state.Delivered.PeakExpiratoryFlowLMin!.Value,
            100 * state.Delivered.OwnMinuteVolumeLMin / state.Delivered.TotalMinuteVolumeLMin,
            lung.ComplianceMlPerCmH2O,
            lung.ExpiratoryResistanceCmH2OSPerL * lung.ComplianceMlPerCmH2O / 1000);
    }
}
