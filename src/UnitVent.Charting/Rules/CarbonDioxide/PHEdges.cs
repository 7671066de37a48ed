using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using static UnitVent.Charting.Rules.CarbonDioxide.AcidBaseReadings;

namespace UnitVent.Charting.Rules.CarbonDioxide;

/// <summary>The edges of pH that hold for a patient now.</summary>
internal readonly record struct PHEdges(double CautionUnder, double UrgentUnder)
{
    /// <summary>The unit's edges; the patient's own where a lower pH is accepted, which holds only while the cause is not metabolic, and not on ECMO.</summary>
    public static PHEdges Of(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.PH;
        var floor = (double?)picture.Targets?.Body.PHFloor ?? (picture.Has(Circumstance.PermissiveHypercapnia) ? options.PermissiveFloor : null);
        var accepted = floor < options.CautionUnder
            && !picture.OnEcmo
            && picture.LatestGas is { } gas && BaseExcessOf(gas) > options.AcceptedBaseExcessMmolL;
        return accepted
            ? new(Math.Max(floor!.Value, options.UrgentUnderAlways), options.UrgentUnderAlways)
            : new(Math.Max(floor ?? 0, options.CautionUnder), options.UrgentUnder);
    }
}
