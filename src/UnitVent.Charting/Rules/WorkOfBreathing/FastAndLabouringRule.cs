using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>R19c: the patient breathes fast and works for it.</summary>
public sealed class FastAndLabouringRule : Rule
{
    internal const double HalfImportantRate = 2.5; // half of 5 breaths a minute [common practice]

    /// <inheritdoc/>
    public override string Id => "R19c";

    /// <inheritdoc/>
    public override Family Family => Family.Effort;

    /// <inheritdoc/>
    public override string Seen => "fast and labouring";

    /// <inheritdoc/>
    public override string Levels => "rate from 35/min with moderate or strong effort caution";

    /// <inheritdoc/>
    public override string Remarks => "In APRV the own rate counts, not the total with the releases.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        BreathingReadings.Rate(picture)?.Value <= picture.Window.Unit.Thresholds.FastAndLabouring.RateFromPerMin - HalfImportantRate
        || BreathingReadings.Effort(picture)?.Value < Entries.Effort.Moderate;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (BreathingReadings.Rate(picture) is not { } rate || BreathingReadings.Effort(picture) is not { } effort)
        {
            return CannotTell("Needs a recent rate and effort.");
        }

        var seen = Instant.Max(rate.At, effort.At);
        return rate.Value >= picture.Window.Unit.Thresholds.FastAndLabouring.RateFromPerMin && effort.Value >= Entries.Effort.Moderate
            ? Raise(
                Severity.Caution,
                $"{Numbers.Fixed(rate.Value)} breaths/min, effort {effort.Value.ToString().ToLowerInvariant()}",
                "comfort and accessory muscles, secretions, PaCO2 and pH, fever and pain, trigger and support",
                seen,
                Evidence.Of(rate.Value, rate.At > effort.At ? [rate.Entry, effort.Entry] : [effort.Entry, rate.Entry], ("ratePerMin", rate.Value)))
            : Clear(seen);
    }
}
