using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>R19d: own breaths are large and the effort is strong.</summary>
public sealed class LargeOwnBreathsRule : Rule
{
    private const double HalfImportantChangeMlPerKg = 0.5; // half of 1 mL/kg [common practice]

    /// <inheritdoc/>
    public override string Id => "R19d";

    /// <inheritdoc/>
    public override Family Family => Family.Effort;

    /// <inheritdoc/>
    public override string Seen => "large own breaths with strong effort";

    /// <inheritdoc/>
    public override string Levels => "over 8 mL/kg caution";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        PerKg(picture) <= picture.Window.Unit.Thresholds.LargeOwnBreaths.AboveMlPerKg - HalfImportantChangeMlPerKg
        || BreathingReadings.Effort(picture)?.Value < Entries.Effort.Strong;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (PerKg(picture) is not { } perKg || BreathingReadings.OwnVolume(picture) is not { } volume || BreathingReadings.Effort(picture) is not { } effort)
        {
            return CannotTell("Needs a recent own tidal volume and effort, height and sex.");
        }

        var seen = Instant.Max(volume.At, effort.At);
        return perKg > picture.Window.Unit.Thresholds.LargeOwnBreaths.AboveMlPerKg && effort.Value == Entries.Effort.Strong
            ? Raise(
                Severity.Caution,
                $"own breaths {Numbers.Fixed(perKg, 1)} mL/kg, effort strong",
                "comfort, PaCO2 and pH, acidosis of the blood, fever and pain, support pressure",
                seen,
                Evidence.Of(perKg, volume.At > effort.At ? [volume.Entry, effort.Entry] : [effort.Entry, volume.Entry], ("ownVolumePerKg", perKg)))
            : Clear(seen);
    }

    private static double? PerKg(PatientPicture picture) => BreathingReadings.OwnVolume(picture)?.Value / picture[ValueNames.PredictedBodyWeightKg].Value;
}
