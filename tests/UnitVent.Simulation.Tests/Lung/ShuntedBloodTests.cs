using UnitVent.Physiology;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Tests.Lung;

public sealed class ShuntedBloodTests
{
    private static readonly BloodPH PH = BloodPH.FromPH(7.38);
    private static readonly PartialPressure PaCO2 = PartialPressure.FromMmHg(44);
    private static readonly BarometricPressure SeaLevel = BarometricPressure.FromMmHg(760);

    [Theory]
    [InlineData(0.05)]
    [InlineData(0.20)]
    [InlineData(0.40)]
    public void ArterialPO2_PutBackIntoTheShuntEquation_GivesTheShunt(double shunt)
    {
        var patient = Given.Patient with { ShuntFraction = shunt };
        var fiO2 = OxygenFraction.FromFraction(0.6);

        var arterial = Content(ShuntedBlood.ArterialPO2(patient, fiO2, SeaLevel, PH, PaCO2).MmHg, patient);
        var capillary = Content(AlveolarGas.AlveolarPO2(fiO2, SeaLevel, PaCO2).MmHg, patient);
        var venous = arterial - (patient.CarbonDioxideOutputMlMin / 0.8 / (10 * patient.CardiacOutputLMin));

        Expect.Near(shunt, (capillary - arterial) / (capillary - venous), 1e-4, "Qs/Qt = (Cc − Ca) / (Cc − Cv)");
    }

    [Fact]
    public void ArterialPO2_WithoutShunt_IsAlveolar()
    {
        var fiO2 = OxygenFraction.FromFraction(0.4);

        var arterial = ShuntedBlood.ArterialPO2(Given.Patient with { ShuntFraction = 0 }, fiO2, SeaLevel, PH, PaCO2);

        Expect.Near(AlveolarGas.AlveolarPO2(fiO2, SeaLevel, PaCO2).MmHg, arterial.MmHg, 1e-3, "nothing is mixed in");
    }

    [Fact]
    public void ArterialPO2_OfALargeShunt_HardlyAnswersToOxygen()
    {
        var patient = Given.Patient with { ShuntFraction = 0.5 };

        var gained = ShuntedBlood.ArterialPO2(patient, OxygenFraction.FromFraction(1.0), SeaLevel, PH, PaCO2).MmHg
            - ShuntedBlood.ArterialPO2(patient, OxygenFraction.FromFraction(0.5), SeaLevel, PH, PaCO2).MmHg;

        Assert.InRange(gained, 0, 15);
    }

    private static double Content(double pO2MmHg, PatientParameters patient) => ShuntedBlood.Content(pO2MmHg, patient.HaemoglobinGDl, PH, PaCO2);
}
