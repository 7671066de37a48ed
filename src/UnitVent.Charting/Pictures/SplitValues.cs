using UnitVent.Charting.Entries;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>How minute ventilation splits between releases and the patient's own breaths: A10; and the rapid shallow index: A29.</summary>
internal static class SplitValues
{
    public static readonly IReadOnlySet<string> Names = new HashSet<string>
    {
        ValueNames.ReleaseMinuteVolumeLMin,
        ValueNames.SpontaneousMinuteVolumeDerivedLMin,
        ValueNames.SpontaneousMinuteVolumeLMin,
        ValueNames.SpontaneousSharePercent,
        ValueNames.RapidShallowIndex,
    };

    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        var check = s.CheckWith(c => c is { TotalMinuteVolumeLMin: not null, ReleaseVolumeMl: not null });
        var total = s.FromCheck(s.CheckWith(c => c.TotalMinuteVolumeLMin is not null), "totalMinuteVolumeLMin", "total minute volume", "L/min", c => c.TotalMinuteVolumeLMin);
        var release = Release(s, check);
        yield return release;
        var derived = Derived(s, total, OxygenValues.AsInput(release, "release minute volume"));
        yield return derived;
        var measured = s.FromCheck(
            s.CheckWith(c => c.SpontaneousMinuteVolumeLMin is not null), "spontaneousMinuteVolumeLMin", "own minute volume", "L/min", c => c.SpontaneousMinuteVolumeLMin);
        var own = measured.State == ValueState.Ok
            ? Formula.Measured(ValueNames.SpontaneousMinuteVolumeLMin, measured)
            : derived with { Name = ValueNames.SpontaneousMinuteVolumeLMin };
        yield return own;
        yield return Equations.OwnShare.Of(
            [OxygenValues.AsInput(own, "own minute volume"), total],
            v => MinuteVentilationSplit.Share(MinuteVentilation.FromLitresPerMinute(v[0]), MinuteVentilation.FromLitresPerMinute(v[1])),
            v => v[0] > v[1] ? "own minute volume exceeds the total." : null);
        yield return RapidShallow(s);
    }

    private static PictureValue Release(PictureSources s, Charted<VentilatorCheck>? check)
    {
        var measuredRate = s.FromCheck(check, "releaseRatePerMin", "release rate", "/min", c => c.ReleaseRatePerMin);
        Given[] rate = measuredRate.State == ValueState.Ok
            ? [measuredRate]
            : [s.SettingAt(check, "tHighS", "T high", "s", x => x.THighS), s.SettingAt(check, "tLowS", "T low", "s", x => x.TLowS)];
        return CycleValues.InAprv(
            s,
            rate.Length == 1 ? Equations.ReleaseMinuteVolume : Equations.ReleaseMinuteVolumeBySettings,
            [s.FromCheck(check, "releaseVolumeMl", "release volume", "mL", c => c.ReleaseVolumeMl), .. rate],
            v => MinuteVentilationSplit.Release(
                GasVolume.FromMillilitres(v[0]),
                v.Length == 2 ? BreathRate.FromPerMinute(v[1]) : ReleaseCycle.Rate(BreathTime.FromSeconds(v[1]), BreathTime.FromSeconds(v[2]))).LitresPerMinute);
    }

    private static PictureValue Derived(PictureSources s, Given total, Given release) => CycleValues.InAprv(
        s,
        Equations.OwnMinuteVolumeDerived,
        [total, release],
        v => MinuteVentilationSplit.DeriveSpontaneous(Flow(v[0]), Flow(v[1])).Spontaneous.LitresPerMinute,
        v => MinuteVentilationSplit.ReleaseExceedsTotal(Flow(v[0]), Flow(v[1])) ? "release volume times rate exceeds the total minute volume; one of the three is wrong." : null,
        v => MinuteVentilationSplit.DeriveSpontaneous(Flow(v[0]), Flow(v[1])).WithinMeasurementError ? "zero within measurement error." : null);

    private static PictureValue RapidShallow(PictureSources s)
    {
        var check = s.CheckWith(c => c is { SpontaneousRatePerMin: not null, SpontaneousTidalVolumeMl: not null });
        return Equations.RapidShallow.Of(
            [s.FromCheck(check, "spontaneousRatePerMin", "own rate", "/min", c => c.SpontaneousRatePerMin),
             s.FromCheck(check, "spontaneousTidalVolumeMl", "own tidal volume", "mL", c => c.SpontaneousTidalVolumeMl)],
            v => RapidShallowBreathing.Compute(BreathRate.FromPerMinute(v[0]), GasVolume.FromMillilitres(v[1])),
            v => v[0] <= 0 ? "there are no own breaths." : null,
            _ => s.Mode == VentilationMode.Aprv ? "outside validated range: at P high with the lung inflated it is not the published index." : null);
    }

    private static MinuteVentilation Flow(double litresPerMinute) => MinuteVentilation.FromLitresPerMinute(litresPerMinute);
}
