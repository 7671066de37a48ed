using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Timelines;

namespace UnitVent.Charting.Trends;

/// <summary>What drifts in one patient, over the unit's window within the present epoch.</summary>
/// <param name="From">From when points count: the window's length ago, or when mode, position, relaxant, ECMO or a drain last changed.</param>
/// <param name="To">Until when.</param>
/// <param name="All">The verdict on every quantity of <see cref="DriftVariables"/>, in its order.</param>
/// <param name="SettingChanges">What settings changed in that time, oldest first.</param>
public sealed record PatientDrifts(Instant From, Instant To, IReadOnlyList<Drift> All, IReadOnlyList<TimelineMark> SettingChanges)
{
    private const double Alkalaemia = 7.45;

    /// <summary>Gets the verdict on a quantity.</summary>
    /// <param name="name">Its <see cref="DriftVariable.Name"/>.</param>
    /// <exception cref="InvalidOperationException">There is no such quantity.</exception>
    public Drift this[string name] => All.First(d => d.Variable.Name == name);

    /// <summary>What settings changed between the first and the last point of a verdict; none makes it a drift at the same settings.</summary>
    public IEnumerable<TimelineMark> SettingChangesDuring(Drift drift) =>
        drift.Count == 0 ? [] : SettingChanges.Where(c => c.At >= drift.Points[0].At && c.At < drift.Points[^1].At);

    internal static PatientDrifts Of(PatientPicture picture)
    {
        var (window, to) = (picture.Window, picture.AsOf);
        var series = picture.Series;
        var alkalaemic = (double?)picture.LatestGas?.Gas.Body.PH > Alkalaemia;
        return new(
            series.From,
            to,
            [.. Gases(series, alkalaemic), .. Checks(series)],
            [.. TimelineMarks.SettingChanges(window, series.From, to).Where(c => c.At > series.From)]);
    }

    private static IEnumerable<Drift> Gases(EpochSeries series, bool alkalaemic)
    {
        yield return Drift.Of(series.OfOxygen(ValueNames.PfRatio), DriftVariables.PfRatio);
        yield return Drift.Of(series.OfOxygen(ValueNames.OxygenationIndex), DriftVariables.OxygenationIndex);
        yield return Drift.Of(
            series.OfCarbonDioxide(g => GasPairing.Tension(g.Gas, "pCO2", "PaCO2", b => b.PCO2).Value),
            alkalaemic ? DriftVariables.PaCO2 with { Worse = WorseWhen.Falling } : DriftVariables.PaCO2);
        yield return Drift.Of(series.OfCarbonDioxide(g => (double?)g.Gas.Body.PH), DriftVariables.PH);
        yield return Drift.Of(series.OfCarbonDioxide(g => series.AtDraw(g, ValueNames.BicarbonateComputedMmolL)), DriftVariables.Bicarbonate);
        yield return Drift.Of(series.OfCarbonDioxide(g => series.AtDraw(g, ValueNames.StandardBaseExcessMmolL)), DriftVariables.BaseExcess);
        yield return Drift.Of(series.OfCarbonDioxide(g => series.WithCheck(g, ValueNames.VentilatoryRatio)), DriftVariables.VentilatoryRatio);
    }

    private static IEnumerable<Drift> Checks(EpochSeries series)
    {
        yield return Drift.Of(series.Saturation(), DriftVariables.SpO2);
        yield return Drift.Of(series.OfChecks(c => c.MeanPressure.Value), DriftVariables.MeanAirwayPressure);
        yield return Drift.Of(series.OfChecks(c => c[ValueNames.ReleaseVolumePerKg]?.Value), DriftVariables.ReleaseVolume);
        yield return Drift.Of(series.Mechanics(ValueNames.EffectiveCompliance), DriftVariables.EffectiveCompliance);
        yield return Drift.Of(series.Mechanics(ValueNames.ExpiratoryTimeConstantS), DriftVariables.TimeConstant);
        yield return Drift.Of(series.Mechanics(ValueNames.EndReleaseFlowPercent), DriftVariables.EndReleaseFlow);
        yield return Drift.Of(series.OfChecks(c => c[ValueNames.SpontaneousSharePercent]?.Value), DriftVariables.OwnShare);
    }
}
