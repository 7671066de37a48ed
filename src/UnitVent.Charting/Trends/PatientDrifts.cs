using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Timelines;

namespace UnitVent.Charting.Trends;

/// <summary>What drifts in one patient, over the unit's window within the present epoch. Each verdict is worked out when it is asked for.</summary>
public sealed class PatientDrifts
{
    private const double Alkalaemia = 7.45;

    private readonly PatientPicture picture;
    private readonly Dictionary<string, Lazy<Drift>> verdicts;

    internal PatientDrifts(PatientPicture picture)
    {
        this.picture = picture;
        verdicts = Quantities(picture.Series).ToDictionary(q => q.Variable.Name, q => new Lazy<Drift>(() => Drift.Of(q.Points(), q.Variable)));
    }

    /// <summary>Gets from when points count: the window's length ago, or when mode, position, relaxant, ECMO or a drain last changed.</summary>
    public Instant From => picture.Series.From;

    /// <summary>Gets until when.</summary>
    public Instant To => picture.AsOf;

    /// <summary>Gets the verdict on every quantity of <see cref="DriftVariables"/>, in its order.</summary>
    public IReadOnlyList<Drift> All => [.. verdicts.Values.Select(v => v.Value)];

    /// <summary>Gets what settings changed in that time, oldest first.</summary>
    public IReadOnlyList<TimelineMark> SettingChanges => field ??= [.. TimelineMarks.SettingChanges(picture.Window, From, To).Where(c => c.At > From)];

    /// <summary>Gets the verdict on a quantity.</summary>
    /// <param name="name">Its <see cref="DriftVariable.Name"/>.</param>
    /// <exception cref="KeyNotFoundException">There is no such quantity.</exception>
    public Drift this[string name] => verdicts[name].Value;

    /// <summary>What settings changed between the first and the last point of a verdict; none makes it a drift at the same settings.</summary>
    public IEnumerable<TimelineMark> SettingChangesDuring(Drift drift) =>
        drift.Count == 0 ? [] : SettingChanges.Where(c => c.At >= drift.Points[0].At && c.At < drift.Points[^1].At);

    private IEnumerable<(DriftVariable Variable, Func<IEnumerable<SeriesPoint>> Points)> Quantities(EpochSeries series)
    {
        var alkalaemic = (double?)picture.LatestGas?.Gas.Body.PH > Alkalaemia;
        yield return (DriftVariables.PfRatio, () => series.OfOxygen(ValueNames.PfRatio));
        yield return (DriftVariables.OxygenationIndex, () => series.OfOxygen(ValueNames.OxygenationIndex));
        yield return (
            alkalaemic ? DriftVariables.PaCO2 with { Worse = WorseWhen.Falling } : DriftVariables.PaCO2,
            () => series.OfCarbonDioxide(g => GasPairing.Tension(g.Gas, "pCO2", "PaCO2", b => b.PCO2).Value));
        yield return (DriftVariables.PH, () => series.OfCarbonDioxide(g => (double?)g.Gas.Body.PH));
        yield return (DriftVariables.Bicarbonate, () => series.OfCarbonDioxide(g => series.AtDraw(g, ValueNames.BicarbonateComputedMmolL)));
        yield return (DriftVariables.BaseExcess, () => series.OfCarbonDioxide(g => series.AtDraw(g, ValueNames.StandardBaseExcessMmolL)));
        yield return (DriftVariables.VentilatoryRatio, () => series.OfCarbonDioxide(g => series.WithCheck(g, ValueNames.VentilatoryRatio)));
        yield return (DriftVariables.SpO2, series.Saturation);
        yield return (DriftVariables.MeanAirwayPressure, () => series.OfChecks(c => c.MeanPressure.Value));
        yield return (DriftVariables.ReleaseVolume, () => series.OfChecks(c => c[ValueNames.ReleaseVolumePerKg]?.Value));
        yield return (DriftVariables.EffectiveCompliance, () => series.Mechanics(ValueNames.EffectiveCompliance));
        yield return (DriftVariables.TimeConstant, () => series.Mechanics(ValueNames.ExpiratoryTimeConstantS));
        yield return (DriftVariables.EndReleaseFlow, () => series.Mechanics(ValueNames.EndReleaseFlowPercent));
        yield return (DriftVariables.OwnShare, () => series.OfChecks(c => c[ValueNames.SpontaneousSharePercent]?.Value));
    }
}
