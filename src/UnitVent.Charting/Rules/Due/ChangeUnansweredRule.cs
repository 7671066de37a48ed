using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Due;

/// <summary>R31: settings are others and nothing was looked at since.</summary>
public sealed class ChangeUnansweredRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R31";

    /// <inheritdoc/>
    public override Family Family => Family.Due;

    /// <inheritdoc/>
    public override string Seen => "setting changed, nothing looked at since";

    /// <inheritdoc/>
    public override string Levels => "no gas after 2 h advisory, 4 h caution; FiO2 by 0.10: no SpO2; weaning: no SpO2 with rate and EtCO2, and no gas after 12 h advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet while a gas is booked.";

    /// <inheritdoc/>
    public override bool QuietOffUnit => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.ChangeUnanswered;
        return UnansweredChange.Of(picture) is { } open
            ? [open.ChangedAt + Duration.FromHours(options.AdvisoryHours), open.ChangedAt + Duration.FromHours(options.CautionHours), open.ChangedAt + Duration.FromHours(options.WeaningGasHours)]
            : [];
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.ChangeUnanswered;
        if (picture.Settings is null)
        {
            return CannotTell("Needs settings.");
        }

        if (UnansweredChange.Of(picture) is not { } open || GasIsBooked(picture))
        {
            return Clear(picture.AsOf);
        }

        var hours = (picture.AsOf - open.ChangedAt).TotalHours;
        var overdue = !open.OnlyGas && hours > options.CautionHours;
        if (hours <= (open.OnlyGas ? options.WeaningGasHours : options.AdvisoryHours))
        {
            return Clear(picture.AsOf);
        }

        var raised = (RuleOutcome.Raised)Raise(
            overdue ? Severity.Caution : Severity.Advisory,
            $"{open.What} at {Times.Clock(open.ChangedAt, picture)}, no {open.Awaits} since",
            open.Awaits,
            open.ChangedAt,
            Evidence.Of(hours, [open.Entry], ("hours", hours)));
        return raised with { Finding = raised.Finding with { Overdue = overdue } };
    }

    private static bool GasIsBooked(PatientPicture picture) =>
        picture.FollowUps.Any(f => f.Body.DueAt > picture.AsOf && f.Body.What!.Contains("gas", StringComparison.OrdinalIgnoreCase));
}
