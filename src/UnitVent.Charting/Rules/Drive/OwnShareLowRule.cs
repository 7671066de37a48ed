using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Drive;

/// <summary>R19a: the patient hardly breathes by himself in APRV.</summary>
public sealed class OwnShareLowRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R19a";

    /// <inheritdoc/>
    public override Family Family => Family.Drive;

    /// <inheritdoc/>
    public override string Seen => "own share of minute ventilation low";

    /// <inheritdoc/>
    public override string Levels => "under 10 % in two checks over 4 h advisory; caution when it fell by 15 points or PaCO2 rises";

    /// <inheritdoc/>
    public override string Remarks => "Quiet in the first 12 h of APRV, while a relaxant acts, in other modes. An own rate of 0 is a share of 0.";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) =>
        picture[ValueNames.SpontaneousSharePercent].Value < picture.Window.Unit.Thresholds.OwnShareLow.UnderPercent ? [JudgedFrom(picture)] : [];

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.SpontaneousSharePercent].Value >= picture.Window.Unit.Thresholds.OwnShareLow.UnderPercent + DriftVariables.OwnShare.TrendMinimum.From(0) / 2;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var share = picture[ValueNames.SpontaneousSharePercent];
        if (SettingsHeld.Aprv(picture) is null || picture.AsOf < JudgedFrom(picture) || RelaxantReadings.Acting(picture) is not null)
        {
            return CannotTell("Judged in APRV after its first hours and without a relaxant.");
        }

        var options = picture.Window.Unit.Thresholds.OwnShareLow;
        var run = LowShare.MayBe(picture, options.UnderPercent) ? LowShare.Run(picture, options.UnderPercent) : [];
        return run.Count > 0 && picture.AsOf - run[0].At > picture.Limits.Readings ? CannotTell("Needs a recent check.")
            : run.Count > 1 && run[0].At - run[^1].At >= Duration.FromHours(options.ForHours) ? Low(picture, run)
            : run.Count == 0 && share.Value is null ? CannotTell(share)
            : Clear(run.Count > 0 ? run[0].At : share.AsOf!.Value);
    }

    private static Instant JudgedFrom(PatientPicture picture) =>
        Instant.Max(SettingsHeld.ModeSince(picture), picture.Window.Episode.AdmittedAt) + Duration.FromHours(picture.Window.Unit.Thresholds.OwnShareLow.NotBeforeHours);

    private RuleOutcome Low(PatientPicture picture, IReadOnlyList<SeriesPoint> run)
    {
        var (rise, fall) = (CarbonDioxideRise.Of(picture), LowShare.Fall(picture, run));
        var lost = fall is not null && fall.Before - fall.After >= picture.Window.Unit.Thresholds.OwnShareLow.LostPoints;
        var says = (lost ? $"own share {Numbers.Fixed(fall!.Before)} → {Numbers.Fixed(fall.After)} %" : $"own share {Numbers.Fixed(run[0].Value)} %")
            + $" of minute ventilation, {run.Count} low checks over {Times.Hours(run[0].At - run[^1].At)}"
            + (rise is { } step ? $"; PaCO2 {Numbers.Fixed(step.Before)} → {Numbers.Fixed(step.After)} mmHg" : "");
        return Raise(
            rise is null && !lost ? Severity.Advisory : Severity.Caution,
            says,
            "sedation depth, own rate and volume, relaxant, metabolic alkalosis, over-ventilation by the releases",
            run[0].At,
            Evidence.Of(
                -run[0].Value,
                run.Select(p => p.Entry),
                [("sharePercent", run[0].Value),
                 .. lost ? new[] { ("shareBefore", fall!.Before) } : [],
                 .. rise is { } r ? new[] { ("paCO2Before", r.Before), ("paCO2After", r.After) } : []]));
    }
}
