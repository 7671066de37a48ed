using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Trends;

/// <summary>The valid points of a patient's series within the unit's window and the present epoch: settled, of the present mode, each computed with what was in force at its own time.</summary>
internal sealed class EpochSeries
{
    private readonly ChartWindow window;
    private readonly List<PairedGas> gases;
    private readonly List<Charted<VentilatorCheck>> valid;
    private readonly Dictionary<Instant, List<PictureValue>> ofGasAt = [];

    public EpochSeries(PatientPicture picture)
    {
        window = picture.Window;
        From = Instant.Max(picture.AsOf - window.Unit.DriftWindow, InForce.EpochStart(window, picture.AsOf));
        var mode = picture.Settings?.Body.Mode;
        gases = [.. picture.Gases.Where(g => g.Gas.At >= From && g.Settings?.Body.Mode == mode && !Settling.IsDisturbed(window, g.Gas.At))];
        valid = [.. window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf)
            .Where(c => c.At >= From && InForce.Settings(window, c.At)?.Body.Mode == mode && !Settling.IsDisturbed(window, c.At))];
    }

    /// <summary>From when points count: the unit's window ago, or when mode, position, relaxant, ECMO or a drain last changed.</summary>
    public Instant From { get; }

    private List<CheckValues> Checks => field ??= [.. valid.Select(c => new CheckValues(window, c))];

    /// <summary>A value that rests on the oxygen of a gas.</summary>
    public IEnumerable<SeriesPoint> OfOxygen(string name) => Points(gases.Where(g => !g.Unsettled), g => g.Gas.At, g => g.Gas.Id, g => g.Values[name].Value);

    /// <summary>A value that rests on the carbon dioxide of a gas; a slip that does not fit itself is left out.</summary>
    public IEnumerable<SeriesPoint> OfCarbonDioxide(Func<PairedGas, double?> value) => Points(
        gases.Where(g => !Settling.OfCarbonDioxideLasts(window, g.Settings, g.Gas.At) && !(GasConsistency.Of(g.Gas.Body)?.BeyondRounding > GasConsistency.CautionBeyond)),
        g => g.Gas.At,
        g => g.Gas.Id,
        value);

    /// <summary>What the picture makes of a gas when it is the latest.</summary>
    public double? AtDraw(PairedGas gas, string name) => Value(gas.Gas.At, name, gas.Gas.Id);

    /// <summary>What the picture makes of a gas and its check together, once both are there.</summary>
    public double? WithCheck(PairedGas gas, string name) => gas.Check is { } check
        ? Value(Instant.Max(gas.Gas.At, check.At), name, gas.Gas.Id, check.Id)
        : null;

    /// <summary>A value of the checks.</summary>
    public IEnumerable<SeriesPoint> OfChecks(Func<CheckValues, double?> value) => Points(Checks, c => c.Check.At, c => c.Check.Id, value);

    /// <summary>The pulse oximeter's readings; while oxygen settles they are left out.</summary>
    public IEnumerable<SeriesPoint> Saturation() =>
        OfChecks(c => Settling.OfOxygenLasts(window, InForce.Settings(window, c.Check.At), c.Check.At) ? null : (double?)c.Check.Body.SpO2Percent);

    /// <summary>The mechanics of the releases: effort and leaks make them void, and an estimate counts only within its validated range.</summary>
    public IEnumerable<SeriesPoint> Mechanics(string name) => OfChecks(c =>
        c[name] is { } value && (value.Kind != ValueKind.Estimated || value.State == ValueState.Ok) && ReleaseChecks.NotValid(c.Check.Body, Leaks(c.Check.At)) is null
            ? value.Value
            : null);

    /// <summary>The same, of checks whose end-release flow lies within a range of per cent of peak.</summary>
    public IEnumerable<SeriesPoint> Mechanics(string name, double endFlowFrom, double endFlowTo)
    {
        var within = OfChecks(c => c[ValueNames.EndReleaseFlowPercent]?.Value).Where(p => p.Value >= endFlowFrom && p.Value <= endFlowTo).Select(p => p.Entry).ToHashSet();
        return Mechanics(name).Where(p => within.Contains(p.Entry));
    }

    private bool Leaks(Instant at) => InForce.Context(window, at).Any(c => c.Body.Flag == Circumstance.AirLeak);

    /// <summary>A value as the picture shows it at an instant, when it rests on these entries.</summary>
    private double? Value(Instant at, string name, params Guid[] entries)
    {
        if (!ofGasAt.TryGetValue(at, out var values))
        {
            ofGasAt[at] = values = [.. GasValues.Of(new PictureSources(window, at))];
        }

        var value = values.First(v => v.Name == name);
        return entries.All(e => value.Inputs.Any(i => i.Entry == e)) ? value.Value : null;
    }

    // Rounded so that equal values tie in spite of what their binary fractions add.
    private static IEnumerable<SeriesPoint> Points<T>(IEnumerable<T> from, Func<T, Instant> at, Func<T, Guid> entry, Func<T, double?> value) =>
        from.Select(x => (X: x, Value: value(x))).Where(p => p.Value is not null).Select(p => new SeriesPoint(at(p.X), Math.Round(p.Value!.Value, 9), entry(p.X)));
}
