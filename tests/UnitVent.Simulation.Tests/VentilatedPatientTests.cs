using UnitVent.Physiology;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Tests;

public sealed class VentilatedPatientTests
{
    private static readonly BarometricPressure SeaLevel = BarometricPressure.FromMmHg(760);

    [Fact]
    public void Observe_Settled_BalancesCarbonDioxide()
    {
        var patient = new VentilatedPatient(Given.Patient with { Drive = 1 }, Given.Aprv, SeaLevel);

        var state = patient.Observe();
        var alveolar = 0.9 * ((state.Delivered.MachineRatePerMin * (state.Delivered.MachineVolumeMl - 150)) + (state.Delivered.OwnRatePerMin * (250 - 150))) / 1000;

        Expect.Near(0.863 * 190 / alveolar, state.PaCO2MmHg, 0.01, "PaCO2 = 0.863 VCO2 / VA");
        Expect.Near(10 + (0.3 * (state.PaCO2MmHg - 42)), state.Delivered.OwnRatePerMin, 0.01, "rate answers to PaCO2");
        Expect.Near(0.9 * state.PaCO2MmHg, state.EtCO2MmHg, 1e-9, "a tenth of the alveolar gas met no blood");
    }

    [Fact]
    public void Advance_OwnBreathingLost_LetsCarbonDioxideRiseSlowlyAndFallFasterOnReturn()
    {
        var patient = new VentilatedPatient(Given.Patient with { Drive = 1 }, Given.Aprv, SeaLevel);
        var before = patient.Observe().PaCO2MmHg;

        patient.Parameters = Given.Patient with { Drive = 0 };
        patient.Advance(20);
        var early = patient.Observe().PaCO2MmHg;
        patient.Advance(600);
        var lost = patient.Observe().PaCO2MmHg;
        patient.Parameters = Given.Patient with { Drive = 1 };
        patient.Advance(20);
        var back = patient.Observe().PaCO2MmHg;

        Assert.True(lost > before + 10, $"{before} → {lost}");
        Expect.Near(1 - Math.Pow(2, -20.0 / 16), (early - before) / (lost - before), 0.02, "a little over half the way up after 20 min");
        Assert.True((lost - back) / (lost - before) > 0.8, "most of the way down after 20 min");
    }

    [Fact]
    public void Observe_LargerShunt_LowersOxygenAndLeavesCarbonDioxide()
    {
        var patient = new VentilatedPatient(Given.Patient, Given.Aprv, SeaLevel);
        var before = patient.Observe();

        patient.Parameters = Given.Patient with { ShuntFraction = 0.4 };
        var after = patient.Observe();

        Assert.True(after.PaO2MmHg < 0.85 * before.PaO2MmHg);
        Assert.Equal(before.PaCO2MmHg, after.PaCO2MmHg);
    }

    [Fact]
    public void Observe_MetabolicAcidosis_LowersPHAtEqualCarbonDioxide()
    {
        var (normal, acid) = (new VentilatedPatient(Given.Patient, Given.Aprv, SeaLevel), new VentilatedPatient(Given.Patient with { StandardBaseExcessMmolL = -8 }, Given.Aprv, SeaLevel));

        Assert.True(acid.Observe().PH < normal.Observe().PH - 0.08);
        Assert.Equal(normal.Observe().PaCO2MmHg, acid.Observe().PaCO2MmHg);
    }

    [Theory]
    [InlineData(42, 0.3, 10, "at the set point the patient breathes as at rest")]
    [InlineData(62, 0.3, 16, "20 mmHg above")]
    [InlineData(30, 1.0, 0, "no breath is taken back")]
    [InlineData(200, 1.0, 45, "no one breathes faster")]
    public void OwnBreathing_AlongCarbonDioxide_RisesBetweenItsBounds(double paCO2MmHg, double perMmHg, double expectedPerMin, string reason)
    {
        var patient = Given.Patient with { Drive = 1, OwnRatePerMmHg = perMmHg };

        Expect.Near(expectedPerMin, OwnBreathing.Of(patient, paCO2MmHg).RatePerMin, 1e-9, reason);
    }
}
