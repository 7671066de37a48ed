using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules.Oxygen;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>R24: P/F fell in a step although mean airway pressure is equal or higher.</summary>
public sealed class OxygenationWorseRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R24";

    /// <inheritdoc/>
    public override Family Family => Family.Collapse;

    /// <inheritdoc/>
    public override string Seen => "oxygenation worse at equal or higher mean pressure";

    /// <inheritdoc/>
    public override string Levels => "a step alone advisory; a second gas or SpO2 −3 caution; SpO2 under target or PaO2 < 60 mmHg as well urgent";

    /// <inheritdoc/>
    public override string Remarks => "Quiet within 60 min after a pressure rise, across positions, with FiO2 differing by more than 0.1.";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.PfRatio].Value is { } pf
        && pf >= open.Evidence["pfBefore"] * (1 - picture.Window.Unit.Thresholds.OxygenationWorse.StepFall / 2);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var current = picture[ValueNames.PfRatio];
        if (current.Value is not { } pf || picture.LatestGas is not { } latest)
        {
            return CannotTell(current);
        }

        if (latest.Unsettled)
        {
            return CannotTell("The latest gas was drawn before things had settled.");
        }

        var options = picture.Window.Unit.Thresholds.OxygenationWorse;
        var alike = Comparable(picture, latest, options);
        var alone = Fall(alike, [latest], options);
        var twice = alike.Count > 0 ? Fall(alike.Take(alike.Count - 1), [alike[^1], latest], options) : null;
        var step = twice ?? alone;
        return step is null || pf >= options.NotAbovePfMmHg
            ? alike.Count == 0 ? CannotTell("No earlier gas to compare with.") : Clear(latest.Gas.At)
            : Worse(picture, latest, alike, step, twice is not null, options);
    }

    /// <summary>The earlier settled gases of the same epoch and position, at about the same FiO2 and at no higher mean pressure.</summary>
    private static List<PairedGas> Comparable(PatientPicture picture, PairedGas latest, OxygenationWorseOptions options)
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

    private static Step? Fall(IEnumerable<PairedGas> earlier, IReadOnlyList<PairedGas> fallen, OxygenationWorseOptions options)
    {
        var reference = earlier.Select(Point).ToList();
        var steps = fallen.Select(g => Step.Of(reference, Point(g))).ToList();
        return steps.All(s => s?.RelativeChange <= -options.StepFall) ? steps[^1] : null;
    }

    private RuleOutcome Worse(PatientPicture picture, PairedGas latest, List<PairedGas> alike, Step step, bool twice, OxygenationWorseOptions options)
    {
        var spO2 = OxygenReadings.SpO2(picture);
        var spO2Before = alike.Select(OxygenReadings.SpO2AtDraw).OfType<double>().DefaultIfEmpty(double.NaN).Average();
        var low = spO2?.Percent < OxygenReadings.TargetLow(picture) || OxygenReadings.PaO2(latest) < options.UrgentPaO2MmHg;
        var desaturated = spO2Before - spO2?.Percent >= options.SpO2FallPoints;
        var level = low ? Severity.Urgent : twice || desaturated ? Severity.Caution : Severity.Advisory;
        var mean = Mean(latest);
        var says = $"P/F {Numbers.Fixed(step.Before)} → {Numbers.Fixed(step.After)} in {Times.Hours(step.Span)}"
            + (mean is { } m ? $" at mean pressure {Numbers.Fixed(m)}" : "")
            + (desaturated ? $"; SpO2 {Numbers.Fixed(spO2Before)} → {Numbers.Fixed(spO2!.Value.Percent)} %" : "");
        return Raise(
            level,
            says,
            "end-release flow, release volume, secretions, tube position, effusion, pneumothorax, position, fluid balance",
            latest.Gas.At,
            Evidence.Of(
                -step.RelativeChange,
                [latest.Gas.Id, .. alike.Select(g => (Guid?)g.Gas.Id)],
                [("pfBefore", step.Before), ("pfAfter", step.After), .. mean is { } cmH2O ? new[] { ("meanAirwayPressure", cmH2O) } : []]));
    }

    private static SeriesPoint Point(PairedGas gas) => new(gas.Gas.At, Pf(gas)!.Value);

    private static double? Pf(PairedGas gas) => gas.Values[ValueNames.PfRatio].Value;

    private static double? Mean(PairedGas gas) => gas.Values[ValueNames.MeanAirwayPressureComputed].Value ?? gas.Values[ValueNames.MeanAirwayPressureMeasured].Value;
}
