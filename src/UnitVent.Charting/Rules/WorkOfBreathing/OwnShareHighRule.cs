using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>R19b: the patient does most of the breathing, fast, on a high pressure.</summary>
public sealed class OwnShareHighRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R19b";

    /// <inheritdoc/>
    public override Family Family => Family.Effort;

    /// <inheritdoc/>
    public override string Seen => "own share high on high pressure";

    /// <inheritdoc/>
    public override string Levels => "over 60 % with own rate over 30/min and P high from 20 cmH2O caution";

    /// <inheritdoc/>
    public override string Remarks => "Quiet in weaning and in other modes than APRV.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.OwnShareHigh;
        return picture[ValueNames.SpontaneousSharePercent].Value <= options.AbovePercent - DriftVariables.OwnShare.TrendMinimum.From(0) / 2
            || BreathingReadings.OwnRate(picture)?.Value <= options.RateAbovePerMin - FastAndLabouringRule.HalfImportantRate
            || (double?)picture.Settings?.Body.PHighCmH2O < options.PHighFromCmH2O;
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (SettingsHeld.Aprv(picture) is not { Body.PHighCmH2O: { } high } settings || picture.Phase == CoursePhase.Weaning)
        {
            return CannotTell("Judged in APRV with settings confirmed, not in weaning.");
        }

        var options = picture.Window.Unit.Thresholds.OwnShareHigh;
        var share = picture[ValueNames.SpontaneousSharePercent];
        if (share.Value is not { } percent || share.AsOf is not { } at || BreathingReadings.OwnRate(picture) is not { } rate)
        {
            return CannotTell(share.Because ?? "Needs a recent own rate.");
        }

        var seen = Instant.Max(at, rate.At);
        return percent > options.AbovePercent && rate.Value > options.RateAbovePerMin && (double)high >= options.PHighFromCmH2O
            ? Raise(
                Severity.Caution,
                $"own share {Numbers.Fixed(percent)} % at {Numbers.Fixed(rate.Value)} breaths/min on P high {Numbers.Typed(high)} cmH2O",
                "effort, comfort, PaCO2 and pH, fever and pain, release volume, dead space",
                seen,
                Evidence.Of(percent, [rate.Entry, settings.Id], ("sharePercent", percent), ("ratePerMin", rate.Value), ("pHighCmH2O", (double)high)))
            : Clear(seen);
    }
}
