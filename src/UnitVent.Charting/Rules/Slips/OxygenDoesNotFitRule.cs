using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Slips;

/// <summary>R16: PaO2 of the latest arterial gas and the oximeter's reading do not fit together.</summary>
public sealed class OxygenDoesNotFitRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R16";

    /// <inheritdoc/>
    public override Family Family => Family.Entry;

    /// <inheritdoc/>
    public override string Seen => "PO2 and SpO2 do not fit";

    /// <inheritdoc/>
    public override string Levels => "more than 5 points at SpO2 90–97 %, within 15 min, advisory";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var computed = picture[ValueNames.SaturationComputedPercent];
        if (computed.Value is not { } expected || picture.LatestGas is not { } gas)
        {
            return CannotTell(computed);
        }

        var options = picture.Window.Unit.Thresholds.OxygenDoesNotFit;
        if (Oximeter(gas, options) is not { } spO2 || spO2.Percent < options.FromSpO2Percent || spO2.Percent > options.ToSpO2Percent)
        {
            return CannotTell("Needs SpO2 of the same quarter of an hour within the range that is compared.");
        }

        var off = spO2.Percent - expected;
        return Math.Abs(off) <= options.MayDifferPoints ? Clear(gas.Gas.At) : RaiseOnGas(
            picture,
            Severity.Advisory,
            $"SpO2 {Numbers.Fixed(spO2.Percent)} %, but PaO2 {Numbers.Fixed(picture[ValueNames.SaturationComputedPercent].Inputs[0].Value!.Value)} mmHg goes with {Numbers.Fixed(expected)} %",
            off > 0 ? "oximeter reads high, true low oxygen, or a venous sample" : "the probe and its perfusion, air in the sample, dyshaemoglobins",
            Evidence.Of(Math.Abs(off), [gas.Gas.Id, spO2.Entry], ("spO2Percent", spO2.Percent), ("saturationComputedPercent", expected)));
    }

    private static (double Percent, Guid Entry)? Oximeter(PairedGas gas, OxygenDoesNotFitOptions options) =>
        gas.Gas.Body.SpO2Percent is { } slip ? ((double)slip, gas.Gas.Id)
        : gas.Check is { } check && check.Body.SpO2Percent is { } seen && Math.Abs((check.At - gas.Gas.At).TotalMinutes) <= options.WithinMinutes ? ((double)seen, check.Id)
        : null;
}
