using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Ventilator;

namespace UnitVent.Simulation.Tests.Ventilator;

public sealed class VentilatorModelTests
{
    private static readonly OwnBreathing None = new(0, 250, 0);

    /// <summary>J Appl Physiol 1993;74:922-933, steady state between two pressures; values worked from its form.</summary>
    public static TheoryData<double, double, double, double, double, double, double, double> WorkedReleases => new()
    {
        { 30, 30, 4.0, 0.5, 1.0, 1.0, 351.5, 18.06 },
        { 40, 25, 2.0, 0.5, 1.0, 0.8, 433.2, 12.47 },
        { 50, 20, 1.5, 1.0, 1.5, 1.5, 379.2, 8.00 },
    };

    [Theory, MemberData(nameof(WorkedReleases))]
    public void Deliver_Release_HasTheVolumeOfTheClosedForm(
        double compliance, double pHigh, double tHigh, double tLow, double tauInspiratory, double tauExpiratory, double volume, double trapped)
    {
        var patient = Lung(compliance, tauInspiratory, tauExpiratory);
        var settings = Given.Aprv with { PHighCmH2O = (decimal)pHigh, THighS = (decimal)tHigh, TLowS = (decimal)tLow };

        var delivered = VentilatorModel.Deliver(settings, patient, None);

        Expect.Near(volume, delivered.MachineVolumeMl, 0.05, "release volume");
        Expect.Near(trapped, delivered.TrappedPressureCmH2O, 0.005, "trapped pressure");
        Expect.Near(Math.Exp(-tLow / tauExpiratory), delivered.EndReleaseFlowLMin!.Value / delivered.PeakExpiratoryFlowLMin!.Value, 1e-9, "end of release");
    }

    /// <summary>Time-weighted mean pressure, a standard identity; values worked by hand.</summary>
    public static TheoryData<double, double, double, double, double> WorkedMeanPressures => new()
    {
        { 30, 0, 5.0, 0.5, 27.27 },
        { 28, 0, 4.5, 0.5, 25.20 },
        { 25, 5, 4.0, 0.8, 21.67 },
        { 24, 0, 5.5, 0.5, 22.00 },
    };

    [Theory, MemberData(nameof(WorkedMeanPressures))]
    public void Deliver_Release_HasTheTimeWeightedMeanPressure(double pHigh, double pLow, double tHigh, double tLow, double expected)
    {
        var settings = Given.Aprv with { PHighCmH2O = (decimal)pHigh, PLowCmH2O = (decimal)pLow, THighS = (decimal)tHigh, TLowS = (decimal)tLow };

        Expect.Near(expected, VentilatorModel.Deliver(settings, Given.Patient, None).MeanPressureCmH2O, 0.005, "mean pressure");
    }

    /// <summary>One exponential: 28 over 0 cmH2O, T low 0.5 s ending at 60 % of the peak, 420 mL, peak 64.4 L/min, worked by hand.</summary>
    [Fact]
    public void Deliver_LongRefilledRelease_HasThePeakFlowOfOneExponential()
    {
        var tau = 0.5 / Math.Log(1 / 0.6);
        var settings = Given.Aprv with { PHighCmH2O = 28, THighS = 20 };

        var delivered = VentilatorModel.Deliver(settings, Lung(37.5, tau, tau), None);

        Expect.Near(420, delivered.MachineVolumeMl, 0.05, "37.5 × 28 × 0.4");
        Expect.Near(64.4, delivered.PeakExpiratoryFlowLMin!.Value, 0.05, "peak flow");
        Expect.Near(38.6, delivered.EndReleaseFlowLMin!.Value, 0.05, "60 % of it");
    }

    [Fact]
    public void Deliver_OwnBreathsInRelease_AddToTheMinuteVolume()
    {
        var delivered = VentilatorModel.Deliver(Given.Aprv, Given.Patient, new OwnBreathing(10, 200, 0));

        Expect.Near(2.0, delivered.OwnMinuteVolumeLMin, 1e-9, "10 × 200 mL");
        Expect.Near(delivered.MachineRatePerMin * delivered.MachineVolumeMl / 1000 + 2.0, delivered.TotalMinuteVolumeLMin, 1e-9, "both together");
    }

    private static PatientParameters Lung(double compliance, double tauInspiratory, double tauExpiratory) => Given.Patient with
    {
        ComplianceMlPerCmH2O = compliance,
        InspiratoryResistanceCmH2OSPerL = 1000 * tauInspiratory / compliance,
        ExpiratoryResistanceCmH2OSPerL = 1000 * tauExpiratory / compliance,
    };
}
