using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules.Oxygen;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.StepDown;

/// <summary>R36: a step down of P high is large, or soon after the last one.</summary>
public sealed class LargeStepRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R36";

    /// <inheritdoc/>
    public override Family Family => Family.StepDown;

    /// <inheritdoc/>
    public override string Seen => "step down large or soon";

    /// <inheritdoc/>
    public override string Levels => "P high by more than 3 cmH2O, or within 2 h of the last step with SpO2 under target, advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet 12 h after the step.";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) => StepsDown.Moments(picture);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (StepsDown.Latest(picture) is not { } step)
        {
            return CannotTell("Needs two settings of APRV.");
        }

        var options = picture.Window.Unit.Thresholds.LargeStep;
        if (step.Down <= 0 || picture.AsOf - step.Now.At > StepsDown.LookedAtFor)
        {
            return Clear(step.Now.At);
        }

        var large = (double)step.Down > options.LargeCmH2O;
        var soon = StepsDown.Previous(picture, step.Before) is { } previous && step.Now.At - previous < Duration.FromHours(options.SoonHours) ? step.Now.At - previous : (Duration?)null;
        var low = OxygenReadings.SpO2(picture) is { } spO2 && spO2.Percent < OxygenReadings.TargetLow(picture) ? spO2 : ((double Percent, Instant At, Guid Entry)?)null;
        return !large && (soon is null || low is null) ? Clear(step.Now.At) : Raise(
            Severity.Advisory,
            $"P high {step.Before.Body.PHighCmH2O} → {step.Now.Body.PHighCmH2O} cmH2O"
                + (soon is { } after && low is { } under ? $", {Times.Hours(after)} after the last step, SpO2 {Numbers.Fixed(under.Percent)} %" : ""),
            "SpO2, mean airway pressure, release volume, work of breathing",
            step.Now.At,
            Evidence.Of((double)step.Down, [step.Now.Id, step.Before.Id], ("stepCmH2O", (double)step.Down)));
    }
}
