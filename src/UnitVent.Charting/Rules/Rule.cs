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

    private string? QuietBecause(PatientPicture picture)
    {
        var away = picture.Ongoing.Contains(EventKind.TransportOut) || picture.Ongoing.Contains(EventKind.OffVentilatorStart);
        return QuietOffUnit && away ? "The patient is off the unit or off the ventilator."
            : QuietInComfortCare && picture.Has(Circumstance.ComfortCare) ? "Comfort care."
            : QuietOnEcmo && picture.OnEcmo ? "On ECMO."
            : null;
    }
}
