using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Timelines;

/// <summary>The series behind the lanes of the timeline.</summary>
/// <param name="From">The first instant.</param>
/// <param name="To">The last instant.</param>
/// <param name="Series">The lines.</param>
/// <param name="Marks">What happened, oldest first.</param>
public sealed record Timeline(Instant From, Instant To, IReadOnlyList<TimelineSeries> Series, IReadOnlyList<TimelineMark> Marks)
{
    /// <summary>The timeline of a window that holds the entries of the range and the last of each kind before it.</summary>
    public static Timeline Of(ChartWindow window, Instant from, Instant to) => new(
        from,
        to,
        [.. Settings(window, from, to), .. Gases(window, from, to), .. Checks(window, from, to)],
        [.. TimelineMarks.Of(window, from, to)]);

    private static IEnumerable<TimelineSeries> Settings(ChartWindow window, Instant from, Instant to)
    {
        yield return Stepped("pHighCmH2O", "P high", "cmH2O", s => (double?)s.Body.PHighCmH2O);
        yield return Stepped("pLowCmH2O", "P low", "cmH2O", s => (double?)s.Body.PLowCmH2O);
        yield return Stepped("peepCmH2O", "PEEP", "cmH2O", s => (double?)s.Body.PeepCmH2O);
        yield return Stepped(ValueNames.MeanAirwayPressureComputed, "mean airway pressure", "cmH2O", s => MeanPressure.Computed(s, null).Value);
        yield return Stepped("tHighS", "T high", "s", s => (double?)s.Body.THighS);
        yield return Stepped("tLowS", "T low", "s", s => (double?)s.Body.TLowS);
        yield return Stepped("fiO2", "FiO2", "", s => (double?)s.Body.FiO2);

        TimelineSeries Stepped(string name, string label, string unit, Func<Charted<SettingChange>, double?> value) => new(
            name, label, unit, true, [.. InRange<SettingChange>(window, EntryKind.SettingChange, from, to, true).Select(s => new TimelinePoint(s.At, value(s), s.Id))]);
    }

    private static IEnumerable<TimelineSeries> Gases(ChartWindow window, Instant from, Instant to)
    {
        var gases = GasPairing.Arterial(window, to).Where(g => g.Gas.At >= from).ToList();
        yield return Line(ValueNames.PfRatio, "P/F", "mmHg", g => g.Values[ValueNames.PfRatio].Value);
        yield return Line(ValueNames.OxygenationIndex, "oxygenation index", "", g => g.Values[ValueNames.OxygenationIndex].Value);
        yield return Line("pH", "pH", "", g => (double?)g.Gas.Body.PH);
        yield return Line("paCO2MmHg", "PaCO2", "mmHg", g => GasPairing.Tension(g.Gas, "pCO2", "PaCO2", b => b.PCO2).Value);
        yield return Line("paO2MmHg", "PaO2", "mmHg", g => GasPairing.Tension(g.Gas, "pO2", "PaO2", b => b.PO2).Value);

        TimelineSeries Line(string name, string label, string unit, Func<PairedGas, double?> value) =>
            new(name, label, unit, false, [.. gases.Select(g => new TimelinePoint(g.Gas.At, value(g), g.Gas.Id))]);
    }

    private static IEnumerable<TimelineSeries> Checks(ChartWindow window, Instant from, Instant to)
    {
        var checks = InRange<VentilatorCheck>(window, EntryKind.VentilatorCheck, from, to, false).Select(c => new CheckValues(window, c)).ToList();
        yield return Read(ValueNames.MeanAirwayPressureMeasured, "mean airway pressure, measured", "cmH2O", c => c.MeanAirwayPressureCmH2O);
        yield return Computed(ValueNames.EndReleaseFlowPercent, "end-release flow", "% of peak");
        yield return Computed(ValueNames.ReleaseVolumePerKg, "release volume", "mL/kg");
        yield return Read("spO2Percent", "SpO2", "%", c => c.SpO2Percent);
        yield return Read("totalMinuteVolumeLMin", "total minute volume", "L/min", c => c.TotalMinuteVolumeLMin);
        yield return Read("totalRatePerMin", "total rate", "/min", c => c.TotalRatePerMin);

        TimelineSeries Computed(string name, string label, string unit) => Line(name, label, unit, c => c[name]?.Value);

        TimelineSeries Read(string name, string label, string unit, Func<VentilatorCheck, decimal?> member) => Line(name, label, unit, c => (double?)member(c.Check.Body));

        TimelineSeries Line(string name, string label, string unit, Func<CheckValues, double?> value) => new(
            name, label, unit, false, [.. checks.Where(c => value(c) is not null).Select(c => new TimelinePoint(c.Check.At, value(c), c.Check.Id))]);
    }

    private static IEnumerable<Charted<T>> InRange<T>(ChartWindow window, EntryKind kind, Instant from, Instant to, bool withLastBefore)
        where T : Entry
    {
        var all = window.Of<T>(kind, to).ToList();
        var first = all.FindIndex(e => e.At >= from);
        var start = first < 0 ? all.Count : first;
        return all.Skip(withLastBefore ? Math.Max(0, start - 1) : start);
    }
}
