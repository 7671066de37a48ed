using UnitVent.Physiology;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Ventilator;

/// <summary>A lung between two pressures for two times, over and over.</summary>
/// <remarks>J Appl Physiol 1993;74:922-933: a = exp(−T high / τ insp), b = exp(−T low / τ exp); V = C ΔP (1 − a)(1 − b) / (1 − ab).</remarks>
internal sealed class TwoPressures
{
    private readonly double tauExpiratoryS;

    public TwoPressures(PatientParameters patient, double highCmH2O, double lowCmH2O, double timeHighS, double timeLowS)
    {
        var (high, low) = (AirwayPressure.FromCmH2O(highCmH2O), AirwayPressure.FromCmH2O(lowCmH2O));
        var (timeHigh, timeLow) = (BreathTime.FromSeconds(timeHighS), BreathTime.FromSeconds(timeLowS));
        var compliance = Compliance.FromMlPerCmH2O(patient.ComplianceMlPerCmH2O);
        var tauInspiratory = BreathTime.FromSeconds(patient.InspiratoryResistanceCmH2OSPerL * patient.ComplianceMlPerCmH2O / 1000);
        tauExpiratoryS = patient.ExpiratoryResistanceCmH2OSPerL * patient.ComplianceMlPerCmH2O / 1000;
        var tauExpiratory = BreathTime.FromSeconds(tauExpiratoryS);
        VolumeMl = IncompleteRefilling.ReleaseVolume(compliance, high, low, timeHigh, timeLow, tauInspiratory, tauExpiratory).Millilitres;
        TrappedCmH2O = IncompleteRefilling.TrappedPressure(high, low, timeHigh, timeLow, tauInspiratory, tauExpiratory).CmH2O;
        EndOfPeak = Math.Exp(-timeLowS / tauExpiratoryS);
        FullCmH2O = lowCmH2O + TrappedCmH2O + (VolumeMl / patient.ComplianceMlPerCmH2O);
    }

    public double VolumeMl { get; }

    /// <summary>Above the lower pressure, at its end.</summary>
    public double TrappedCmH2O { get; }

    /// <summary>In the alveoli at the end of the upper pressure.</summary>
    public double FullCmH2O { get; }

    /// <summary>Expiratory flow at the end of the lower pressure as a share of its peak.</summary>
    public double EndOfPeak { get; }

    /// <summary>The flow at which an exponential that gives this volume begins: 60 V / (τ (1 − b)).</summary>
    public double PeakFlowLMin => 60 * VolumeMl / 1000 / (tauExpiratoryS * (1 - EndOfPeak));
}
