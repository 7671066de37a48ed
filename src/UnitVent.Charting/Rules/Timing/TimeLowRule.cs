using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Timing;

/// <summary>R03: T low lies outside its usual range while no flow tells when the release ends.</summary>
public sealed class TimeLowRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R03";

    /// <inheritdoc/>
    public override Family Family => Family.Timing;

    /// <inheritdoc/>
    public override string Seen => "T low outside its usual range, no flow recorded";

    /// <inheritdoc/>
    public override string Levels => "outside 0.3–0.8 s advisory, over 1.5 s caution";

    /// <inheritdoc/>
    public override string Remarks => "Obstructive: up to 1.5 s. Quiet while a recent end-release flow is recorded, with two levels, in other modes.";

    /// <inheritdoc/>
    public override bool SaidOnce => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (SettingsHeld.Aprv(picture) is not { Body.TLowS: { } tLow } settings || picture.Method == SettingMethod.TwoLevel)
        {
            return CannotTell("Judged in APRV with settings confirmed, not with two levels.");
        }

        var options = picture.Window.Unit.Thresholds.TimeLow;
        var seconds = (double)tLow;
        var upper = picture.Has(Circumstance.Obstructive) ? options.CautionAboveS : options.ToS;
        if (picture[ValueNames.EndReleaseFlowPercent].Value is not null || (seconds >= options.FromS && seconds <= upper))
        {
            return Clear(settings.At);
        }

        return Raise(
            seconds > options.CautionAboveS ? Severity.Caution : Severity.Advisory,
            $"T low {Numbers.Typed(tLow)} s, usual {Numbers.Fixed(options.FromS, 1)}–{Numbers.Fixed(upper, 1)} s; no recent end-release flow",
            "the flow trace at the end of the release",
            settings.At,
            Evidence.Of(Math.Max(options.FromS - seconds, seconds - upper), [settings.Id], ("tLowS", seconds)));
    }
}
