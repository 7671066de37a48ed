using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Flags;

/// <summary>Walks a chart through again as it was recorded and carries flags on at each entry and at each moment that time alone changes.</summary>
public static class Replay
{
    private static readonly EntryKind[] States = [EntryKind.Context, EntryKind.Target, EntryKind.Phase, EntryKind.Method, EntryKind.Event, EntryKind.FollowUp];

    /// <summary>Every step of every flag between two instants, as it would have been under the window's thresholds.</summary>
    /// <param name="whole">The chart with all of its entries, not only those of the last 48 h.</param>
    /// <param name="from">Where it begins; entries recorded before are known from there on.</param>
    /// <param name="to">Where it ends.</param>
    public static IEnumerable<ReplayedStep> Run(ChartWindow whole, Instant from, Instant to) => Moments(whole, from, to).SelectMany(m => m.Steps);

    /// <summary>The same, moment by moment: each recording, and each instant at which time alone changes anything.</summary>
    /// <param name="whole">The chart with all of its entries, not only those of the last 48 h.</param>
    /// <param name="from">Where it begins; entries recorded before are known from there on.</param>
    /// <param name="to">Where it ends.</param>
    public static IEnumerable<ReplayedMoment> Moments(ChartWindow whole, Instant from, Instant to)
    {
        ArgumentNullException.ThrowIfNull(whole);
        var recorded = whole.Standing.Select(e => e.RecordedAt).Where(r => r > from && r <= to).Distinct().Order().Append(to).ToList();
        var (flags, at) = (new Dictionary<Guid, Flag>(), from);
        foreach (var next in recorded)
        {
            for (Instant? moment = at; moment < next || moment == to;)
            {
                var picture = PatientPicture.At(Known(whole, moment.Value), moment.Value);
                var steps = FlagLedger.Next([.. flags.Values], picture, Guid.CreateVersion7).Select(step => Take(step, flags, whole, moment.Value)).ToList();
                yield return new(picture, steps, [.. flags.Values]);
                moment = moment == to ? null : picture.NextChangeAt;
            }

            at = next;
        }
    }

    /// <summary>The window as it was at an instant: what was recorded by then, of the last 48 h, with the last of each kind before and the states.</summary>
    public static ChartWindow Known(ChartWindow whole, Instant at)
    {
        ArgumentNullException.ThrowIfNull(whole);
        var edge = at - ChartWindow.Span;
        var known = whole.Standing.Where(e => e.RecordedAt <= at && e.EffectiveAt <= at).ToList();
        var before = known.Where(e => e.EffectiveAt <= edge).ToList();
        return new(
            whole.Episode,
            whole.Unit,
            known.Where(e => e.EffectiveAt > edge)
                .Concat(before.Where(e => States.Contains(e.Kind)))
                .Concat(before.Where(e => !States.Contains(e.Kind)).GroupBy(e => e.Kind).Select(g => g.Last())),
            whole.FollowUpSteps);
    }

    private static ReplayedStep Take(FlagStep step, Dictionary<Guid, Flag> flags, ChartWindow whole, Instant at)
    {
        var flag = FlagLedger.Apply(flags.GetValueOrDefault(step.FlagId), step, whole.Episode.Id, at);
        flags[step.FlagId] = flag;
        if (flag.State != FlagState.Open)
        {
            flags.Remove(step.FlagId);
        }

        return new(at, step, [.. flags.Values]);
    }
}

/// <summary>One step of a replayed flag.</summary>
/// <param name="At">When.</param>
/// <param name="Step">What happened.</param>
/// <param name="Open">The flags that were open after it.</param>
public sealed record ReplayedStep(Instant At, FlagStep Step, IReadOnlyList<Flag> Open);

/// <summary>One moment of a replay.</summary>
/// <param name="Picture">The picture of that moment.</param>
/// <param name="Steps">What happened to the flags, in order; empty when nothing did.</param>
/// <param name="Open">The flags that were open after it.</param>
public sealed record ReplayedMoment(PatientPicture Picture, IReadOnlyList<ReplayedStep> Steps, IReadOnlyList<Flag> Open);
