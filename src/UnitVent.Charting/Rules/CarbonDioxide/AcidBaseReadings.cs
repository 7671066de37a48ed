using UnitVent.Charting.Checking;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Physiology;

namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>What the rules of this family read from an arterial gas.</summary>
internal static class AcidBaseReadings
{
    /// <summary>The latest arterial gas, when it is young enough.</summary>
    public static PairedGas? Latest(PatientPicture picture) =>
        picture.LatestGas is { } gas && picture.AsOf - gas.Gas.At <= picture.Limits.Gas ? gas : null;

    /// <summary>Whether it says nothing of the present ventilation: disturbed, or drawn while carbon dioxide still settled.</summary>
    public static bool IsUnsettled(PatientPicture picture, PairedGas gas) =>
        Settling.IsDisturbed(picture.Window, gas.Gas.At) || Settling.OfCarbonDioxideLasts(picture.Window, gas.Settings, gas.Gas.At);

    /// <summary>PaCO2 in mmHg.</summary>
    public static double PaCO2(PairedGas gas) => GasConsistency.Tension(gas.Gas.Body.PCO2!.Value, gas.Gas.Body.TensionUnit).MmHg;

    /// <summary>pH.</summary>
    public static double PH(PairedGas gas) => (double)gas.Gas.Body.PH!.Value;

    /// <summary>Standard base excess in mmol/L from pH and PaCO2; null when they lie outside what the formula is made for.</summary>
    public static double? BaseExcessOf(PairedGas gas)
    {
        try
        {
            return GasConsistency.ImpliedBicarbonate(gas.Gas.Body) is { } bicarbonate ? BaseExcess.Standard(BloodPH.FromPH(PH(gas)), bicarbonate) : null;
        }
        catch (ArgumentOutOfRangeException)
        {
            return null;
        }
    }
}
