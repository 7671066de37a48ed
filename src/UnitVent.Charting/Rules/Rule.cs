using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules;

/// <summary>One rule of the catalogue. It looks at a picture and states what it saw.</summary>
public abstract class Rule
{
    /// <summary>Gets the id, stable for ever.</summary>
    public abstract string Id { get; }

    /// <summary>Gets the family whose card it appears on.</summary>
    public abstract Family Family { get; }

    /// <summary>Gets what it looks for, in a few words.</summary>
    public abstract string Seen { get; }

    /// <summary>Gets what it asks attention for at which level, in words.</summary>
    public abstract string Levels { get; }

    /// <summary>Gets when it is quiet beside what <see cref="QuietOffUnit"/> and its like say, and what else shifts it; empty when nothing does.</summary>
    public virtual string Remarks => "";

    /// <summary>Gets whether it rests on a setting: said once and, when somebody has seen it, quiet until the setting changes or 12 h pass.</summary>
    public virtual bool SaidOnce => false;

    /// <summary>Gets the family whose card it joins while that one is open, since it explains it; null when it always stands on its own family's.</summary>
    public virtual Family? Joins => null;

    /// <summary>Gets whether it leaves the cards while a caution or urgent finding is open.</summary>
    public virtual bool OnlyWithoutCaution => false;

    /// <summary>Gets whether it stays quiet while the patient is off the ventilator, in transport or in theatre.</summary>
    public virtual bool QuietOffUnit => false;

    /// <summary>Gets whether comfort care mutes it.</summary>
    public virtual bool QuietInComfortCare => false;

    /// <summary>Gets whether ECMO mutes it.</summary>
    public virtual bool QuietOnEcmo => false;

    /// <summary>What the rule makes of a picture.</summary>
    public RuleOutcome Evaluate(PatientPicture picture)
    {
        ArgumentNullException.ThrowIfNull(picture);
        return QuietBecause(picture) is { } why ? CannotTell(why) : Look(picture);
    }

    /// <summary>Whether values that no longer raise the rule also clear what it raised: a hysteresis of half the minimum important change.</summary>
    /// <param name="open">What was last seen.</param>
    /// <param name="picture">The picture that no longer raises it.</param>
    public virtual bool IsBackInside(Finding open, PatientPicture picture) => true;

    /// <summary>The instants, past or to come, at which time alone changes what the rule says of a picture.</summary>
    public virtual IEnumerable<Instant> Moments(PatientPicture picture) => [];

    /// <summary>Looks at a picture that none of the quiet conditions covers.</summary>
    protected abstract RuleOutcome Look(PatientPicture picture);

    /// <summary>The rule saw nothing in values as young as this.</summary>
    protected RuleOutcome Clear(Instant seenAt) => new RuleOutcome.Clear(Id, seenAt);

    /// <summary>The rule could not look.</summary>
    protected RuleOutcome CannotTell(string because) => new RuleOutcome.CannotTell(Id, because);

    /// <summary>The rule cannot look because a value cannot be had.</summary>
    protected RuleOutcome CannotTell(PictureValue value) => CannotTell(value.Because ?? "Not known.");

    /// <summary>The rule saw something.</summary>
    protected RuleOutcome Raise(Severity severity, string says, string lookAt, Instant seenAt, Evidence evidence) =>
        new RuleOutcome.Raised(new Finding(Id, Family, severity, says, lookAt, seenAt, evidence.Numbers, evidence.Entries) { Badness = evidence.Badness });

    /// <summary>The rule saw something in the latest arterial gas. A gas that does not fit itself holds back all but what is urgent, and that says so.</summary>
    protected RuleOutcome RaiseOnGas(PatientPicture picture, Severity severity, string says, string lookAt, Evidence evidence)
    {
        ArgumentNullException.ThrowIfNull(picture);
        var seenAt = picture.LatestGas!.Gas.At;
        return picture.GasDoubt is not { } doubt ? Raise(severity, says, lookAt, seenAt, evidence)
            : severity == Severity.Urgent ? Raise(severity, $"{says}; unconfirmed: {doubt}", lookAt + ", a repeated gas", seenAt, evidence)
            : CannotTell($"Held back: {doubt}.");
    }

    private string? QuietBecause(PatientPicture picture)
    {
        var away = picture.Ongoing.Contains(EventKind.TransportOut) || picture.Ongoing.Contains(EventKind.OffVentilatorStart);
        return QuietOffUnit && away ? "The patient is off the unit or off the ventilator."
            : QuietInComfortCare && picture.Has(Circumstance.ComfortCare) ? "Comfort care."
            : QuietOnEcmo && picture.OnEcmo ? "On ECMO."
            : null;
    }
}
