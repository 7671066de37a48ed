using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;
using UnitVent.Store.Model;
using UnitVent.Store.Schema;
using UnitVent.Store.Units;

namespace UnitVent.Store.Reading;

/// <summary>Loads the windows that pictures are computed from.</summary>
internal static class WindowLoader
{
    // Per episode: everything of the span; states (context, targets, phase, method, events, follow-ups) however old; the last of every other kind before.
    internal const string EntriesSql = """
        select e.*
        from unnest({1}) as wanted(id)
        cross join lateral (
            select s.* from standing_entry s
            where s.unit_id = {0} and s.episode_id = wanted.id and s.effective_at > {2} and s.effective_at <= {3}
            union all
            select s.* from standing_entry s
            where s.unit_id = {0} and s.episode_id = wanted.id and s.effective_at <= {2}
              and s.kind in ('Context', 'Target', 'Phase', 'Method', 'Event', 'FollowUp')
            union all
            select last.*
            from (values ('SettingChange'), ('BloodGas'), ('VentilatorCheck'), ('BreathingCheck'), ('AirwayCheck'), ('Note')) as kinds(kind)
            cross join lateral (
                select s.* from standing_entry s
                where s.unit_id = {0} and s.episode_id = wanted.id and s.kind = kinds.kind and s.effective_at <= {2}
                order by s.effective_at desc, s.sequence desc
                limit 1) last
        ) e
        """;

    /// <summary>The window of one episode; null when it is not in the unit.</summary>
    public static async Task<ChartWindow?> OfEpisodeAsync(
        UnitVentDbContext db, Place place, Instant now, CancellationToken cancellationToken, Instant? since = null)
    {
        var profile = await ProfileAsync(db, place.UnitId, now, cancellationToken);
        var episodes = await EpisodesAsync(db, place.UnitId, e => e.Id == place.EpisodeId, cancellationToken);
        return episodes.Count == 0 ? null : (await WindowsAsync(db, profile, episodes, now, since, cancellationToken))[0];
    }

    /// <summary>The window of an episode whose head is locked, so that it must be there.</summary>
    public static async Task<ChartWindow> OfLockedAsync(UnitVentDbContext db, Place place, Instant now, CancellationToken cancellationToken) =>
        await OfEpisodeAsync(db, place, now, cancellationToken) ?? throw new InvalidOperationException("A locked episode has a window.");

    /// <summary>The windows of every episode that lasts.</summary>
    public static async Task<IReadOnlyList<ChartWindow>> OfUnitAsync(UnitVentDbContext db, UnitProfile profile, Instant now, CancellationToken cancellationToken)
    {
        var episodes = await EpisodesAsync(db, profile.Id, e => e.EndedAt == null, cancellationToken);
        return await WindowsAsync(db, profile, episodes, now, null, cancellationToken);
    }

    /// <summary>The charts of a unit that were kept between two instants, each whole from two days before.</summary>
    public static async Task<IReadOnlyList<ChartWindow>> OfDaysAsync(UnitVentDbContext db, Guid unitId, Instant from, Instant to, CancellationToken cancellationToken)
    {
        var profile = await ProfileAsync(db, unitId, to, cancellationToken);
        var episodes = await EpisodesAsync(db, unitId, e => e.EndedAt == null || e.EndedAt > from, cancellationToken);
        return await WindowsAsync(db, profile, episodes, to, from - ChartWindow.Span, cancellationToken);
    }

    /// <summary>The windows of some episodes of a unit.</summary>
    public static async Task<IReadOnlyList<ChartWindow>> OfEpisodesAsync(UnitVentDbContext db, Guid unitId, Guid[] ids, Instant now, CancellationToken cancellationToken)
    {
        var profile = await ProfileAsync(db, unitId, now, cancellationToken);
        var episodes = await EpisodesAsync(db, unitId, e => ids.Contains(e.Id), cancellationToken);
        return await WindowsAsync(db, profile, episodes, now, null, cancellationToken);
    }

    /// <summary>A unit as its charts are read, with the thresholds that were in force at an instant.</summary>
    public static async Task<UnitProfile> ProfileAsync(UnitVentDbContext db, Guid unitId, Instant at, CancellationToken cancellationToken)
    {
        var unit = await db.Units.AsNoTracking().FirstAsync(u => u.Id == unitId, cancellationToken);
        var beds = await db.Beds.AsNoTracking().Where(b => b.UnitId == unitId && !b.Retired).OrderBy(b => b.Position).Select(b => b.Name).ToListAsync(cancellationToken);
        return Profile(unit, beds) with { Thresholds = RuleThresholds.With(await ThresholdDesk.ChosenAsync(db, unitId, at, cancellationToken)) };
    }

    internal static UnitProfile Profile(UnitRow unit, IReadOnlyList<string> beds) => new(unit.Id, unit.Code, unit.Name, DateTimeZoneProviders.Tzdb[unit.TimeZone])
    {
        AltitudeM = unit.AltitudeM,
        TensionUnit = unit.TensionUnit,
        Method = unit.Method,
        CheckInterval = unit.CheckInterval,
        ShiftStarts = [.. unit.ShiftStarts.Order()],
        IsDemo = unit.IsDemo,
        Beds = beds,
    };

    internal static async Task<List<EpisodeFacts>> EpisodesAsync(
        UnitVentDbContext db, Guid unitId, System.Linq.Expressions.Expression<Func<EpisodeRow, bool>> which, CancellationToken cancellationToken)
    {
        var rows = await db.Episodes.AsNoTracking().TagWith("WindowLoader.Episodes")
            .Where(e => e.UnitId == unitId)
            .Where(which)
            .Join(db.Patients, e => new { e.UnitId, Id = e.PatientId }, p => new { p.UnitId, p.Id }, (e, p) => new { Episode = e, p.Facts })
            .Select(r => new
            {
                r.Episode,
                r.Facts,
                Bed = db.BedStays.Where(s => s.UnitId == unitId && s.EpisodeId == r.Episode.Id)
                    .OrderByDescending(s => s.Until == null).ThenByDescending(s => s.From).ThenByDescending(s => s.Until)
                    .Join(db.Beds, s => new { s.UnitId, Id = s.BedId }, b => new { b.UnitId, b.Id }, (s, b) => b.Name)
                    .First(),
            })
            .ToListAsync(cancellationToken);
        return [.. rows.Select(r => new EpisodeFacts(
            r.Episode.Id, unitId, r.Bed, JsonSerializer.Deserialize<PatientFacts>(r.Facts, ChartJson.Options)!, r.Episode.AirwaySecuredAt, r.Episode.AdmittedAt)
        {
            Reason = r.Episode.Reason,
            EndedAt = r.Episode.EndedAt,
            Outcome = r.Episode.Outcome,
        })];
    }

    private static async Task<List<ChartWindow>> WindowsAsync(
        UnitVentDbContext db, UnitProfile profile, List<EpisodeFacts> episodes, Instant now, Instant? since, CancellationToken cancellationToken)
    {
        var ids = episodes.Select(e => e.Id).ToArray();
        var rows = await EntriesAsync(db, profile.Id, ids, since ?? now - ChartWindow.Span, now, cancellationToken);
        var steps = await StepsAsync(db, profile.Id, rows.Where(e => e.Kind == EntryKind.FollowUp).Select(e => e.Id).ToArray(), now, cancellationToken);
        var entries = rows.Select(r => Reassigned(r.ToEntry(), steps[r.Id])).ToLookup(e => e.EpisodeId);
        var closed = steps.SelectMany(s => s).Where(s => s.Step != FollowUpStep.Reassigned).ToDictionary(s => s.FollowUpId, s => s.Step);
        return [.. episodes.Select(e => new ChartWindow(e, profile, entries[e.Id], closed))];
    }

    private static ChartEntry Reassigned(ChartEntry entry, IEnumerable<FollowUpStepRow> steps) =>
        entry.Body is FollowUp followUp && steps.LastOrDefault(s => s.Step == FollowUpStep.Reassigned) is { } last
            ? entry with { Body = followUp with { ForRole = last.ForRole } }
            : entry;

    internal static Task<List<EntryRow>> EntriesAsync(
        UnitVentDbContext db, Guid unitId, Guid[] episodes, Instant after, Instant until, CancellationToken cancellationToken) =>
        db.Entries.FromSqlRaw(EntriesSql, unitId, episodes, after, until).AsNoTracking().TagWith("WindowLoader.Entries").ToListAsync(cancellationToken);

    private static async Task<ILookup<Guid, FollowUpStepRow>> StepsAsync(
        UnitVentDbContext db, Guid unitId, Guid[] followUps, Instant until, CancellationToken cancellationToken)
    {
        List<FollowUpStepRow> steps = followUps.Length == 0 ? [] : await db.FollowUpSteps.AsNoTracking()
            .Where(s => s.UnitId == unitId && followUps.Contains(s.FollowUpId) && s.At <= until)
            .OrderBy(s => s.At)
            .ToListAsync(cancellationToken);
        return steps.ToLookup(s => s.FollowUpId);
    }
}
