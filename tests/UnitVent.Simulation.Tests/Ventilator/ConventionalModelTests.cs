using UnitVent.Charting.Entries;
using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Ventilator;

namespace UnitVent.Simulation.Tests.Ventilator;

public sealed class ConventionalModelTests
{
    private static readonly OwnBreathing None = new(0, 250, 0);

    /// <summary>Square wave: PEEP + ΔP × Ti / Ttot, a standard identity; values worked by hand.</summary>
    public static TheoryData<double, double, double, double, double> WorkedMeanPressures => new()
    {
        { 10, 20, 1.0, 20, 16.67 },
        { 8, 17, 0.9, 24, 14.12 },
        { 15, 20, 1.5, 20, 25.00 },
    };

    [Theory, MemberData(nameof(WorkedMeanPressures))]
    public void PressureControl_SquareWave_HasTheMeanPressureOfItsTimes(double peep, double above, double inspiratoryS, double rate, double expected)
    {
        var settings = Given.PressureControl with
        {
            PeepCmH2O = (decimal)peep,
            InspiratoryPressureAbovePeepCmH2O = (decimal)above,
            InspiratoryTimeS = (decimal)inspiratoryS,
            SetRatePerMin = (decimal)rate,
        };

        Expect.Near(expected, VentilatorModel.Deliver(settings, Given.Patient, None).MeanPressureCmH2O, 0.005, "mean pressure");
    }

    [Fact]
    public void PressureControl_SlowLung_FillsAndEmptiesByHalf()
    {
        // τ = 1 s / ln 2 both ways and 1 s each: a = b = 1/2, so V = C ΔP × (1/2 × 1/2) / (3/4) = C ΔP / 3 and ΔP / 3 stays.
        var resistance = 1000 / Math.Log(2) / 40;
        var patient = Given.Patient with { InspiratoryResistanceCmH2OSPerL = resistance, ExpiratoryResistanceCmH2OSPerL = resistance };
        var settings = Given.PressureControl with { InspiratoryPressureAbovePeepCmH2O = 15, SetRatePerMin = 30, InspiratoryTimeS = 1 };

        var delivered = VentilatorModel.Deliver(settings, patient, None);

        Expect.Near(200, delivered.MachineVolumeMl, 1e-6, "40 × 15 / 3");
        Expect.Near(5, delivered.TrappedPressureCmH2O, 1e-6, "15 / 3");
        Expect.Near(20, delivered.PlateauPressureCmH2O!.Value, 1e-6, "PEEP 10 + trapped 5 + 200 / 40");
    }

    [Fact]
    public void VolumeControl_EmptyingLung_AddsElasticAndResistivePressure()
    {
        var delivered = VentilatorModel.Deliver(Given.VolumeControl, Given.Patient with { ExpiratoryResistanceCmH2OSPerL = 5 }, None);

        Expect.Near(20, delivered.PlateauPressureCmH2O!.Value, 0.01, "PEEP 10 + 400 / 40, with nothing trapped after ten time constants");
        Expect.Near(6, delivered.PeakPressureCmH2O - delivered.PlateauPressureCmH2O!.Value, 1e-9, "12 cmH2O·s/L × 0.4 L in 0.8 s");
        Assert.Equal(400, delivered.MachineVolumeMl);
    }

    [Fact]
    public void VolumeControl_SlowLung_TrapsWhatDecaysToItself()
    {
        var patient = Given.Patient with { ExpiratoryResistanceCmH2OSPerL = 2000 / Math.Log(2) / 40 };

        var delivered = VentilatorModel.Deliver(Given.VolumeControl, patient, None);

        Expect.Near(10, delivered.TrappedPressureCmH2O, 1e-6, "half is left after 2 s: (10 + 10) / 2");
    }

    [Fact]
    public void PressureSupport_StrongerMuscles_LiftTheBreathNotTheAirwayPressure()
    {
        var (weak, strong) = (Support(1), Support(5));

        Assert.True(strong.OwnVolumeMl > weak.OwnVolumeMl);
        Assert.Equal(weak.MeanPressureCmH2O, strong.MeanPressureCmH2O);
        Assert.Equal(0, strong.MachineRatePerMin);
        Expect.Near(8 + (10 / 3.0), strong.MeanPressureCmH2O, 1e-9, "a third of the cycle at 10 above 8");

        Delivered Support(double muscles) => VentilatorModel.Deliver(Given.PressureSupport, Given.Patient, new OwnBreathing(20, 250, muscles));
    }

    [Theory]
    [InlineData(VentilationMode.PressureControl)]
    [InlineData(VentilationMode.VolumeControl)]
    public void AssistedModes_PatientFasterThanTheSetRate_FollowThePatient(VentilationMode mode)
    {
        var settings = mode == VentilationMode.PressureControl ? Given.PressureControl : Given.VolumeControl;

        Assert.Equal(20, VentilatorModel.Deliver(settings, Given.Patient, new OwnBreathing(12, 250, 0)).MachineRatePerMin);
        Assert.Equal(26, VentilatorModel.Deliver(settings, Given.Patient, new OwnBreathing(26, 250, 0)).MachineRatePerMin);
    }

    [Fact]
    public void Deliver_ModeWithoutModel_IsRefused() =>
        Assert.Throws<NotSupportedException>(() => VentilatorModel.Deliver(new SettingChange { Mode = VentilationMode.Cpap }, Given.Patient, None));
}
