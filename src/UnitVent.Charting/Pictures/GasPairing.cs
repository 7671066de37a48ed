using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Pictures;

/// <summary>Pairs a gas with the settings in force at its draw and the check that goes with it, and computes what rests on the three.</summary>
public static class GasPairing
{
    private static readonly Duration ChecksNear = Duration.FromMinutes(60);
    private static readonly Duration OxygenSettles = Duration.FromMinutes(10);

    /// <summary>The gas with what belongs to it.</summary>
    public static PairedGas Pair(ChartWindow window, Charted<BloodGas> gas)
    {
        var settings = InForce.SettingsAtDraw(window, gas.Body, gas.At);
        var check = NearestCheck(window, gas.At, settings?.Id);
        return new PairedGas(gas, settings, check)
        {
            Prone = InForce.Prone(window, gas.At),
            Unsettled = Settling.IsDisturbed(window, gas.At) || Settling.OfOxygenLasts(window, settings, gas.At),
            Values = AtDraw(gas, settings, check, ChangedJustBefore(window, gas)).ToDictionary(v => v.Name),
        };
    }

    /// <summary>The arterial gases effective by an instant, paired, oldest first. Of the same sample charted twice the later recorded stands.</summary>
    public static IReadOnlyList<PairedGas> Arterial(ChartWindow window, Instant until) =>
        [.. window.Of<BloodGas>(EntryKind.BloodGas, until)
            .Where(g => g.Body.Specimen == Specimen.Arterial)
            .GroupBy(g => g.Body.SampleNumber ?? g.Id.ToString())
            .Select(g => g.Last())
            .OrderBy(g => g.At).ThenBy(g => g.Entry.Sequence)
            .Select(g => Pair(window, g))];

    private static Charted<VentilatorCheck>? NearestCheck(ChartWindow window, Instant drawn, Guid? settings)
    {
        Charted<VentilatorCheck>? nearest = null;
        foreach (var check in window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, drawn + ChecksNear))
        {
            var near = check.At >= drawn - ChecksNear && InForce.Settings(window, check.At)?.Id == settings;
            if (near && (nearest is not { } best || Distance(check.At, drawn) < Distance(best.At, drawn)))
            {
                nearest = check;
            }
        }

        return nearest;
    }

    private static Duration Distance(Instant one, Instant other) => one > other ? one - other : other - one;

    private static bool ChangedJustBefore(ChartWindow window, Charted<BloodGas> gas)
    {
        if (gas.Body.RelativeToChange == RelativeToChange.Before || window.Latest<SettingChange>(EntryKind.SettingChange, gas.At) is not { } last)
        {
            return false;
        }

        var before = window.Latest<SettingChange>(EntryKind.SettingChange, last.At - Duration.Epsilon);
        var age = gas.At - last.At;
        return before is { } b && age >= Duration.FromMinutes(1) && age < OxygenSettles && PressuresOrOxygenDiffer(b.Body, last.Body);
    }

    private static bool PressuresOrOxygenDiffer(SettingChange one, SettingChange other) =>
        one.FiO2 != other.FiO2 || one.PHighCmH2O != other.PHighCmH2O || one.PLowCmH2O != other.PLowCmH2O || one.PeepCmH2O != other.PeepCmH2O
        || one.InspiratoryPressureAbovePeepCmH2O != other.InspiratoryPressureAbovePeepCmH2O || one.PressureSupportCmH2O != other.PressureSupportCmH2O;

    private static IEnumerable<PictureValue> AtDraw(
        Charted<BloodGas> gas, Charted<SettingChange>? settings, Charted<VentilatorCheck>? check, bool changedJustBefore)
    {
        var mean = MeanPressure.Computed(settings, check);
        var measured = MeanPressure.Measured(check);
        yield return mean;
        yield return measured;
        yield return OxygenValues.PaO2FiO2(gas, settings, changedJustBefore);
        yield return OxygenValues.OxygenationIndex(gas, settings, MeanPressure.Best(mean, measured), changedJustBefore);
    }

    internal static Given Tension(Charted<BloodGas> gas, string name, string label, Func<BloodGas, decimal?> member) =>
        member(gas.Body) is { } typed
            ? new Given(name, label, "mmHg", GasConsistency.Tension(typed, gas.Body.TensionUnit).MmHg, gas.At, gas.Id)
            : Given.Missing(name, label, "mmHg");

    internal static Given OxygenFractionAtDraw(Charted<BloodGas> gas, Charted<SettingChange>? settings) => gas.Body.FiO2 is { } slip
        ? new Given("fiO2", "FiO2", "", (double)slip, gas.At, gas.Id)
        : PictureSources.Setting(settings, "fiO2", "FiO2", "", s => s.FiO2);
}
