using UnitVent.Charting.Entries;
using UnitVent.Physiology;
using UnitVent.Simulation.Lung;
using UnitVent.Simulation.Ventilator;

namespace UnitVent.Simulation;

/// <summary>A patient on a ventilator: one-compartment lung, shunt, carbon dioxide stores, own breathing that answers to carbon dioxide.</summary>
/// <remarks>Parameters and settings are free to change at any time; oxygen follows at once, carbon dioxide through its stores.</remarks>
public sealed class VentilatedPatient
{
    private const double LongestStepMin = 5; // short against the stores, so that own breathing may be held constant in a step
    private const double MinutesToSettle = 600;

    private readonly CarbonDioxideStore store = new(40);
    private readonly BarometricPressure barometric;

    /// <summary>A patient in the steady state of these parameters and settings.</summary>
    public VentilatedPatient(PatientParameters parameters, SettingChange settings, BarometricPressure barometric)
    {
        (Parameters, Settings, this.barometric) = (parameters, settings, barometric);
        Advance(MinutesToSettle);
    }

    public PatientParameters Parameters { get; set; }

    public SettingChange Settings { get; set; }

    /// <summary>Lets time pass with parameters and settings as they are.</summary>
    public void Advance(double minutes)
    {
        for (var left = minutes; left > 0; left -= LongestStepMin)
        {
            var alveolar = AlveolarVentilation.LitresPerMinute(Deliver(), Parameters);
            store.Advance(Math.Min(left, LongestStepMin), CarbonDioxideStore.BalanceMmHg(Parameters.CarbonDioxideOutputMlMin, alveolar));
        }
    }

    public PatientState Observe()
    {
        var paCO2 = PartialPressure.FromMmHg(store.PaCO2MmHg);
        var pH = BloodPH.FromPH(MetabolicState.PH(paCO2.MmHg, Parameters.StandardBaseExcessMmolL));
        var paO2 = ShuntedBlood.ArterialPO2(Parameters, OxygenFraction.FromFraction((double)Settings.FiO2!), barometric, pH, paCO2);
        return new PatientState(
            Deliver(), paO2.MmHg, paCO2.MmHg, pH.Value, ShuntedBlood.Saturation(paO2, pH, paCO2).Percent,
            EtCO2MmHg: paCO2.MmHg * (1 - Parameters.AlveolarDeadSpaceFraction));
    }

    private Delivered Deliver() => VentilatorModel.Deliver(Settings, Parameters, OwnBreathing.Of(Parameters, store.PaCO2MmHg));
}
