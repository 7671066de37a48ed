using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Pictures;

/// <summary>When time alone changes a picture: something grows too old, falls due, begins or ends.</summary>
internal static class Clockwork
{
    /// <summary>The first instant after the picture's own at which time alone changes anything; null when none does.</summary>
    public static Instant? NextChange(PatientPicture picture) =>
        Instants(picture).Where(i => i > picture.AsOf).Select(i => (Instant?)i).DefaultIfEmpty(null).Min();

    private static IEnumerable<Instant> Instants(PatientPicture picture)
    {
        var limits = picture.Limits;
        var interval = picture.Window.Unit.CheckInterval;
        var due = picture.Window.Unit.Thresholds.CheckDue;
        foreach (var (at, ages) in new (Instant? At, Duration[] Ages)[]
        {
            (picture.SettingsConfirmedAt, [limits.Settings, limits.Settings * 2]),
            (picture.Check?.At, [interval, interval * due.AdvisoryIntervals, interval * due.CautionIntervals, limits.Readings, limits.Readings * 2]),
            (picture.LatestGas?.Gas.At, [limits.Gas, limits.Gas * 2]),
            (picture.Window.Episode.AdmittedAt, [interval, interval * due.AdvisoryIntervals, interval * due.CautionIntervals, limits.Readings, limits.Readings * 2, limits.Gas, limits.Gas * 2, limits.Settings, limits.Settings * 2]),
            (picture.Settings?.At, [Duration.FromMinutes(10), Duration.FromMinutes(60)]),
        })
        {
            foreach (var age in at is null ? [] : ages)
            {
                // Limits are passed when a value is older than them, so a moment later.
                yield return at!.Value + age + Duration.FromSeconds(1);
            }
        }

        foreach (var moment in RuleSet.All.SelectMany(r => r.Moments(picture)))
        {
            yield return moment + Duration.FromSeconds(1);
        }

        foreach (var entry in picture.Window.Standing)
        {
            foreach (var boundary in Boundaries(entry))
            {
                yield return boundary;
            }
        }
    }

    private static IEnumerable<Instant> Boundaries(ChartEntry entry) => entry.Body switch
    {
        ContextChange context => WhenKnown(context.From, context.Until),
        TargetSet target => WhenKnown(target.From, target.ExpiresAt),
        BedsideEvent happened => WhenKnown(happened.At, happened.Until),
        FollowUp followUp => WhenKnown(followUp.DueAt),
        _ => [],
    };

    private static IEnumerable<Instant> WhenKnown(params Instant?[] instants) => instants.OfType<Instant>();
}
