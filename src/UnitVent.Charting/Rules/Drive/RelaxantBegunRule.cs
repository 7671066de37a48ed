using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Drive;

/// <summary>R20: a relaxant acts in APRV, so own breathing is gone and a gas is due.</summary>
public sealed class RelaxantBegunRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R20";

    /// <inheritdoc/>
    public override Family Family => Family.Drive;

    /// <inheritdoc/>
    public override string Seen => "relaxant begun in APRV";

    /// <inheritdoc/>
    public override string Levels => "advisory until an arterial gas is there";

    /// <inheritdoc/>
    public override string Remarks => "While the relaxant acts R19a, R30 and R53 are quiet. Quiet in other modes.";

    /// <inheritdoc/>
    public override bool SaidOnce => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) =>
        RelaxantReadings.Acting(picture) is { } acting && !picture.Ongoing.Contains(EventKind.RelaxantStart) ? [acting.Since + picture.Limits.Readings] : [];

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (SettingsHeld.Aprv(picture) is not { } settings)
        {
            return CannotTell("Judged in APRV with settings confirmed.");
        }

        if (RelaxantReadings.Acting(picture) is not { } acting)
        {
            return Clear(picture.AsOf);
        }

        var dueAt = Instant.Max(acting.Since, settings.At) + Duration.FromHours(picture.Window.Unit.Thresholds.RelaxantBegun.GasWithinHours);
        return picture.LatestGas is { } gas && gas.Gas.At > acting.Since
            ? Clear(gas.Gas.At)
            : Raise(
                Severity.Advisory,
                $"relaxant since {Times.Clock(acting.Since, picture)}: own share is gone, gas due {Times.Clock(dueAt, picture)}",
                "EtCO2, minute volume, the share that own breathing had, RASS is not assessable",
                acting.Since,
                Evidence.Of(1, [acting.Entry], ("hoursSinceRelaxant", (picture.AsOf - acting.Since).TotalHours)));
    }
}
