using UnitVent.Charting.Checking;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Slips;

/// <summary>R14: pH, carbon dioxide tension and bicarbonate of the latest arterial gas do not fit together.</summary>
public sealed class GasDoesNotFitRule : Rule
{
    private const double FitsStandardWithinMmolL = 1; // common practice

    /// <inheritdoc/>
    public override string Id => "R14";

    /// <inheritdoc/>
    public override Family Family => Family.Entry;

    /// <inheritdoc/>
    public override string Seen => "gas does not fit itself";

    /// <inheritdoc/>
    public override string Levels => "beyond 0.03 advisory, beyond 0.06 caution, after what rounding explains";

    /// <inheritdoc/>
    public override string Remarks => "Says when it would fit standard bicarbonate.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.LatestGas is not { } gas || GasConsistency.Of(gas.Gas.Body) is not { } fit)
        {
            return CannotTell("Needs an arterial gas with actual bicarbonate.");
        }

        var level = fit.BeyondRounding > GasConsistency.CautionBeyond ? Severity.Caution
            : fit.BeyondRounding > GasConsistency.AdvisoryBeyond ? Severity.Advisory
            : (Severity?)null;
        if (level is not { } severity)
        {
            return Clear(gas.Gas.At);
        }

        var body = gas.Gas.Body;
        var standard = picture[ValueNames.StandardBicarbonateMmolL].Value;
        var hint = standard is { } s && Math.Abs(s - (double)body.BicarbonateMmolL!) <= FitsStandardWithinMmolL ? "; it would fit standard bicarbonate" : "";
        return Raise(
            severity,
            $"pH {body.PH} does not go with pCO2 {body.PCO2} and bicarbonate {body.BicarbonateMmolL}: pH {Numbers.Fixed(fit.PH, 2)} would{hint}",
            "the slip, the specimen, which bicarbonate it prints",
            gas.Gas.At,
            Evidence.Of(fit.BeyondRounding, [gas.Gas.Id], ("pHThatFits", fit.PH), ("deltaPH", fit.DeltaPH)));
    }
}
