using UnitVent.Simulation.Ventilator;

namespace UnitVent.Simulation;

/// <summary>What is true of a simulated patient at one moment, before anyone measures it.</summary>
public sealed record PatientState(Delivered Delivered, double PaO2MmHg, double PaCO2MmHg, double PH, double SaO2Percent, double EtCO2MmHg);
