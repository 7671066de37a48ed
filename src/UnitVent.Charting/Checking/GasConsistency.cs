using UnitVent.Charting.Entries;
using UnitVent.Physiology;

namespace UnitVent.Charting.Checking;

/// <summary>Whether pH, carbon dioxide tension and bicarbonate of one slip fit together.</summary>
/// <param name="PH">The pH that goes with the typed tension and bicarbonate.</param>
/// <param name="DeltaPH">That pH less the typed one.</param>
/// <param name="BeyondRounding">How far the difference goes beyond what rounding of the typed figures explains; zero or more.</param>
public sealed record GasConsistency(double PH, double DeltaPH, double BeyondRounding)
{
    /// <summary>Beyond this a mismatch is worth checking [common practice].</summary>
    public const double AdvisoryBeyond = 0.03;

    /// <summary>Beyond this the figures do not fit together [common practice].</summary>
    public const double CautionBeyond = 0.06;

    /// <summary>The consistency of a gas; null when a figure is missing or the bicarbonate is the standard one.</summary>
    public static GasConsistency? Of(BloodGas gas)
    {
        if (gas is not { PH: { } pH, PCO2: { } pCO2, BicarbonateMmolL: { } bicarbonate } || gas.BicarbonateKind == BicarbonateKind.Standard)
        {
            return null;
        }

        try
        {
            var tension = Tension(pCO2, gas.TensionUnit);
            var fit = HendersonHasselbalch.PH(Bicarbonate.FromMmolPerLitre((double)bicarbonate), tension);
            var delta = fit - BloodPH.FromPH((double)pH).Value;
            var rounding = HalfStep(pH) + (Relative(bicarbonate) + Relative(pCO2)) / Math.Log(10);
            return new(fit, delta, Math.Max(0, Math.Abs(delta) - rounding));
        }
        catch (ArgumentOutOfRangeException)
        {
            return null;
        }
    }

    /// <summary>What bicarbonate the typed pH and tension imply, in mmol/L.</summary>
    public static double? ImpliedBicarbonate(BloodGas gas) => gas is { PH: { } pH, PCO2: { } pCO2 }
        ? HendersonHasselbalch.Bicarbonate(BloodPH.FromPH((double)pH), Tension(pCO2, gas.TensionUnit))
        : null;

    internal static PartialPressure Tension(decimal typed, TensionUnit? unit) =>
        unit == TensionUnit.KPa ? PartialPressure.FromKilopascals((double)typed) : PartialPressure.FromMmHg((double)typed);

    private static double HalfStep(decimal typed) => 0.5 * Math.Pow(10, -typed.Scale);

    private static double Relative(decimal typed) => typed == 0 ? 0 : HalfStep(typed) / (double)typed;
}
