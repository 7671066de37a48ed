using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Due;

/// <summary>R17: readings, settings or gas are past their limit, so how the patient is doing is not known. Old is not safe.</summary>
public sealed class NotKnownRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R17";

    /// <inheritdoc/>
    public override Family Family => Family.Due;

    /// <inheritdoc/>
    public override string Seen => "not known: readings, settings or gas past their limit";

    /// <inheritdoc/>
    public override string Levels => "past the limit advisory, past twice the limit caution";

    /// <inheritdoc/>
    public override string Remarks => "Limits: readings 1.5 check intervals; settings 12 h since change or confirmation; gas 12 h, 24 h in weaning, pressure support and CPAP.";

    /// <inheritdoc/>
    public override bool QuietOffUnit => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var late = Sources(picture).Where(s => picture.AsOf - s.Seen > s.Limit).OrderBy(s => s.Seen + s.Limit).ToList();
        if (late.Count == 0)
        {
            return Clear(picture.AsOf);
        }

        var first = late[0];
        var overdue = late.Any(s => picture.AsOf - s.Seen > s.Limit * 2);
        var says = string.Join("; ", late.Select(s => s.Charted
            ? $"{s.What} last seen {Times.Clock(s.Seen, picture)}, {Times.Hours(picture.AsOf - s.Seen)} ago"
            : $"no {s.What} charted for {Times.Hours(picture.AsOf - s.Seen)}"));
        var raised = (RuleOutcome.Raised)Raise(
            overdue ? Severity.Caution : Severity.Advisory,
            "not known since " + Times.Clock(first.Seen + first.Limit, picture) + ": " + says,
            "the patient, the ventilator, whether a gas was drawn and not charted",
            first.Seen + first.Limit,
            Evidence.Of(late.Max(s => (picture.AsOf - s.Seen) / s.Limit), [], [.. late.Select(s => (s.What, (picture.AsOf - s.Seen).TotalHours))]));
        return raised with { Finding = raised.Finding with { Overdue = overdue } };
    }

    private static IEnumerable<(string What, Instant Seen, bool Charted, Duration Limit)> Sources(PatientPicture picture)
    {
        var start = picture.Window.Episode.AdmittedAt;
        yield return Source("ventilator check", picture.Check?.At, picture.Limits.Readings);
        yield return Source("settings", picture.SettingsConfirmedAt, picture.Limits.Settings);
        yield return Source("arterial gas", picture.LatestGas?.Gas.At, picture.Limits.Gas);

        (string, Instant, bool, Duration) Source(string what, Instant? seen, Duration limit) => (what, seen ?? start, seen is not null, limit);
    }
}
