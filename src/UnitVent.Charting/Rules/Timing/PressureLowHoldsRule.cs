using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Timing;

/// <summary>R11: P low is high although the release already ends early.</summary>
public sealed class PressureLowHoldsRule : Rule
{
    private const double HalfImportantChange = 5; // half of 10 points, the minimum important change of the ratio [common practice]

    /// <inheritdoc/>
    public override string Id => "R11";

    /// <inheritdoc/>
    public override Family Family => Family.Timing;

    /// <inheritdoc/>
    public override string Seen => "P low over 5 cmH2O with end-release flow over 50 % of peak";

    /// <inheritdoc/>
    public override string Levels => "advisory";

    /// <inheritdoc/>
    public override string Remarks => "Never with P low 0–5. Quiet with effort during the release, a leak, two levels.";

    /// <inheritdoc/>
    public override bool SaidOnce => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.PressureLowHolds;
        return (double?)picture.Settings?.Body.PLowCmH2O <= options.PLowAboveCmH2O
            || picture[ValueNames.EndReleaseFlowPercent].Value <= options.EndFlowAbovePercent - HalfImportantChange;
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.PressureLowHolds;
        if (SettingsHeld.Aprv(picture) is not { Body.PLowCmH2O: { } pLow } settings || picture.Method == SettingMethod.TwoLevel)
        {
            return CannotTell("Judged in APRV with settings confirmed, not with two levels.");
        }

        if ((double)pLow <= options.PLowAboveCmH2O)
        {
            return Clear(settings.At);
        }

        var flow = picture[ValueNames.EndReleaseFlowPercent];
        if (flow.Value is not { } percent || flow.AsOf is not { } at || ReleaseChecks.NotValid(picture, ReleaseChecks.WithFlows(picture)[^1]) is not null)
        {
            return CannotTell(flow.Because ?? "The end-release flow is not valid.");
        }

        return percent <= options.EndFlowAbovePercent
            ? Clear(at)
            : Raise(
                Severity.Advisory,
                $"P low {Numbers.Typed(pLow)} cmH2O with the release ending at {Numbers.Fixed(percent)} % of peak",
                "end-release alveolar pressure, release volume, PaCO2",
                at,
                Evidence.Of((double)pLow, [ReleaseChecks.WithFlows(picture)[^1].Id, settings.Id], ("pLowCmH2O", (double)pLow), ("endReleaseFlowPercent", percent)));
    }
}
