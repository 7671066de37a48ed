using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Pictures;

/// <summary>Everything computed about one patient at one instant from the chart. Immutable; every screen, sheet and interface reads this.</summary>
public sealed class PatientPicture
{
    private PatientPicture(PictureSources sources)
    {
        var (window, now) = (sources.Window, sources.Now);
        Window = window;
        AsOf = now;
        Settings = sources.Settings;
        SettingsConfirmedAt = sources.SettingsConfirmedAt;
        Limits = sources.Limits;
        Values = Computed(sources).ToDictionary(v => v.Name);
        Gases = GasPairing.Arterial(window, now);
        AcidBase = AcidBaseWords.Of(sources);
        Check = sources.Check;
        Breathing = window.Latest<BreathingCheck>(EntryKind.BreathingCheck, now);
        Airway = window.Latest<AirwayCheck>(EntryKind.AirwayCheck, now);
        Context = sources.Context;
        Targets = InForce.Targets(window, now);
        Phase = sources.Phase;
        Method = sources.Method;
        Prone = InForce.Prone(window, now);
        Ongoing = InForce.Ongoing(window, now);
        FollowUps = [.. window.Of<FollowUp>(EntryKind.FollowUp, now).Where(f => !window.FollowUpSteps.ContainsKey(f.Id)).OrderBy(f => f.Body.DueAt)];
        Outcomes = [.. RuleSet.All.Select(rule => rule.Evaluate(this))];
        NextChangeAt = Clockwork.NextChange(this);
    }

    /// <summary>Gets what it was computed from.</summary>
    public ChartWindow Window { get; }

    /// <summary>Gets the instant it stands for.</summary>
    public Instant AsOf { get; }

    /// <summary>Gets every value by its name in <see cref="ValueNames"/>.</summary>
    public IReadOnlyDictionary<string, PictureValue> Values { get; }

    /// <summary>Gets the settings in force; null when none were charted.</summary>
    public Charted<SettingChange>? Settings { get; }

    /// <summary>Gets from when the age of the settings counts: the last change, or the last check that saw them unchanged.</summary>
    public Instant? SettingsConfirmedAt { get; }

    /// <summary>Gets the arterial gases of the window with their settings, oldest first.</summary>
    public IReadOnlyList<PairedGas> Gases { get; }

    /// <summary>Gets the latest arterial gas with its settings; null when there is none.</summary>
    public PairedGas? LatestGas => Gases.Count > 0 ? Gases[^1] : null;

    /// <summary>Gets how the latest arterial gas reads as acid and base, in words; null without a gas young enough.</summary>
    public string? AcidBase { get; }

    /// <summary>Gets why the latest arterial gas is doubted: its figures do not fit together; null when it is not.</summary>
    public string? GasDoubt => LatestGas is { Gas.Body: { } slip } && GasConsistency.Of(slip) is { BeyondRounding: > GasConsistency.CautionBeyond }
        ? $"pH {slip.PH} does not fit pCO2 {slip.PCO2} and bicarbonate {slip.BicarbonateMmolL}"
        : null;

    /// <summary>Gets the latest ventilator check; null when there is none.</summary>
    public Charted<VentilatorCheck>? Check { get; }

    /// <summary>Gets the latest breathing check; null when there is none.</summary>
    public Charted<BreathingCheck>? Breathing { get; }

    /// <summary>Gets the latest airway check; null when there is none.</summary>
    public Charted<AirwayCheck>? Airway { get; }

    /// <summary>Gets the circumstances in force.</summary>
    public IReadOnlyList<Charted<ContextChange>> Context { get; }

    /// <summary>Gets the targets in force; null when none are.</summary>
    public Charted<TargetSet>? Targets { get; }

    /// <summary>Gets the phase in force.</summary>
    public CoursePhase Phase { get; }

    /// <summary>Gets the method in force.</summary>
    public SettingMethod Method { get; }

    /// <summary>Gets the phase that the chart looks like when it is another than the one in force; worked out when it is asked for.</summary>
    public Proposal<CoursePhase>? PhaseProposal => Proposals.Phase(this);

    /// <summary>Gets the method that the chart looks like when it is another than the one in force; worked out when it is asked for.</summary>
    public Proposal<SettingMethod>? MethodProposal => Proposals.Method(this);

    /// <summary>Gets whether the patient lies prone.</summary>
    public bool Prone { get; }

    /// <summary>Gets the timed events that are still going on: transport, off the ventilator, ECMO, nitric oxide, relaxant, trial.</summary>
    public IReadOnlySet<EventKind> Ongoing { get; }

    /// <summary>Gets the follow-ups that are open, soonest first.</summary>
    public IReadOnlyList<Charted<FollowUp>> FollowUps { get; }

    /// <summary>Gets what the rules make of it, one outcome a rule.</summary>
    public IReadOnlyList<RuleOutcome> Outcomes { get; }

    /// <summary>Gets how old a value may be before nothing is computed from it.</summary>
    public AgeLimits Limits { get; }

    /// <summary>Gets the first later instant at which time alone changes anything; null when none does.</summary>
    public Instant? NextChangeAt { get; }

    /// <summary>Gets what drifts, over the unit's window within the present epoch. Computed when first asked for.</summary>
    public PatientDrifts Drifts => field ??= new PatientDrifts(this);

    /// <summary>Gets the valid points behind drifts. Computed when first asked for.</summary>
    internal EpochSeries Series => field ??= new EpochSeries(this);

    /// <summary>Gets the value with a name.</summary>
    /// <exception cref="KeyNotFoundException">There is no such value.</exception>
    public PictureValue this[string name] => Values[name];

    /// <summary>The picture of a window at an instant. Entries effective later are left out, as are facts that came later.</summary>
    public static PatientPicture At(ChartWindow window, Instant now) => new(new PictureSources(window, now));

    /// <summary>Gets whether a circumstance is in force.</summary>
    public bool Has(Circumstance flag) => Context.Any(c => c.Body.Flag == flag);

    /// <summary>Gets whether the patient is on ECMO, by circumstance or by event.</summary>
    public bool OnEcmo => Has(Circumstance.EcmoVv) || Has(Circumstance.EcmoVa) || Ongoing.Contains(EventKind.EcmoStart);

    private static IEnumerable<PictureValue> Computed(PictureSources sources) =>
        BodyValues.Of(sources)
            .Concat(CycleValues.Of(sources))
            .Concat(OxygenValues.Of(sources))
            .Concat(GasValues.Of(sources))
            .Concat(ReleaseValues.Of(sources))
            .Concat(SplitValues.Of(sources))
            .Concat(ConventionalValues.Of(sources));
}
