using NodaTime;
using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Windows;

/// <summary>What was in force at an instant.</summary>
public static class InForce
{
    private static readonly Duration CloseToChange = Duration.FromMinutes(10);

    private static readonly Dictionary<EventKind, EventKind> EndedBy = new()
    {
        [EventKind.TransportOut] = EventKind.TransportBack,
        [EventKind.OffVentilatorStart] = EventKind.OffVentilatorEnd,
        [EventKind.BreathingTrialStart] = EventKind.BreathingTrialResult,
        [EventKind.RelaxantStart] = EventKind.RelaxantStop,
        [EventKind.NitricOxideOn] = EventKind.NitricOxideOff,
        [EventKind.EcmoStart] = EventKind.EcmoStop,
    };

    /// <summary>The settings in force; null when none were charted by then.</summary>
    public static Charted<SettingChange>? Settings(ChartWindow window, Instant at) => window.Latest<SettingChange>(EntryKind.SettingChange, at);

    /// <summary>Since when what is picked of the settings is as it is at an instant; null when none were charted by then.</summary>
    public static Instant? UnchangedSince<T>(ChartWindow window, Instant at, Func<SettingChange, T> picked)
    {
        Instant? since = null;
        var (known, value) = (false, default(T));
        foreach (var change in window.Of<SettingChange>(EntryKind.SettingChange, at))
        {
            var same = known && EqualityComparer<T>.Default.Equals(picked(change.Body), value);
            (since, known, value) = (same ? since : change.At, true, picked(change.Body));
        }

        return since;
    }

    /// <summary>The settings to which a gas belongs: those in force at its draw. The same minute means before the change, unless the slip says otherwise.</summary>
    public static Charted<SettingChange>? SettingsAtDraw(ChartWindow window, BloodGas gas, Instant drawn)
    {
        var minute = Duration.FromMinutes(1);
        return gas.RelativeToChange switch
        {
            RelativeToChange.After => Settings(window, drawn + minute),
            RelativeToChange.Before => Settings(window, drawn) is { } last && drawn - last.At <= CloseToChange
                ? Settings(window, last.At - Duration.Epsilon) ?? last
                : Settings(window, drawn),
            _ => Settings(window, drawn - minute) ?? Settings(window, drawn),
        };
    }

    /// <summary>The circumstances in force.</summary>
    public static IReadOnlyList<Charted<ContextChange>> Context(ChartWindow window, Instant at) =>
        [.. window.Of<ContextChange>(EntryKind.Context, at)
            .GroupBy(c => c.Body.Flag)
            .Select(g => g.Last())
            .Where(c => c.Body.Until is null || c.Body.Until > at)
            .OrderBy(c => c.Body.Flag)];

    /// <summary>The targets in force; null when none are.</summary>
    public static Charted<TargetSet>? Targets(ChartWindow window, Instant at) =>
        window.Latest<TargetSet>(EntryKind.Target, at) is { } last && (last.Body.ExpiresAt is null || last.Body.ExpiresAt > at) ? last : null;

    /// <summary>The phase in force: the latest choice, made by itself or with a setting change; starting when none was made.</summary>
    public static CoursePhase Phase(ChartWindow window, Instant at)
    {
        var chosen = window.Latest<PhaseChoice>(EntryKind.Phase, at);
        var withChange = window.Latest<SettingChange>(EntryKind.SettingChange, at, s => s.Phase is not null);
        return (chosen, withChange) switch
        {
            ({ } c, { } s) => s.At > c.At ? s.Body.Phase!.Value : c.Body.Phase!.Value,
            ({ } c, null) => c.Body.Phase!.Value,
            (null, { } s) => s.Body.Phase!.Value,
            _ => CoursePhase.Starting,
        };
    }

    /// <summary>The method in force: the patient's, else the unit's.</summary>
    public static SettingMethod Method(ChartWindow window, Instant at) =>
        window.Latest<MethodChoice>(EntryKind.Method, at)?.Body.Method ?? window.Unit.Method;

    /// <summary>Whether the patient lay prone.</summary>
    public static bool Prone(ChartWindow window, Instant at) =>
        window.Latest<BedsideEvent>(EntryKind.Event, at, e => e.What is EventKind.Prone or EventKind.Supine or EventKind.Side)?.Body.What == EventKind.Prone;

    /// <summary>The timed events that were going on.</summary>
    public static IReadOnlySet<EventKind> Ongoing(ChartWindow window, Instant at)
    {
        var ongoing = new HashSet<EventKind>();
        foreach (var happened in window.Of<BedsideEvent>(EntryKind.Event, at))
        {
            var what = happened.Body.What!.Value;
            if (EndedBy.ContainsKey(what) && (happened.Body.Until is null || happened.Body.Until > at))
            {
                ongoing.Add(what);
            }

            ongoing.RemoveWhere(started => EndedBy[started] == what);
        }

        return ongoing;
    }

    /// <summary>Since when mode, position, relaxant, ECMO and drains are as they were at an instant: drift does not run across.</summary>
    public static Instant EpochStart(ChartWindow window, Instant at)
    {
        var start = Instant.MinValue;
        VentilationMode? mode = null;
        foreach (var change in window.Of<SettingChange>(EntryKind.SettingChange, at))
        {
            (start, mode) = change.Body.Mode == mode ? (start, mode) : (change.At, change.Body.Mode);
        }

        var events = window.Of<BedsideEvent>(EntryKind.Event, at).Where(e => StartsEpoch(e.Body.What!.Value)).Select(e => (e.At, e.Body.Until));
        var ecmo = window.Of<ContextChange>(EntryKind.Context, at).Where(c => c.Body.Flag is Circumstance.EcmoVv or Circumstance.EcmoVa).Select(c => (c.At, c.Body.Until));
        return events.Concat(ecmo).Select(e => e.Until is { } end && end <= at ? end : e.At).Append(start).Max();
    }

    private static bool StartsEpoch(EventKind kind) => kind is EventKind.Prone or EventKind.Supine or EventKind.Side
        or EventKind.RelaxantStart or EventKind.RelaxantStop or EventKind.EcmoStart or EventKind.EcmoStop or EventKind.DrainIn or EventKind.DrainOut;
}
