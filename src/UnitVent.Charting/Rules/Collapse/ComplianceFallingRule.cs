using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>R09: effective compliance falls from check to check at the same pressures.</summary>
public sealed class ComplianceFallingRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R09";

    /// <inheritdoc/>
    public override Family Family => Family.Collapse;

    /// <inheritdoc/>
    public override string Seen => "effective compliance falling at the same pressures";

    /// <inheritdoc/>
    public override string Levels => "a drift by 20 % advisory; caution when its direction is sure (p ≤ 0.02)";

    /// <inheritdoc/>
    public override string Remarks => "Needs four valid checks over 4 h since P high or P low was last changed; quiet with effort during the release or a leak.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) => DriftOf(picture).IsBackInside(open.Evidence["before"]);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var now = picture[ValueNames.EffectiveCompliance];
        if (now.Value is null)
        {
            return CannotTell(now);
        }

        if (ReleaseChecks.WithFlows(picture) is [.., var last] && ReleaseChecks.NotValid(picture, last) is { } why)
        {
            return CannotTell(why);
        }

        var drift = ReleaseDrift.ChecksEnough(picture, SettingsHeld.PressuresSince(picture)) ? DriftOf(picture) : null;
        return drift is null or { Verdict: DriftVerdict.NotEnoughData } ? CannotTell(ReleaseDrift.NotEnough("pressures"))
            : drift is { Verdict: DriftVerdict.Drifting, Course: DriftCourse.Worse } ? Falling(drift)
            : Clear(drift.Points[^1].At);
    }

    private static Drift DriftOf(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.ComplianceFalling;
        var variable = DriftVariables.EffectiveCompliance with { TrendMinimum = MinimumChange.OfShare(options.Fall) };
        return ReleaseDrift.Of(picture, variable, SettingsHeld.PressuresSince(picture), options.EndFlowFromPercent, options.EndFlowToPercent);
    }

    private RuleOutcome Falling(Drift drift)
    {
        var (before, after) = (drift.StartMedian!.Value, drift.Points[^1].Value);
        return Raise(
            ReleaseDrift.Level(drift),
            $"effective compliance {Numbers.Fixed(before)} → {Numbers.Fixed(after)} mL/cmH2O in {Times.Hours(drift.Span)}, {drift.Count} checks at the same pressures",
            "P/F and SpO2, secretions, tube position, effusion, pneumothorax, abdominal pressure, fluid balance",
            drift.Points[^1].At,
            Evidence.Of(-drift.Change!.Value / before, drift.Points.Select(p => p.Entry).Reverse(), ("before", before), ("after", after), ("checks", drift.Count)));
    }
}
