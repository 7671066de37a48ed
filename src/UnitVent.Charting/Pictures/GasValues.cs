using UnitVent.Charting.Entries;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>What the latest arterial gas says by itself: A19, A22, A23.</summary>
internal static class GasValues
{
    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        var pH = Number(s, "pH", "pH", "", g => g.PH);
        var pCO2 = Input(s, "pCO2", "PaCO2", "mmHg", g => GasPairing.Tension(g, "pCO2", "PaCO2", b => b.PCO2));
        var bicarbonate = Equations.BicarbonateComputed.Of([pH, pCO2], v => HendersonHasselbalch.Bicarbonate(PHOf(v[0]), Tension(v[1])));
        yield return bicarbonate;
        yield return Consistency(s, pH, pCO2);
        yield return Equations.StandardBaseExcess.Of(
            [pH, OxygenValues.AsInput(bicarbonate, "bicarbonate")],
            v => BaseExcess.Standard(PHOf(v[0]), v[1]),
            doubt: v => Math.Abs(BaseExcess.Standard(PHOf(v[0]), v[1])) > 30 ? "outside validated range: beyond ±30 mmol/L." : null);
        var haemoglobin = Number(s, "haemoglobinGDl", "haemoglobin", "g/dL", g => g.HaemoglobinGDl);
        var blood = Equations.BloodBaseExcess.Of(
            [pH, OxygenValues.AsInput(bicarbonate, "bicarbonate"), haemoglobin],
            v => BaseExcess.Blood(PHOf(v[0]), v[1], HaemoglobinConcentration.FromGramsPerDecilitre(v[2])));
        yield return blood;
        yield return Equations.StandardBicarbonate.Of(
            [OxygenValues.AsInput(blood, "base excess"), haemoglobin, Number(s, "sO2Percent", "measured saturation", "%", g => g.SO2Percent)],
            v => StandardBicarbonate.Compute(v[0], HaemoglobinConcentration.FromGramsPerDecilitre(v[1]), Saturation.FromPercent(v[2])));
        yield return Equations.AnionGap.Of(
            [Number(s, "sodiumMmolL", "sodium", "mmol/L", g => g.SodiumMmolL), Number(s, "chlorideMmolL", "chloride", "mmol/L", g => g.ChlorideMmolL), OxygenValues.AsInput(bicarbonate, "bicarbonate")],
            v => AnionGap.Compute(v[0], v[1], v[2]));
        yield return Ratio(s, pCO2);
        yield return Gap(s, pCO2);
    }

    /// <summary>An input from the latest arterial gas; it says so when there is none, or none young enough.</summary>
    public static Given Input(PictureSources s, string name, string label, string unit, Func<Charted<BloodGas>, Given> of) => s.LatestArterial is { } gas
        ? of(gas.Gas).NoOlderThan(s.Limits.Gas, s.Now)
        : Given.Missing(name, "an arterial gas", unit) with { Label = label };

    /// <summary>A number of the latest arterial gas that carries no unit of its own choice.</summary>
    public static Given Number(PictureSources s, string name, string label, string unit, Func<BloodGas, decimal?> member) => Input(
        s,
        name,
        label,
        unit,
        g => member(g.Body) is { } value ? new Given(name, label, unit, (double)value, g.At, g.Id) : Given.Missing(name, label, unit));

    private static PictureValue Consistency(PictureSources s, Given pH, Given pCO2)
    {
        var standard = s.LatestArterial?.Gas.Body.BicarbonateKind == BicarbonateKind.Standard;
        var bicarbonate = Number(s, "bicarbonateMmolL", "bicarbonate", "mmol/L", g => g.BicarbonateMmolL)
            .Unless(standard, ValueState.Domain, "Standard bicarbonate does not enter this equation.");
        return Equations.GasConsistency.Of(
            [pH, pCO2, bicarbonate],
            v => HendersonHasselbalch.ConsistencyDeltaPH(PHOf(v[0]), Tension(v[1]), Bicarbonate.FromMmolPerLitre(v[2])));
    }

    private static PictureValue Ratio(PictureSources s, Given pCO2)
    {
        var total = s.FromCheck(s.CheckWith(c => c.TotalMinuteVolumeLMin is not null), "totalMinuteVolumeLMin", "total minute volume", "L/min", c => c.TotalMinuteVolumeLMin);
        return Equations.VentilatoryRatio.Of(
            [total, pCO2, s.PredictedWeight()],
            v => VentilatoryRatio.Compute(MinuteVentilation.FromLitresPerMinute(v[0]), Tension(v[1]), BodyMass.FromKilograms(v[2])),
            doubt: _ => s.Mode == VentilationMode.Aprv ? "outside validated range: not validated in APRV." : null);
    }

    private static PictureValue Gap(PictureSources s, Given pCO2)
    {
        var atDraw = Number(s, "etCO2MmHg", "EtCO2 at the draw", "mmHg", g => g.EtCO2MmHg);
        var paired = s.LatestArterial?.Check is { } check ? s.FromCheck(check, "etCO2MmHg", "EtCO2", "mmHg", c => c.EtCO2MmHg) : atDraw;
        return Equations.ArterialEndTidalGap.Of([pCO2, atDraw.State == ValueState.Ok ? atDraw : paired], v => v[0] - v[1]);
    }

    private static BloodPH PHOf(double pH) => BloodPH.FromPH(pH);

    private static PartialPressure Tension(double mmHg) => PartialPressure.FromMmHg(mmHg);
}
