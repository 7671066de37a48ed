using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Checking;

/// <summary>Holds a gas against itself and against the settings at its draw, before it is saved.</summary>
public static class GasCheck
{
    private const double MmHgPO2BelowWhichKPaIsLikely = 25; // common practice
    private const double MmHgPCO2BelowWhichKPaIsLikely = 15; // common practice
    private const decimal OxygenFractionTolerance = 0.05m; // common practice

    private static readonly Duration CloseToChange = Duration.FromMinutes(10);

    internal static IEnumerable<FieldError> Verdict(BloodGas gas, ChartWindow window) =>
        Specimen(gas).Concat(Unit(gas)).Concat(Consistency(gas)).Concat(Settings(gas, window));

    private static IEnumerable<FieldError> Specimen(BloodGas gas)
    {
        if (gas is { Specimen: Entries.Specimen.Arterial, PO2: null })
        {
            yield return new("pO2", "missing", "pO2 is needed in an arterial gas.");
        }

        if (gas is { TemperatureCorrected: true, TemperatureC: null })
        {
            yield return new("temperatureC", "missing", "Values corrected for temperature need the temperature.");
        }
    }

    private static IEnumerable<FieldError> Unit(BloodGas gas)
    {
        if (gas.TensionUnit == TensionUnit.MmHg
            && ((gas.Specimen == Entries.Specimen.Arterial && (double?)gas.PO2 < MmHgPO2BelowWhichKPaIsLikely) || (double?)gas.PCO2 < MmHgPCO2BelowWhichKPaIsLikely))
        {
            yield return new("tensionUnit", "ask.tensionUnit", $"pCO2 {gas.PCO2} and pO2 {gas.PO2} mmHg are very low: did you mean kPa?");
        }
    }

    private static IEnumerable<FieldError> Consistency(BloodGas gas)
    {
        if (GasConsistency.Of(gas) is { BeyondRounding: > GasConsistency.CautionBeyond } fit)
        {
            yield return new(
                "bicarbonateMmolL",
                "ask.gasConsistency",
                FormattableString.Invariant($"pH {gas.PH}, pCO2 {gas.PCO2} and bicarbonate {gas.BicarbonateMmolL} mmol/L do not fit together: pH would be {fit.PH:0.00}. Is it so?"));
        }
    }

    private static IEnumerable<FieldError> Settings(BloodGas gas, ChartWindow window)
    {
        if (gas.DrawnAt is not { } drawn)
        {
            yield break;
        }

        var settings = InForce.SettingsAtDraw(window, gas, drawn);
        if (settings?.Body.FiO2 is { } set && gas.FiO2 is { } slip && Math.Abs(set - slip) > OxygenFractionTolerance)
        {
            yield return new("fiO2", "ask.fiO2", $"FiO2 on the slip is {slip}, the setting in force at the draw {set}. Is it so?");
        }

        var last = window.Latest<SettingChange>(EntryKind.SettingChange, drawn);
        if (gas.RelativeToChange is null && last is { } change && drawn - change.At is var age && age >= Duration.FromMinutes(1) && age <= CloseToChange)
        {
            yield return new("relativeToChange", "ask.relativeToChange", $"A setting was changed {(int)age.TotalMinutes} min before the draw: before or after the change? Confirmed, it counts as after.");
        }
    }
}
