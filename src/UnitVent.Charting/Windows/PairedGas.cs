using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Windows;

/// <summary>A gas together with the settings in force when it was drawn and the check that goes with it.</summary>
/// <param name="Gas">The gas.</param>
/// <param name="Settings">The settings in force at the draw; null when none were charted.</param>
/// <param name="Check">The nearest check in the same settings epoch within 60 min; null when there is none.</param>
public sealed record PairedGas(Charted<BloodGas> Gas, Charted<SettingChange>? Settings, Charted<VentilatorCheck>? Check)
{
    /// <summary>Gets the values of the gas: P/F, mean airway pressure, oxygenation index, each at its draw.</summary>
    public required IReadOnlyDictionary<string, Pictures.PictureValue> Values { get; init; }

    /// <summary>Gets the FiO2 at the draw as a fraction: the slip's own, else the setting's; null when neither is known.</summary>
    public double? FiO2 => (double?)(Gas.Body.FiO2 ?? Settings?.Body.FiO2);

    /// <summary>Gets whether the patient lay prone at the draw.</summary>
    public bool Prone { get; init; }

    /// <summary>Gets whether the gas was drawn within 20 min after suction, disconnection, bronchoscopy or a turn, or before its settings had settled.</summary>
    public bool Unsettled { get; init; }
}
