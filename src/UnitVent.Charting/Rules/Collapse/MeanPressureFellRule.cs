using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>R34: mean airway pressure fell with a setting change that nobody logged as a step down.</summary>
public sealed class MeanPressureFellRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R34";

    /// <inheritdoc/>
    public override Family Family => Family.Collapse;

    /// <inheritdoc/>
    public override string Seen => "mean airway pressure fell with a setting change";

    /// <inheritdoc/>
    public override string Levels => "by 2 cmH2O within 4 h advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet when the change carries a reason or the phase is weaning.";

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) =>
        Fall(picture) is { } fall ? [fall.ChangedAt + Within(picture), fall.Latest.At + Within(picture)] : [];

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.Settings is not { } settings || MeanPressureFall.Mean(settings) is null)
        {
            return CannotTell("Mean airway pressure cannot be computed from the settings.");
        }

        return Fall(picture) is { } fall
            && fall.Before - fall.After >= picture.Window.Unit.Thresholds.MeanPressureFell.FallCmH2O
            && fall.Latest.Body.Reason is null
            && picture.Phase != CoursePhase.Weaning
            ? Fell(picture, fall)
            : Clear(settings.At);
    }

    private static Duration Within(PatientPicture picture) => Duration.FromHours(picture.Window.Unit.Thresholds.MeanPressureFell.ForHours);

    private static MeanPressureFall? Fall(PatientPicture picture) => MeanPressureFall.Of(picture.Window, picture.AsOf, Within(picture));

    private RuleOutcome Fell(PatientPicture picture, MeanPressureFall fall) => Raise(
        Severity.Advisory,
        $"mean pressure {Numbers.Fixed(fall.Before, 1)} → {Numbers.Fixed(fall.After, 1)} cmH2O by the settings since {Times.Clock(fall.ChangedAt, picture)}",
        "P high, P low and both times, SpO2, whether it was meant",
        fall.Latest.At,
        Evidence.Of(fall.Before - fall.After, [fall.Latest.Id], ("before", fall.Before), ("after", fall.After)));
}
