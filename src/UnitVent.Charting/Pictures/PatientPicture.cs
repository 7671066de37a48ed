using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Pictures;

/// <summary>Everything computed about one patient at one instant from the chart. Immutable; every screen, sheet and interface reads this.</summary>
public sealed partial class PatientPicture
{
    private PatientPicture(ChartWindow window, Instant at) => (Window, AsOf) = (window, at);

    /// <summary>Gets what it was computed from.</summary>
    public ChartWindow Window { get; }

    /// <summary>Gets the instant it stands for.</summary>
    public Instant AsOf { get; }

    /// <summary>Gets every value by its name in <see cref="ValueNames"/>.</summary>
    public IReadOnlyDictionary<string, PictureValue> Values { get; private init; } = new Dictionary<string, PictureValue>();

    /// <summary>Gets the settings in force; null when none were charted.</summary>
    public Charted<SettingChange>? Settings { get; private init; }

    /// <summary>Gets from when the age of the settings counts: the last change, or the last check that saw them unchanged.</summary>
    public Instant? SettingsConfirmedAt { get; private init; }

    /// <summary>Gets the arterial gases of the window with their settings, oldest first.</summary>
    public IReadOnlyList<PairedGas> Gases { get; private init; } = [];

    /// <summary>Gets the latest arterial gas with its settings; null when there is none.</summary>
    public PairedGas? LatestGas => Gases.Count > 0 ? Gases[^1] : null;

    /// <summary>Gets the latest ventilator check; null when there is none.</summary>
    public Charted<VentilatorCheck>? Check { get; private init; }

    /// <summary>Gets the latest breathing check; null when there is none.</summary>
    public Charted<BreathingCheck>? Breathing { get; private init; }

    /// <summary>Gets the latest airway check; null when there is none.</summary>
    public Charted<AirwayCheck>? Airway { get; private init; }

    /// <summary>Gets the circumstances in force.</summary>
    public IReadOnlyList<Charted<ContextChange>> Context { get; private init; } = [];

    /// <summary>Gets the targets in force; null when none are.</summary>
    public Charted<TargetSet>? Targets { get; private init; }

    /// <summary>Gets the phase in force.</summary>
    public CoursePhase Phase { get; private init; }

    /// <summary>Gets the method in force.</summary>
    public SettingMethod Method { get; private init; }

    /// <summary>Gets whether the patient lies prone.</summary>
    public bool Prone { get; private init; }

    /// <summary>Gets the timed events that are still going on: transport, off the ventilator, ECMO, nitric oxide, relaxant, trial.</summary>
    public IReadOnlySet<EventKind> Ongoing { get; private init; } = new HashSet<EventKind>();

    /// <summary>Gets the follow-ups that are open, soonest first.</summary>
    public IReadOnlyList<Charted<FollowUp>> FollowUps { get; private init; } = [];

    /// <summary>Gets what the rules make of it, one outcome a rule.</summary>
    public IReadOnlyList<RuleOutcome> Outcomes { get; private init; } = [];

    /// <summary>Gets the first later instant at which time alone changes anything; null when none does.</summary>
    public Instant? NextChangeAt { get; private init; }

    /// <summary>Gets the value with a name.</summary>
    /// <exception cref="KeyNotFoundException">There is no such value.</exception>
    public PictureValue this[string name] => Values[name];

    /// <summary>The picture of a window at an instant. Entries effective later are left out, as are facts that came later.</summary>
    public static PatientPicture At(ChartWindow window, Instant now) => new(window, now);

    /// <summary>Gets whether a circumstance is in force.</summary>
    public bool Has(Circumstance flag) => Context.Any(c => c.Body.Flag == flag);
}
