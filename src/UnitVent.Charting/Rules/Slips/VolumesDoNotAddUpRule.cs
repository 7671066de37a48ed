using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Slips;

/// <summary>R18: total minute volume, releases and own breaths of one check do not add up.</summary>
public sealed class VolumesDoNotAddUpRule : Rule
{
    private const decimal LeakNamedAbovePercent = 30; // common practice

    /// <inheritdoc/>
    public override string Id => "R18";

    /// <inheritdoc/>
    public override Family Family => Family.Entry;

    /// <inheritdoc/>
    public override string Seen => "volumes do not add up";

    /// <inheritdoc/>
    public override string Levels => "releases exceed the total by more than 5 %, or own minute volume measured and derived differ by more than 1 L/min and 20 % of the total, advisory";

    /// <inheritdoc/>
    public override string Remarks => "A leak above 30 % is named.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var release = picture[ValueNames.ReleaseMinuteVolumeLMin];
        var check = picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c is { TotalMinuteVolumeLMin: not null, ReleaseVolumeMl: not null });
        if (release.Value is not { } releases || check is not { } seen)
        {
            return release.Value is null ? CannotTell(release) : CannotTell("Needs total minute volume and release volume of one check.");
        }

        var options = picture.Window.Unit.Thresholds.VolumesDoNotAddUp;
        var total = (double)seen.Body.TotalMinuteVolumeLMin!.Value;
        var derived = total - releases;
        var measured = (double?)seen.Body.SpontaneousMinuteVolumeLMin;
        var allowed = Math.Max(options.OwnMayDifferLMin, options.OwnMayDifferShare * total);
        var says = derived < -options.ReleasesMayExceed * total ? $"releases {Numbers.Fixed(releases, 1)} L/min exceed the total of {Numbers.Fixed(total, 1)} L/min"
            : Math.Abs(measured - derived ?? 0) > allowed ? $"own minute volume measured {Numbers.Fixed(measured!.Value, 1)}, total less releases {Numbers.Fixed(derived, 1)} L/min"
            : null;
        return says is null ? Clear(seen.At) : Raise(
            Severity.Advisory,
            says + (seen.Body.LeakPercent > LeakNamedAbovePercent ? $"; leak {seen.Body.LeakPercent} %" : picture.Has(Circumstance.AirLeak) ? "; air leak" : ""),
            "release volume of one breath or the mean of several, which minute volume was read, leak",
            seen.At,
            Evidence.Of(Math.Max(-derived, Math.Abs(measured - derived ?? 0)), [seen.Id], ("totalLMin", total), ("releasesLMin", releases)));
    }
}
