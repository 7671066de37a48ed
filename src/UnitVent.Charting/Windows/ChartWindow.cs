using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;

namespace UnitVent.Charting.Windows;

/// <summary>Everything that a picture is computed from: the episode, the unit, and the entries that stand.</summary>
/// <remarks>
/// Holds the entries of the last 48 h, the last of each kind before, and, however old, every context, target, phase, method, event and
/// follow-up of the episode: those are states, and the last one of a kind says nothing of the others. Entries that were struck out or
/// replaced are left out.
/// </remarks>
public sealed class ChartWindow
{
    /// <summary>How far back a window holds every entry.</summary>
    public static readonly Duration Span = Duration.FromHours(48);

    private readonly Dictionary<EntryKind, List<ChartEntry>> byKind;

    /// <summary>Makes a window.</summary>
    /// <param name="episode">The episode.</param>
    /// <param name="unit">The unit.</param>
    /// <param name="entries">Its entries in any order; those that do not stand are ignored.</param>
    /// <param name="followUpSteps">What became of the follow-ups, by follow-up id; a follow-up without one is open.</param>
    public ChartWindow(
        EpisodeFacts episode, UnitProfile unit, IEnumerable<ChartEntry> entries, IReadOnlyDictionary<Guid, FollowUpStep>? followUpSteps = null)
    {
        Episode = episode;
        Unit = unit;
        FollowUpSteps = followUpSteps ?? new Dictionary<Guid, FollowUpStep>();
        Standing = [.. entries.Where(e => e.Stands).OrderBy(e => e.EffectiveAt).ThenBy(e => e.Sequence)];
        byKind = Standing.GroupBy(e => e.Kind).ToDictionary(g => g.Key, g => g.ToList());
    }

    /// <summary>Gets the episode.</summary>
    public EpisodeFacts Episode { get; }

    /// <summary>Gets the unit.</summary>
    public UnitProfile Unit { get; }

    /// <summary>Gets the standing entries by effective time, then by order of recording.</summary>
    public IReadOnlyList<ChartEntry> Standing { get; }

    /// <summary>Gets what became of the follow-ups, by follow-up id.</summary>
    public IReadOnlyDictionary<Guid, FollowUpStep> FollowUpSteps { get; }

    /// <summary>The standing entries of a kind effective at or before an instant, oldest first.</summary>
    public IEnumerable<Charted<T>> Of<T>(EntryKind kind, Instant until)
        where T : Entry =>
        byKind.TryGetValue(kind, out var entries)
            ? entries.TakeWhile(e => e.EffectiveAt <= until).Select(e => new Charted<T>(e, (T)e.Body))
            : [];

    /// <summary>The latest standing entry of a kind effective at or before an instant that satisfies a condition; null when there is none.</summary>
    public Charted<T>? Latest<T>(EntryKind kind, Instant until, Func<T, bool>? condition = null)
        where T : Entry
    {
        if (!byKind.TryGetValue(kind, out var entries))
        {
            return null;
        }

        for (var i = entries.Count - 1; i >= 0; i--)
        {
            if (entries[i].EffectiveAt <= until && entries[i].Body is T body && (condition is null || condition(body)))
            {
                return new Charted<T>(entries[i], body);
            }
        }

        return null;
    }

    /// <summary>The same window with further entries, as it would be once they were recorded.</summary>
    public ChartWindow With(IEnumerable<ChartEntry> further)
    {
        var added = further.ToList();
        var replaced = added.Where(e => e.Corrects is not null).Select(e => e.Corrects!.Value).ToHashSet();
        return new ChartWindow(Episode, Unit, Standing.Where(e => !replaced.Contains(e.Id)).Concat(added), FollowUpSteps);
    }

    /// <summary>The same window without one entry, as it would be once that was struck out.</summary>
    public ChartWindow Without(Guid entryId) => new(Episode, Unit, Standing.Where(e => e.Id != entryId), FollowUpSteps);
}
