using UnitVent.Charting.Entries;
using UnitVent.Charting.Windows;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>How well oxygen gets into the blood: A3–A5, A20, A25.</summary>
internal static class OxygenValues
{
    private const string NoGas = "an arterial gas";

    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        yield return FromLatestGas(s, Equations.PfRatio);
        yield return FromLatestGas(s, Equations.OxygenationIndex);
        yield return OxygenationClassOf(s);
        foreach (var value in BySaturation(s).Concat(Alveolar(s)).Concat(Blood(s)))
        {
            yield return value;
        }
    }

    /// <summary>P/F of a gas with its settings.</summary>
    public static PictureValue PaO2FiO2(Charted<BloodGas> gas, Charted<SettingChange>? settings, bool changedJustBefore) => Equations.PfRatio.Of(
        OxygenInputs(gas, settings, changedJustBefore),
        v => PaO2FiO2Ratio.Compute(PartialPressure.FromMmHg(v[0]), OxygenFraction.FromFraction(v[1])));

    /// <summary>Oxygenation index of a gas with its mean pressure.</summary>
    public static PictureValue OxygenationIndex(Charted<BloodGas> gas, Charted<SettingChange>? settings, PictureValue mean, bool changedJustBefore) => Equations.OxygenationIndex.Of(
        [.. OxygenInputs(gas, settings, changedJustBefore), AsInput(mean, "mean airway pressure")],
        v => Physiology.OxygenationIndex.Compute(OxygenFraction.FromFraction(v[1]), AirwayPressure.FromCmH2O(v[2]), PartialPressure.FromMmHg(v[0])));

    /// <summary>A computed value as the input of another.</summary>
    public static Given AsInput(PictureValue value, string label) => new(value.Name, label, value.Unit, value.Value, value.AsOf, value.Inputs.Count > 0 ? value.Inputs[0].Entry : null)
    {
        State = value.State,
        Because = value.Because,
    };

    private static Given[] OxygenInputs(Charted<BloodGas> gas, Charted<SettingChange>? settings, bool changedJustBefore) =>
        [GasPairing.Tension(gas, "pO2", "PaO2", g => g.PO2),
         GasPairing.OxygenFractionAtDraw(gas, settings)
             .Unless(changedJustBefore, ValueState.Pair, "PaO2 and the settings belong to different settings: they were changed less than 10 min before the draw.")];

    private static PictureValue FromLatestGas(PictureSources s, Equation equation)
    {
        if (s.LatestArterial is not { } gas)
        {
            return equation.Without(ValueState.Missing, $"Needs {NoGas}.");
        }

        var value = gas.Values[equation.Result];
        var old = s.Now - gas.Gas.At > s.Limits.Gas && value.Value is not null;
        return old
            ? equation.Without(ValueState.Stale, FormattableString.Invariant($"The arterial gas is {(s.Now - gas.Gas.At).TotalHours:0} h old; not calculated.")) with { AsOf = gas.Gas.At, Inputs = value.Inputs }
            : value;
    }

    private static PictureValue OxygenationClassOf(PictureSources s)
    {
        var gas = s.LatestArterial;
        var pressure = gas?.Settings?.Body.Mode == VentilationMode.Aprv
            ? AsInput(MeanPressure.Best(gas.Values[ValueNames.MeanAirwayPressureComputed], gas.Values[ValueNames.MeanAirwayPressureMeasured]), "mean airway pressure")
            : PictureSources.Setting(gas?.Settings, "peepCmH2O", "PEEP", "cmH2O", x => x.PeepCmH2O);
        var value = Equations.OxygenationClass.Of(
            [AsInput(FromLatestGas(s, Equations.PfRatio), "P/F"), pressure],
            v => (int)Class(s, v) - (int)Physiology.OxygenationClass.AboveMild,
            v => Class(s, v) == Physiology.OxygenationClass.NotClassified ? "PEEP or, in APRV, mean airway pressure is below 5 cmH2O." : null);
        return value with
        {
            Word = value.Value switch { 0 => "better than the mild range", 1 => "mild range", 2 => "moderate range", 3 => "severe range", _ => null },
        };
    }

    private static OxygenationClass Class(PictureSources s, double[] v) =>
        ArdsOxygenation.FromPaO2(v[0], AirwayPressure.FromCmH2O(v[1]), s.Barometric, AltitudeScaling.Limits);

    private static IEnumerable<PictureValue> BySaturation(PictureSources s)
    {
        var check = s.CheckWith(c => c.SpO2Percent is not null);
        var spO2 = s.FromCheck(check, "spO2Percent", "SpO2", "%", c => c.SpO2Percent);
        var fiO2 = s.SettingAt(check, "fiO2", "FiO2", "", x => x.FiO2);
        var sf = Equations.SfRatio.Of(
            [spO2, fiO2],
            v => SpO2FiO2Ratio.Compute(Saturation.FromPercent(v[0]), OxygenFraction.FromFraction(v[1])),
            v => SpO2FiO2Ratio.IsInformative(Saturation.FromPercent(v[0])) ? null : "S/F is not informative above 97 %.");
        yield return sf;
        yield return Equations.ImputedPfRatio.Of(
            [AsInput(sf, "S/F")],
            v => SpO2FiO2Ratio.ImputePaO2FiO2(v[0]),
            v => SpO2FiO2Ratio.CanImpute(v[0]) ? null : "S/F is too low to impute P/F from.");
        var mean = MeanPressure.Best(MeanPressure.Computed(check is { } c ? InForce.Settings(s.Window, c.At) : s.Settings, check), MeanPressure.Measured(check));
        yield return Equations.OxygenSaturationIndex.Of(
            [spO2, fiO2, AsInput(mean, "mean airway pressure")],
            v => Physiology.OxygenationIndex.ComputeFromSaturation(OxygenFraction.FromFraction(v[1]), AirwayPressure.FromCmH2O(v[2]), Saturation.FromPercent(v[0])),
            v => SpO2FiO2Ratio.IsInformative(Saturation.FromPercent(v[0])) ? null : "it is not informative above 97 %.");
    }

    private static IEnumerable<PictureValue> Alveolar(PictureSources s)
    {
        var gas = s.LatestArterial;
        var fiO2 = gas is null ? Given.Missing("fiO2", NoGas) : GasPairing.OxygenFractionAtDraw(gas.Gas, gas.Settings);
        var pCO2 = GasValues.Input(s, "pCO2", "PaCO2", "mmHg", g => GasPairing.Tension(g, "pCO2", "PaCO2", b => b.PCO2));
        var pO2 = GasValues.Input(s, "pO2", "PaO2", "mmHg", g => GasPairing.Tension(g, "pO2", "PaO2", b => b.PO2));
        var barometric = new Given("barometricPressureMmHg", "barometric pressure", "mmHg", s.Barometric.MmHg, null, null);
        var alveolar = Equations.AlveolarPO2.Of(
            [fiO2, barometric, pCO2],
            v => AlveolarGas.AlveolarPO2(OxygenFraction.FromFraction(v[0]), BarometricPressure.FromMmHg(v[1]), PartialPressure.FromMmHg(v[2])).MmHg);
        yield return alveolar;
        yield return Equations.AlveolarArterialDifference.Of(
            [AsInput(alveolar, "alveolar PO2"), pO2],
            v => Math.Max(0, v[0] - v[1]),
            v => v[0] - v[1] < -5 ? "PaO2 exceeds what the alveoli can hold; check PaO2, FiO2 and barometric pressure." : null);
        yield return Equations.ArterialAlveolarRatio.Of([AsInput(alveolar, "alveolar PO2"), pO2], v => v[1] / v[0]);
    }

    private static IEnumerable<PictureValue> Blood(PictureSources s)
    {
        var pO2 = GasValues.Input(s, "pO2", "PaO2", "mmHg", g => GasPairing.Tension(g, "pO2", "PaO2", b => b.PO2));
        var pCO2 = GasValues.Input(s, "pCO2", "PaCO2", "mmHg", g => GasPairing.Tension(g, "pCO2", "PaCO2", b => b.PCO2));
        var pH = GasValues.Number(s, "pH", "pH", "", g => g.PH);
        yield return Equations.SaturationComputed.Of(
            [pO2, pH, pCO2],
            v => OxygenDissociation.Saturation(OxygenDissociation.VirtualPartialPressure(PartialPressure.FromMmHg(v[0]), BloodPH.FromPH(v[1]), 37, PartialPressure.FromMmHg(v[2]))).Percent);
        yield return Equations.OxygenContent.Of(
            [GasValues.Number(s, "haemoglobinGDl", "haemoglobin", "g/dL", g => g.HaemoglobinGDl), GasValues.Number(s, "sO2Percent", "measured saturation", "%", g => g.SO2Percent), pO2],
            v => OxygenContent.ArterialMlPerDl(HaemoglobinConcentration.FromGramsPerDecilitre(v[0]), Saturation.FromPercent(v[1]), PartialPressure.FromMmHg(v[2])));
    }
}
