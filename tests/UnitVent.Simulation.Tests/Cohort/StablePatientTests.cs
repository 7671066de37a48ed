using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Cohort;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Tests.Cohort;

/// <summary>Patients whom nothing happens to are, before wander and measurement, inside every window that the rules look at by default.</summary>
public sealed class StablePatientTests
{
    private static readonly BarometricPressure SeaLevel = BarometricPressure.FromAltitude(0);

    public static TheoryData<int> Numbers { get; } = [.. Enumerable.Range(0, 40)];

    [Theory]
    [MemberData(nameof(Numbers))]
    public void StablePatient_UnderTheirSettings_AreWhatWasDrawn(int number)
    {
        var drawn = new StablePatient(new Draw(new KeyedRandom(4).For(number)));
        var patient = new VentilatedPatient(drawn.Lung(SeaLevel), drawn.Settings, SeaLevel);
        var (state, truth) = (patient.Observe(), TrueValues.Of(patient));
        var guided = drawn.Facts(number).Method == SettingMethod.FlowGuided;

        Assert.InRange(state.PaCO2MmHg, 39.9, 50.1);
        Assert.InRange(state.PH, 7.33, 7.44);
        Assert.InRange(state.PaO2MmHg, 67.9, 80.1);
        Assert.InRange(state.SaO2Percent, 92, 96);
        Assert.InRange(truth.OwnSharePercent, 19.9, 34.1);
        Assert.InRange(truth.EndOfPeakPercent, guided ? 73.9 : 56.9, guided ? 80.1 : 68.1);
        Assert.InRange(state.Delivered.MachineRatePerMin, 8, 14);
        Assert.InRange(state.Delivered.OwnRatePerMin, 2, 25);
        Assert.InRange(patient.Parameters.ShuntFraction, 0.05, 0.5);
    }
}
