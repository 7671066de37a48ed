using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Airway;

/// <summary>R59: the releases empty more slowly from check to check at the same settings.</summary>
public sealed class TimeConstantRisingRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R59";

    /// <inheritdoc/>
    public override Family Family => Family.Airway;

    /// <inheritdoc/>
    public override string Seen => "expiratory time constant rising at the same settings";

    /// <inheritdoc/>
    public override string Levels => "a drift by 35 % advisory; caution when its direction is sure (p ≤ 0.02)";

    /// <inheritdoc/>
    public override string Remarks => "Needs four valid checks over 4 h since pressures and times were last changed.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) => DriftOf(picture).IsBackInside(open.Evidence["before"]);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var now = picture[ValueNames.ExpiratoryTimeConstantS];
        if (now.Value is null)
        {
            return CannotTell(now);
        }

        var drift = ReleaseDrift.ChecksEnough(picture, SettingsHeld.CycleSince(picture)) ? DriftOf(picture) : null;
        return drift is null or { Verdict: DriftVerdict.NotEnoughData } ? CannotTell(ReleaseDrift.NotEnough("settings"))
            : drift is { Verdict: DriftVerdict.Drifting, Course: DriftCourse.Worse } ? Rising(picture, drift)
            : Clear(drift.Points[^1].At);
    }

    private static Drift DriftOf(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.TimeConstantRising;
        var variable = DriftVariables.TimeConstant with { Worse = WorseWhen.Rising, TrendMinimum = MinimumChange.OfShare(options.Rise) };
        return ReleaseDrift.Of(picture, variable, SettingsHeld.CycleSince(picture), options.EndFlowFromPercent, options.EndFlowToPercent);
    }

    private RuleOutcome Rising(PatientPicture picture, Drift drift)
    {
        var (before, after) = (drift.StartMedian!.Value, drift.Points[^1].Value);
        var flow = picture[ValueNames.EndReleaseFlowPercent].Value;
        return Raise(
            ReleaseDrift.Level(drift),
            $"time constant {Numbers.Fixed(before, 2)} → {Numbers.Fixed(after, 2)} s in {Times.Hours(drift.Span)}, {drift.Count} checks at the same settings"
            + (flow is { } percent ? $"; release ended at {Numbers.Fixed(percent)} % of peak" : ""),
            "secretions, bronchospasm, kink, wet filter",
            drift.Points[^1].At,
            Evidence.Of(drift.Change!.Value / before, drift.Points.Select(p => p.Entry).Reverse(), ("before", before), ("after", after), ("checks", drift.Count)));
    }
}
