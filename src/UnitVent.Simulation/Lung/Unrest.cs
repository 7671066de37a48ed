using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Lung;

/// <summary>The slow wander of a patient whom nothing happens to. Has to be asked in order of time.</summary>
/// <remarks>
/// Small against what one gas may differ from the next: within stable intensive-care patients PaO2 varies by 5.1 % and PaCO2 by 3.0 %
/// (Chest 1983;84:14-18), measurement included. How slow it is, and the shares, are common practice.
/// </remarks>
public sealed class Unrest(KeyedRandom random)
{
    private const double CorrelationHours = 6;

    private readonly Wander compliance = new(random.For("compliance"), CorrelationHours);
    private readonly Wander shunt = new(random.For("shunt"), CorrelationHours);
    private readonly Wander metabolism = new(random.For("metabolism"), CorrelationHours);
    private readonly Wander breathing = new(random.For("breathing"), CorrelationHours);
    private readonly Wander circulation = new(random.For("circulation"), CorrelationHours);

    public PatientParameters Of(PatientParameters calm, double hour) => calm with
    {
        ComplianceMlPerCmH2O = calm.ComplianceMlPerCmH2O * (1 + (0.015 * compliance.At(hour))),
        ShuntFraction = calm.ShuntFraction * (1 + (0.02 * shunt.At(hour))),
        CarbonDioxideOutputMlMin = calm.CarbonDioxideOutputMlMin * (1 + (0.015 * metabolism.At(hour))),
        OwnRatePerMin = calm.OwnRatePerMin * (1 + (0.04 * breathing.At(hour))),
        MeanArterialPressureMmHg = calm.MeanArterialPressureMmHg + (2 * circulation.At(hour)),
    };
}
