using UnitVent.Charting.Entries;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>What follows from the settings alone: A6, A7, A9; and mean pressure as measured.</summary>
internal static class CycleValues
{
    private const string OnlyAprv = "Not defined in this mode: only APRV has releases.";

    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        yield return Confirmed(s, MeanPressure.Computed(s.Settings, s.CheckWith(c => c is { PeakPressureCmH2O: not null, PlateauPressureCmH2O: not null })));
        yield return Measured(s);
        var tHigh = s.SettingNow("tHighS", "T high", "s", x => x.THighS);
        var tLow = s.SettingNow("tLowS", "T low", "s", x => x.TLowS);
        yield return InAprv(s, Equations.CycleTime, [tHigh, tLow], v => ReleaseCycle.CycleTime(Time(v[0]), Time(v[1])).Seconds);
        yield return InAprv(s, Equations.ReleaseRate, [tHigh, tLow], v => ReleaseCycle.Rate(Time(v[0]), Time(v[1])).PerMinute);
        yield return InAprv(s, Equations.TimeRatio, [tHigh, tLow], v => ReleaseCycle.Ratio(Time(v[0]), Time(v[1])));
        yield return InAprv(s, Equations.ShareAtPHigh, [tHigh, tLow], v => ReleaseCycle.ShareAtHighPercent(Time(v[0]), Time(v[1])));
        yield return Equations.MeanAlveolarPressure.Without(ValueState.Missing, "Needs inspiratory and expiratory resistance.");
    }

    /// <summary>A value that only APRV has; in another mode it says so.</summary>
    public static PictureValue InAprv(PictureSources s, Equation equation, Given[] inputs, Func<double[], double> compute, Func<double[], string?>? undefined = null, Func<double[], string?>? doubt = null) =>
        s.Mode is null or VentilationMode.Aprv ? equation.Of(inputs, compute, undefined, doubt) : equation.Without(ValueState.Mode, OnlyAprv);

    private static PictureValue Confirmed(PictureSources s, PictureValue mean)
    {
        var stale = mean.Value is not null && s.SettingsConfirmedAt is { } confirmed && s.Now - confirmed > s.Limits.Settings;
        return stale
            ? mean with { Value = null, State = ValueState.Stale, Because = FormattableString.Invariant($"The settings were last confirmed {(s.Now - s.SettingsConfirmedAt!.Value).TotalHours:0} h ago; not calculated.") }
            : mean;
    }

    private static PictureValue Measured(PictureSources s) => Formula.Measured(
        ValueNames.MeanAirwayPressureMeasured,
        s.FromCheck(s.CheckWith(c => c.MeanAirwayPressureCmH2O is not null), "meanAirwayPressureCmH2O", "mean airway pressure", "cmH2O", c => c.MeanAirwayPressureCmH2O));

    private static BreathTime Time(double seconds) => BreathTime.FromSeconds(seconds);
}
