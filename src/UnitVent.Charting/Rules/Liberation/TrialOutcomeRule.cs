using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Liberation;

/// <summary>R39: a breathing trial has no outcome.</summary>
public sealed class TrialOutcomeRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R39";

    /// <inheritdoc/>
    public override Family Family => Family.Liberation;

    /// <inheritdoc/>
    public override string Seen => "breathing trial without an outcome";

    /// <inheritdoc/>
    public override string Levels => "after 2.5 h advisory";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) =>
        BreathingTrial.Ongoing(picture) is { } trial ? [trial.At + Duration.FromHours(picture.Window.Unit.Thresholds.TrialOutcome.Hours)] : [];

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var age = BreathingTrial.Ongoing(picture) is { } trial ? picture.AsOf - trial.At : Duration.Zero;
        return age <= Duration.FromHours(picture.Window.Unit.Thresholds.TrialOutcome.Hours) ? Clear(picture.AsOf) : Raise(
            Severity.Advisory,
            $"breathing trial since {Times.Clock(picture.AsOf - age, picture)}, no outcome charted",
            "the patient, whether the trial is over",
            picture.AsOf - age,
            Evidence.Of(0, [BreathingTrial.Ongoing(picture)?.Id], ("hours", age.TotalHours)));
    }
}
