using UnitVent.Charting.Pictures;
using static UnitVent.Charting.Trends.MinimumChange;

namespace UnitVent.Charting.Trends;

/// <summary>The quantities whose drift is looked for, with the changes that matter.</summary>
/// <remarks>A change beyond 2.77 coefficients of variation of repeated gases in stable patients is unlikely to be chance: <see cref="ReferenceChange"/>.</remarks>
public static class DriftVariables
{
    private const string RepeatedGases = "2.77 × the spread of repeated gases in stable patients, Chest 1983;84:14";
    private const string CapillaryGases = "difference with P ≤ 0.05, Clin Chem 1987;33:1416";
    private const string CommonPractice = "common practice";

    /// <summary>P/F.</summary>
    public static readonly DriftVariable PfRatio =
        new(ValueNames.PfRatio, "P/F", "mmHg", WorseWhen.Falling, OfShare(0.15), OfShare(0.20), RepeatedGases + "; step: common practice");

    /// <summary>Oxygenation index.</summary>
    public static readonly DriftVariable OxygenationIndex =
        new(ValueNames.OxygenationIndex, "oxygenation index", "", WorseWhen.Rising, OfShare(0.20), OfShare(0.25), CommonPractice);

    /// <summary>Arterial carbon dioxide tension. In an alkalaemic patient a fall is worse.</summary>
    public static readonly DriftVariable PaCO2 =
        new("paCO2MmHg", "PaCO2", "mmHg", WorseWhen.Rising, Both(4, 0.10), InUnits(5.6), RepeatedGases + "; step: " + CapillaryGases);

    /// <summary>Arterial pH.</summary>
    public static readonly DriftVariable PH =
        new("pH", "pH", "", WorseWhen.LeavingNormal, InUnits(0.04), InUnits(0.05), CapillaryGases + "; step: common practice") { Normal = 7.40 };

    /// <summary>Bicarbonate computed from pH and carbon dioxide tension.</summary>
    public static readonly DriftVariable Bicarbonate =
        new(ValueNames.BicarbonateComputedMmolL, "bicarbonate", "mmol/L", WorseWhen.Either, InUnits(2.6), InUnits(2.6), CapillaryGases);

    /// <summary>Standard base excess.</summary>
    public static readonly DriftVariable BaseExcess =
        new(ValueNames.StandardBaseExcessMmolL, "base excess", "mmol/L", WorseWhen.Either, InUnits(2.2), InUnits(2.2), CapillaryGases);

    /// <summary>The pulse oximeter's reading.</summary>
    public static readonly DriftVariable SpO2 =
        new("spO2Percent", "SpO2", "%", WorseWhen.Falling, InUnits(3), InUnits(4), "2.77 × the spread of repeated readings, between the median and the noisiest patients, J Clin Monit 1992;8:111; step: common practice");

    /// <summary>Mean airway pressure, measured where it agrees with the settings, else computed from them.</summary>
    public static readonly DriftVariable MeanAirwayPressure =
        new("meanAirwayPressureCmH2O", "mean airway pressure", "cmH2O", WorseWhen.Either, InUnits(2), InUnits(2), CommonPractice);

    /// <summary>Release volume per kg of predicted body weight.</summary>
    public static readonly DriftVariable ReleaseVolume =
        new(ValueNames.ReleaseVolumePerKg, "release volume", "mL/kg", WorseWhen.Either, Either(1, 0.15), Either(1, 0.15), CommonPractice);

    /// <summary>Effective compliance of the release.</summary>
    public static readonly DriftVariable EffectiveCompliance =
        new(ValueNames.EffectiveCompliance, "effective compliance", "mL/cmH2O", WorseWhen.Falling, OfShare(0.15), OfShare(0.20), CommonPractice);

    /// <summary>Expiratory time constant.</summary>
    public static readonly DriftVariable TimeConstant =
        new(ValueNames.ExpiratoryTimeConstantS, "expiratory time constant", "s", WorseWhen.Either, OfShare(0.20), OfShare(0.25), CommonPractice);

    /// <summary>End-release flow in per cent of peak.</summary>
    public static readonly DriftVariable EndReleaseFlow =
        new(ValueNames.EndReleaseFlowPercent, "end-release flow", "% of peak", WorseWhen.Either, InUnits(10), InUnits(10), CommonPractice);

    /// <summary>The patient's own share of minute ventilation.</summary>
    public static readonly DriftVariable OwnShare =
        new(ValueNames.SpontaneousSharePercent, "own share of minute ventilation", "%", WorseWhen.Either, InUnits(15), InUnits(20), CommonPractice);

    /// <summary>Ventilatory ratio.</summary>
    public static readonly DriftVariable VentilatoryRatio =
        new(ValueNames.VentilatoryRatio, "ventilatory ratio", "", WorseWhen.Rising, OfShare(0.20), OfShare(0.25), CommonPractice);
}
