using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Timing;

/// <summary>R07: the releases a minute lie outside their usual range.</summary>
public sealed class ReleaseRateRule : Rule
{
    private static readonly Duration Starting = Duration.FromHours(12); // the starting phase [common practice]

    /// <inheritdoc/>
    public override string Id => "R07";

    /// <inheritdoc/>
    public override Family Family => Family.Timing;

    /// <inheritdoc/>
    public override string Seen => "releases a minute outside their usual range";

    /// <inheritdoc/>
    public override string Levels => "fixed rate: outside 10–14 in the first 12 h, later 8–14, from 4 in weaning advisory, over 20 caution; flow-guided: over 30 caution";

    /// <inheritdoc/>
    public override string Remarks => "Quiet with two levels.";

    /// <inheritdoc/>
    public override bool SaidOnce => true;

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) =>
        picture[ValueNames.ReleaseRatePerMin].Value < picture.Window.Unit.Thresholds.ReleaseRate.StartingFromPerMin ? [SettingsHeld.ModeSince(picture) + Starting] : [];

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var rate = picture[ValueNames.ReleaseRatePerMin];
        if (SettingsHeld.Aprv(picture) is not { } settings || rate.Value is not { } perMin || picture.Method == SettingMethod.TwoLevel)
        {
            return CannotTell(rate.Because ?? "Not judged when two levels are set.");
        }

        var options = picture.Window.Unit.Thresholds.ReleaseRate;
        var edges = Edges(picture, options);
        if (perMin >= edges.From && perMin <= edges.To)
        {
            return Clear(settings.At);
        }

        return Raise(
            perMin > edges.CautionAbove ? Severity.Caution : Severity.Advisory,
            $"{Numbers.Fixed(perMin, 1)} releases/min by the settings, usual " + (edges.From > 0 ? $"{Numbers.Fixed(edges.From)}–{Numbers.Fixed(edges.To)}" : $"up to {Numbers.Fixed(edges.To)}"),
            "T high and T low, own breathing, PaCO2",
            settings.At,
            Evidence.Of(Math.Max(edges.From - perMin, perMin - edges.To), [settings.Id], ("releasesPerMin", perMin)));
    }

    private static (double From, double To, double CautionAbove) Edges(PatientPicture picture, ReleaseRateOptions options)
    {
        var starting = picture.Phase == CoursePhase.Starting && picture.AsOf - SettingsHeld.ModeSince(picture) <= Starting;
        return picture.Method == SettingMethod.FlowGuided
            ? (0, options.FlowGuidedCautionAbovePerMin, options.FlowGuidedCautionAbovePerMin)
            : (picture.Phase == CoursePhase.Weaning ? options.WeaningFromPerMin : starting ? options.StartingFromPerMin : options.FromPerMin,
               options.ToPerMin,
               options.CautionAbovePerMin);
    }
}
