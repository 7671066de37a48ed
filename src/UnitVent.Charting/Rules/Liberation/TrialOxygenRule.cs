using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Rules.Liberation;

/// <summary>R40: FiO2 was raised during a breathing trial.</summary>
public sealed class TrialOxygenRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R40";

    /// <inheritdoc/>
    public override Family Family => Family.Liberation;

    /// <inheritdoc/>
    public override string Seen => "FiO2 raised in a breathing trial";

    /// <inheritdoc/>
    public override string Levels => "advisory";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (BreathingTrial.Ongoing(picture) is not { } trial)
        {
            return Clear(picture.AsOf);
        }

        var before = InForce.Settings(picture.Window, trial.At - Duration.Epsilon)?.Body.FiO2;
        return before is null ? CannotTell("Needs settings from before the trial.")
            : picture.Settings is not { } now || !(now.Body.FiO2 > before) ? Clear(picture.AsOf)
            : Raise(
                Severity.Advisory,
                $"FiO2 {before} → {now.Body.FiO2} during the breathing trial",
                "SpO2, rate, work of breathing, whether the trial is over",
                now.At,
                Evidence.Of((double)(now.Body.FiO2 - before)!, [now.Id, trial.Id], ("fiO2Before", (double)before), ("fiO2After", (double)now.Body.FiO2!)));
    }
}
