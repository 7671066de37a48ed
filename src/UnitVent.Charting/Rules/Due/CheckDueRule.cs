using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Due;

/// <summary>R32: a ventilator check is overdue.</summary>
public sealed class CheckDueRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R32";

    /// <inheritdoc/>
    public override Family Family => Family.Due;

    /// <inheritdoc/>
    public override string Seen => "ventilator check due";

    /// <inheritdoc/>
    public override string Levels => "5 h advisory, 8 h caution at an interval of 4 h";

    /// <inheritdoc/>
    public override bool QuietOffUnit => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <summary>When the next check is due.</summary>
    public static Instant DueAt(PatientPicture picture) => LastSeen(picture) + picture.Window.Unit.CheckInterval;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.CheckDue;
        var interval = picture.Window.Unit.CheckInterval;
        var age = picture.AsOf - LastSeen(picture);
        if (age < interval * options.AdvisoryIntervals)
        {
            return Clear(picture.AsOf);
        }

        var overdue = age >= interval * options.CautionIntervals;
        var raised = (RuleOutcome.Raised)Raise(
            overdue ? Severity.Caution : Severity.Advisory,
            $"ventilator check was due {Times.Clock(DueAt(picture), picture)}, last {(picture.Check is { } c ? Times.Clock(c.At, picture) : "none")}",
            "the ventilator check",
            DueAt(picture),
            Evidence.Of(age / interval, [], ("hoursSinceCheck", age.TotalHours)));
        return raised with { Finding = raised.Finding with { Overdue = overdue } };
    }

    private static Instant LastSeen(PatientPicture picture) => picture.Check?.At ?? picture.Window.Episode.AdmittedAt;
}
