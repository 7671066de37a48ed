using System.Text.Json;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;
using UnitVent.Simulation.Demo;
using UnitVent.Simulation.Lung;

namespace UnitVent.Simulation.Cohort;

/// <summary>Puts one deterioration into a story.</summary>
internal static class Planting
{
    private const double SuddenHours = 0.1;

    /// <summary>What changes in the lung from an hour on.</summary>
    public static Course Course(Deterioration? kind, PatientParameters calm, double hour)
    {
        return kind switch
        {
            Deterioration.ComplianceFalling => new() { ComplianceMlPerCmH2O = Ramp(calm.ComplianceMlPerCmH2O, 0.60 * calm.ComplianceMlPerCmH2O, 10) },
            Deterioration.OwnBreathingFading => new() { Drive = Ramp(1, 0.25, 8) },
            Deterioration.ShuntRising => new() { ShuntFraction = Ramp(calm.ShuntFraction, calm.ShuntFraction + 0.13, 9) },
            Deterioration.ResistanceRising => new()
            {
                InspiratoryResistanceCmH2OSPerL = Ramp(calm.InspiratoryResistanceCmH2OSPerL, 2.3 * calm.InspiratoryResistanceCmH2OSPerL, 8),
                ExpiratoryResistanceCmH2OSPerL = Ramp(calm.ExpiratoryResistanceCmH2OSPerL, 2.3 * calm.ExpiratoryResistanceCmH2OSPerL, 8),
            },
            Deterioration.DeepSedation => new() { Drive = Ramp(1, 0, 1), Rass = Ramp(calm.Rass, -4, 1) },
            Deterioration.Pneumothorax => new()
            {
                ShuntFraction = Ramp(calm.ShuntFraction, calm.ShuntFraction + 0.18, SuddenHours),
                ComplianceMlPerCmH2O = Ramp(calm.ComplianceMlPerCmH2O, 0.55 * calm.ComplianceMlPerCmH2O, SuddenHours),
                MeanArterialPressureMmHg = Ramp(calm.MeanArterialPressureMmHg, calm.MeanArterialPressureMmHg - 22, SuddenHours),
            },
            _ => new(),
        };

        Keyframe[] Ramp(double from, double to, double hours) => [new(hour, from), new(hour + hours, to)];
    }

    /// <summary>What is set: at the start, and what the deterioration begins with.</summary>
    public static IReadOnlyList<ScriptedEntry> Script(Deterioration? kind, SettingChange settings, double hour)
    {
        var changed = kind switch
        {
            Deterioration.ReleaseLengthened => settings with { TLowS = 2 * settings.TLowS },
            Deterioration.OwnBreathingFading => settings with { THighS = Math.Round(1.3m * settings.THighS!.Value, 1) },
            _ => null,
        };
        return changed is null ? [At(0, settings)] : [At(0, settings), At(hour, changed)];
    }

    private static ScriptedEntry At(double hour, SettingChange settings) => new()
    {
        Hour = hour,
        By = UnitRoleName.Therapist,
        Kind = EntryKind.SettingChange,
        Body = JsonSerializer.SerializeToElement(settings, ChartJson.Options),
    };
}
