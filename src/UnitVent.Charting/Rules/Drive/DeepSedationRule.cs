using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Drive;

/// <summary>R30: deep sedation and little own breathing go together for hours.</summary>
public sealed class DeepSedationRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R30";

    /// <inheritdoc/>
    public override Family Family => Family.Drive;

    /// <inheritdoc/>
    public override string Seen => "deep sedation with little own breathing";

    /// <inheritdoc/>
    public override string Levels => "RASS −3 or deeper and own share under 10 % for 8 h advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet while a relaxant acts and when the patient’s target is as deep.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.DeepSedation;
        return picture.Targets?.Body.RassHigh <= options.RassAtMost
            || Scores(picture).LastOrDefault().Body?.Rass > options.RassAtMost
            || picture[ValueNames.SpontaneousSharePercent].Value >= options.UnderPercent;
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.DeepSedation;
        if (RelaxantReadings.Acting(picture) is not null)
        {
            return CannotTell("RASS is not assessable while a relaxant acts.");
        }

        if (picture.Targets is { } target && target.Body.RassHigh <= options.RassAtMost)
        {
            return Clear(target.At);
        }

        var scores = Scores(picture);
        if (scores.Count == 0 || picture.AsOf - scores[^1].At > picture.Limits.Readings)
        {
            return CannotTell("Needs a recent RASS.");
        }

        var share = picture[ValueNames.SpontaneousSharePercent];
        var deep = scores.AsEnumerable().Reverse().TakeWhile(s => s.Body.Rass <= options.RassAtMost).ToList();
        var low = deep.Count > 1 && LowShare.MayBe(picture, options.UnderPercent) ? LowShare.Run(picture, options.UnderPercent) : [];
        return low.Count > 1 && picture.AsOf - low[0].At <= picture.Limits.Readings && Together(deep, low) >= Duration.FromHours(options.ForHours) ? Deep(deep, low)
            : deep.Count > 0 && low.Count == 0 && share.Value is null ? CannotTell(share)
            : Clear(scores[^1].At);
    }

    private static List<Charted<BreathingCheck>> Scores(PatientPicture picture) =>
        [.. picture.Window.Of<BreathingCheck>(EntryKind.BreathingCheck, picture.AsOf).Where(b => b.Body.Rass is not null)];

    private static Duration Together(List<Charted<BreathingCheck>> deep, IReadOnlyList<SeriesPoint> low) =>
        Instant.Min(deep[0].At, low[0].At) - Instant.Max(deep[^1].At, low[^1].At);

    private RuleOutcome Deep(List<Charted<BreathingCheck>> deep, IReadOnlyList<SeriesPoint> low)
    {
        var rass = deep[0].Body.Rass!.Value;
        Guid?[] youngest = deep[0].At > low[0].At ? [deep[0].Id, low[0].Entry] : [low[0].Entry, deep[0].Id];
        return Raise(
            Severity.Advisory,
            $"RASS {Numbers.Typed(rass)} and own share {Numbers.Fixed(low[0].Value)} % for {Times.Hours(Together(deep, low))}",
            "sedation and its target, own rate and volume, PaCO2",
            Instant.Max(deep[0].At, low[0].At),
            Evidence.Of(-low[0].Value - rass, youngest, ("rass", rass), ("sharePercent", low[0].Value)));
    }
}
