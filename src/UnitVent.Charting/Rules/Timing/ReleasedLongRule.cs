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
    public override string Levels => "fixed rate: 5 points under the target caution, under the target twice advisory; flow-guided: 15 points caution, 10 points twice advisory; under 25 % urgent when P low is under 5 cmH2O";

    /// <inheritdoc/>
    public override string Remarks => "The target of the patient shifts the edges. Quiet with effort during the release, a leak, two levels; one release: one level lower; obstructive: own edges.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.EndReleaseFlowPercent].Value is not { } percent || percent >= Edges.Of(picture).Caution + HalfImportantChange;

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
        if (Level(picture, percent, edges) is not { } level)
        {
            return Clear(at);
        }

        var few = ReleaseChecks.AreFew(check.Body);
        var says = $"release ended at {Numbers.Fixed(percent)} % of peak, edge {Numbers.Fixed(edges.Caution)} %{(few ? "; one release" : "")}";
        return Raise(
            level.LoweredIf(few),
            says,
            "flow trace, T low, stiffening, collapse, one-lung tube, pneumothorax, leak",
            at,
            Evidence.Of(-percent, [check.Id], ("endReleaseFlowPercent", percent), ("edgePercent", edges.Caution)));
    }

    private static Severity? Level(PatientPicture picture, double percent, Edges edges)
    {
        var before = ReleaseChecks.WithFlows(picture) is { Count: > 1 } checks ? ReleaseChecks.EndFlowPercent(checks[^2].Body) : null;
        return percent < edges.Urgent ? (edges.PLowHolds ? Severity.Caution : Severity.Urgent)
            : percent < edges.Caution ? Severity.Caution
            : percent < edges.Advisory && before < edges.Advisory ? Severity.Advisory
            : null;
    }

    private readonly record struct Edges(double Urgent, double Caution, double Advisory, bool PLowHolds)
    {
        public static Edges Of(PatientPicture picture)
        {
            var options = picture.Window.Unit.Thresholds.ReleasedLong;
            var holds = (double?)picture.Settings?.Body.PLowCmH2O >= options.PLowThatHoldsCmH2O;
            if (picture.Has(Circumstance.Obstructive))
            {
                return new(options.ObstructiveUrgentUnder, options.ObstructiveEdge, options.ObstructiveEdge, holds);
            }

            var target = EndFlowTarget.Percent(picture);
            return picture.Method == SettingMethod.FixedRate
                ? new(options.UrgentUnder, target - options.FixedRateCautionBelow, target, holds)
                : new(options.UrgentUnder, target - options.FlowGuidedCautionBelow, target - options.FlowGuidedAdvisoryBelow, holds);
        }
    }
}
