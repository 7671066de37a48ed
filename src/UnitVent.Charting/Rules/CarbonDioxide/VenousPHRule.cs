using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>R57: a venous gas shows a very low pH, and no arterial one came since. A venous gas never stands for an arterial one.</summary>
public sealed class VenousPHRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R57";

    /// <inheritdoc/>
    public override Family Family => Family.CarbonDioxide;

    /// <inheritdoc/>
    public override string Seen => "very low venous pH without an arterial gas since";

    /// <inheritdoc/>
    public override string Levels => "under 7.20 caution";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.Window.Latest<BloodGas>(EntryKind.BloodGas, picture.AsOf, g => g.Specimen == Specimen.Venous) is not { } venous)
        {
            return CannotTell("No venous gas.");
        }

        var pH = (double)venous.Body.PH!.Value;
        if (picture.LatestGas?.Gas.At >= venous.At || pH >= picture.Window.Unit.Thresholds.VenousPH.CautionUnder)
        {
            return Clear(Instant.Max(venous.At, picture.LatestGas?.Gas.At ?? venous.At));
        }

        return picture.AsOf - venous.At > picture.Limits.Gas
            ? CannotTell("The venous gas is too old.")
            : Raise(
                Severity.Caution,
                $"venous pH {venous.Body.PH}, edge {Numbers.Fixed(picture.Window.Unit.Thresholds.VenousPH.CautionUnder, 2)}; no arterial gas since",
                "arterial gas needed; lactate, perfusion, minute volume",
                venous.At,
                Evidence.Of(-pH, [venous.Id], ("venousPH", pH)));
    }
}
