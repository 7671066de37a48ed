using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>A fall of P/F up to the latest gas.</summary>
/// <param name="Step">From the reference to the latest gas.</param>
/// <param name="Important">The relative fall that counts for one of its kind.</param>
/// <param name="Lasting">Whether more than one gas shows it.</param>
internal sealed record OxygenationFall(Step Step, double Important, bool Lasting)
{
    /// <summary>The fall of the latest gas against comparable ones, in a step or as a drift; null without one.</summary>
    public static OxygenationFall? Of(PatientPicture picture, List<PairedGas> alike, PairedGas latest, OxygenationWorseOptions options) =>
        InAStep(alike.Take(alike.Count - 1), [alike[^1], latest], options) is { } twice ? new(twice, options.StepFall, true)
        : Drifted(picture, alike, latest, options) is { } drift ? new(drift, options.TrendFall, true)
        : InAStep(alike, [latest], options) is { } once ? new(once, options.StepFall, false)
        : null;

    /// <summary>The earlier settled gases of the same epoch and position, at about the same FiO2 and at no higher mean pressure.</summary>
    public static List<PairedGas> Comparable(PatientPicture picture, PairedGas latest, OxygenationWorseOptions options)
    {
        var epoch = InForce.EpochStart(picture.Window, latest.Gas.At);
        return [.. picture.Gases.Where(g => g.Gas.At < latest.Gas.At
            && g.Gas.At >= epoch
            && !g.Unsettled
            && g.Prone == latest.Prone
            && Pf(g) is not null
            && Math.Abs((g.FiO2 ?? 0) - (latest.FiO2 ?? 0)) <= options.FiO2Within
            && (Mean(g) is not { } before || Mean(latest) is not { } now || now >= before - options.MeanPressureMayFallCmH2O))];
    }

    /// <summary>Mean airway pressure at the draw of a gas.</summary>
    public static double? Mean(PairedGas gas) => gas.Values[ValueNames.MeanAirwayPressureComputed].Value ?? gas.Values[ValueNames.MeanAirwayPressureMeasured].Value;

    private static Step? InAStep(IEnumerable<PairedGas> earlier, IReadOnlyList<PairedGas> fallen, OxygenationWorseOptions options)
    {
        var reference = earlier.Select(Point).ToList();
        var steps = fallen.Select(g => Step.Of(reference, Point(g))).ToList();
        return steps.All(s => s?.RelativeChange <= -options.StepFall) ? steps[^1] : null;
    }

    /// <summary>The fall by drift, held against its start, while the latest gas is not halfway back.</summary>
    private static Step? Drifted(PatientPicture picture, List<PairedGas> alike, PairedGas latest, OxygenationWorseOptions options)
    {
        var from = picture.AsOf - picture.Window.Unit.DriftWindow;
        var variable = DriftVariables.PfRatio with { TrendMinimum = MinimumChange.OfShare(options.TrendFall) };
        var drift = Drift.Of(alike.Append(latest).Select(Point).Where(p => p.At >= from), variable);
        return drift is { Verdict: DriftVerdict.Drifting, Course: DriftCourse.Worse, StartMedian: { } start } && Pf(latest) <= start * (1 - options.TrendFall / 2)
            ? new(start, Pf(latest)!.Value, drift.Count, drift.Span)
            : null;
    }

    private static SeriesPoint Point(PairedGas gas) => new(gas.Gas.At, Math.Round(Pf(gas)!.Value, 9));

    private static double? Pf(PairedGas gas) => gas.Values[ValueNames.PfRatio].Value;
}
