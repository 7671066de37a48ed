using MathNet.Numerics.Statistics;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Timing;

/// <summary>R01: the release lasts long, so that the flow falls far before it ends.</summary>
public sealed class ReleasedLongRule : Rule
{
    private const double HalfImportantChange = 5; // half of 10 points, the minimum important change of the ratio [common practice]

    /// <inheritdoc/>
    public override string Id => "R01";

    /// <inheritdoc/>
    public override Family Family => Family.Timing;

    /// <inheritdoc/>
    public override string Seen => "released long: end-release flow low, % of peak";

    /// <inheritdoc/>
    public override Family? Joins => Family.Collapse;

    /// <inheritdoc/>
    public override string Levels => "fixed rate: 5 points under the target caution, under the target twice advisory; flow-guided: 15 points caution, 10 points twice advisory; under the target and 10 points under the median of the drift window before, twice, caution; under 25 % urgent when P low is under 5 cmH2O";

    /// <inheritdoc/>
    public override string Remarks => "The target of the patient shifts the edges. Quiet with effort during the release, a leak, two levels; one release: one level lower; obstructive: own edges.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.EndReleaseFlowPercent].Value is not { } percent
        || (Edges.Of(picture) is var edges
            && percent >= Math.Max(edges.Caution, Math.Min(edges.Target, open.Evidence.GetValueOrDefault("fellUnderPercent"))) + HalfImportantChange);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var flow = picture[ValueNames.EndReleaseFlowPercent];
        if (flow.Value is not { } percent || flow.AsOf is not { } at)
        {
            return CannotTell(flow);
        }

        var check = ReleaseChecks.WithFlows(picture)[^1];
        if (picture.Method == SettingMethod.TwoLevel || ReleaseChecks.NotValid(picture, check) is not null)
        {
            return CannotTell(ReleaseChecks.NotValid(picture, check) ?? "Not judged when two levels are set.");
        }

        var edges = Edges.Of(picture);
        var fellFrom = FellFrom(picture, edges);
        if (Level(picture, percent, edges, fellFrom) is not { } level)
        {
            return Clear(at);
        }

        var few = ReleaseChecks.AreFew(check.Body);
        var says = $"release ended at {Numbers.Fixed(percent)} % of peak, edge {Numbers.Fixed(edges.Caution)} %"
            + (fellFrom is { } from ? $"; in the hours before {Numbers.Fixed(from)} %" : "") + (few ? "; one release" : "");
        return Raise(
            level.LoweredIf(few),
            says,
            "flow trace, T low, stiffening, collapse, one-lung tube, pneumothorax, leak",
            at,
            Evidence.Of(-percent, [check.Id], ("endReleaseFlowPercent", percent), ("edgePercent", edges.Caution), ("fellUnderPercent", (fellFrom ?? 0) - Options(picture).FallPoints)));
    }

    private static ReleasedLongOptions Options(PatientPicture picture) => picture.Window.Unit.Thresholds.ReleasedLong;

    private static Severity? Level(PatientPicture picture, double percent, Edges edges, double? fellFrom)
    {
        var before = ReleaseChecks.WithFlows(picture) is { Count: > 1 } checks ? ReleaseChecks.EndFlowPercent(checks[^2].Body) : null;
        return percent < edges.Urgent ? (edges.PLowHolds ? Severity.Caution : Severity.Urgent)
            : percent < edges.Caution || fellFrom is not null ? Severity.Caution
            : percent < edges.Advisory && before < edges.Advisory ? Severity.Advisory
            : null;
    }

    /// <summary>What the release ended at in the hours before, when the last two checks lie under the target and far under that; else null.</summary>
    private static double? FellFrom(PatientPicture picture, Edges edges)
    {
        var checks = ReleaseChecks.WithFlows(picture).Where(c => ReleaseChecks.NotValid(picture, c) is null).ToList();
        if (checks.Count < 3)
        {
            return null;
        }

        var percents = checks.Where(c => c.At >= checks[^2].At - picture.Window.Unit.DriftWindow).Select(c => ReleaseChecks.EndFlowPercent(c.Body)!.Value).ToList();
        var higher = Math.Max(percents[^1], percents[^2]);
        return percents.Count > 2 && higher < edges.Target && percents.SkipLast(2).Median() is var median && median - higher >= Options(picture).FallPoints ? median : null;
    }

    private readonly record struct Edges(double Urgent, double Caution, double Advisory, double Target, bool PLowHolds)
    {
        public static Edges Of(PatientPicture picture)
        {
            var options = Options(picture);
            var holds = (double?)picture.Settings?.Body.PLowCmH2O >= options.PLowThatHoldsCmH2O;
            if (picture.Has(Circumstance.Obstructive))
            {
                return new(options.ObstructiveUrgentUnder, options.ObstructiveEdge, options.ObstructiveEdge, options.ObstructiveEdge, holds);
            }

            var target = EndFlowTarget.Percent(picture);
            return picture.Method == SettingMethod.FixedRate
                ? new(options.UrgentUnder, target - options.FixedRateCautionBelow, target, target, holds)
                : new(options.UrgentUnder, target - options.FlowGuidedCautionBelow, target - options.FlowGuidedAdvisoryBelow, target, holds);
        }
    }
}
