namespace UnitVent.Simulation.Lung;

/// <summary>The breaths that the patient takes unasked.</summary>
/// <param name="RatePerMin">Breaths a minute.</param>
/// <param name="VolumeMl">Volume of an unsupported breath.</param>
/// <param name="MusclePressureCmH2O">What the muscles add to a supported breath.</param>
public readonly record struct OwnBreathing(double RatePerMin, double VolumeMl, double MusclePressureCmH2O)
{
    private const double FastestPerMin = 45;

    /// <summary>The response to carbon dioxide: rate = drive × (rest + slope × (PaCO2 − set point)), never below zero.</summary>
    public static OwnBreathing Of(PatientParameters patient, double paCO2MmHg)
    {
        var wanted = patient.OwnRatePerMin + (patient.OwnRatePerMmHg * (paCO2MmHg - patient.CarbonDioxideSetPointMmHg));
        var rate = Math.Clamp(patient.Drive * wanted, 0, FastestPerMin);
        return new(rate, patient.OwnVolumeMl, patient.MusclePressureCmH2O);
    }
}
