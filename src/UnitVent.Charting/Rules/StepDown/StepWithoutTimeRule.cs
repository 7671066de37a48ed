using NodaTime;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.StepDown;

/// <summary>R35: P high was stepped down and T high is not longer.</summary>
public sealed class StepWithoutTimeRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R35";

    /// <inheritdoc/>
    public override Family Family => Family.StepDown;

    /// <inheritdoc/>
    public override string Seen => "step down without longer T high";

    /// <inheritdoc/>
    public override string Levels => "P high −2 cmH2O with T high not longer by 0.25 s for each cmH2O advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet from T high 12 s, with a reason charted, and 12 h after the step.";

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

        var options = picture.Window.Unit.Thresholds.StepWithoutTime;
        var expected = options.THighSPerCmH2O / 2 * (double)step.Down;
        return (double)step.Down < options.PHighStepCmH2O
            || (double)step.Longer >= expected
            || (double?)step.Now.Body.THighS >= options.QuietFromTHighS
            || !string.IsNullOrWhiteSpace(step.Now.Body.Reason)
            || picture.AsOf - step.Now.At > StepsDown.LookedAtFor
            ? Clear(step.Now.At)
            : Raise(
                Severity.Advisory,
                $"P high {step.Before.Body.PHighCmH2O} → {step.Now.Body.PHighCmH2O} cmH2O with T high {step.Before.Body.THighS} → {step.Now.Body.THighS} s",
                "mean airway pressure before and after, SpO2, end-release flow",
                step.Now.At,
                Evidence.Of((double)step.Down, [step.Now.Id, step.Before.Id], ("stepCmH2O", (double)step.Down), ("longerS", (double)step.Longer)));
    }
}
