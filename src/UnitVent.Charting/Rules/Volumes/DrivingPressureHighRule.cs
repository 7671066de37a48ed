using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Volumes;

/// <summary>R43: the driving pressure is high.</summary>
public sealed class DrivingPressureHighRule : Rule
{
    private const double HalfImportantChangeCmH2O = 1; // half of 2 cmH2O [common practice]

    /// <inheritdoc/>
    public override string Id => "R43";

    /// <inheritdoc/>
    public override Family Family => Family.VolumeAndPressure;

    /// <inheritdoc/>
    public override string Seen => "driving pressure high";

    /// <inheritdoc/>
    public override string Levels => "over 15 cmH2O caution, without ARDS advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet without a passive hold.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.DrivingPressureCmH2O].Value is not { } driving
        || driving <= picture.Window.Unit.Thresholds.DrivingPressureHigh.HighCmH2O - HalfImportantChangeCmH2O;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var value = picture[ValueNames.DrivingPressureCmH2O];
        if (value is not { Value: { } driving, AsOf: { } at, State: ValueState.Ok })
        {
            return CannotTell(value);
        }

        return driving <= picture.Window.Unit.Thresholds.DrivingPressureHigh.HighCmH2O ? Clear(at)
            : Raise(
                picture.Has(Circumstance.Ards) ? Severity.Caution : Severity.Advisory,
                $"driving pressure {Numbers.Fixed(driving, 1)} cmH2O",
                "tidal volume per kg, PEEP, static compliance, chest wall",
                at,
                Evidence.Of(driving, [value.Inputs[0].Entry], ("drivingPressureCmH2O", driving)));
    }
}
