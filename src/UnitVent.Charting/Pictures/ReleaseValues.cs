using UnitVent.Charting.Entries;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>What the expiratory flow of a release tells: A2, A11–A15. Estimates of a one-compartment lung.</summary>
internal static class ReleaseValues
{
    private const string NeedsEffortFree = "outside validated range: effort during the release.";
    private const string NeedsTightness = "outside validated range: air leak.";
    private const string NeedsOpenAirways = "outside validated range: obstructive lung.";

    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        var check = s.CheckWith(c => c is { PeakExpiratoryFlowLMin: not null, EndReleaseFlowLMin: not null });
        var ratio = Termination(s, check);
        yield return ratio;
        var r = OxygenValues.AsInput(ratio, "end-release flow");
        var high = s.SettingAt(check, "pHighCmH2O", "P high", "cmH2O", x => x.PHighCmH2O);
        var low = s.SettingAt(check, "pLowCmH2O", "P low", "cmH2O", x => x.PLowCmH2O);
        foreach (var value in Pressures(s, r, high, low).Concat(Times(s, check, r)).Concat(Lung(s, r, high, low)))
        {
            yield return value;
        }

        yield return PerKilogram(s);
    }

    private static PictureValue Termination(PictureSources s, Charted<VentilatorCheck>? check)
    {
        var unreadable = check?.Body.CurveNotReadable == true;
        var peak = s.FromCheck(check, "peakExpiratoryFlowLMin", "peak expiratory flow", "L/min", c => c.PeakExpiratoryFlowLMin);
        var end = s.FromCheck(check, "endReleaseFlowLMin", "end-release flow", "L/min", c => c.EndReleaseFlowLMin);
        return CycleValues.InAprv(
            s,
            new(ValueNames.EndReleaseFlowPercent, "%", "A11"),
            [unreadable ? peak with { State = ValueState.Missing, Because = "The flow curve was not readable." } : peak, end],
            v => 100 * ReleaseTermination.Ratio(GasFlow.FromLitresPerMinute(v[0]), GasFlow.FromLitresPerMinute(v[1])),
            v => v[1] >= v[0] ? "end flow is not below the peak; the peak may be from another breath." : null,
            _ => Doubt(s, check));
    }

    private static string? Doubt(PictureSources s, Charted<VentilatorCheck>? check) =>
        check?.Body.EffortDuringRelease == true ? NeedsEffortFree
        : s.Has(Circumstance.AirLeak) ? NeedsTightness
        : s.Has(Circumstance.Obstructive) ? NeedsOpenAirways
        : null;

    private static IEnumerable<PictureValue> Pressures(PictureSources s, Given r, Given high, Given low)
    {
        yield return CycleValues.InAprv(s, Estimate(ValueNames.EndReleaseAlveolarPressureCmH2O, "cmH2O", "A13"), [high, low, r],
            v => ReleaseMechanics.EndReleaseAlveolarPressure(Pressure(v[0]), Pressure(v[1]), v[2] / 100).CmH2O);
        yield return CycleValues.InAprv(s, Estimate(ValueNames.EmptiedPercent, "%", "A13"), [r], v => ReleaseMechanics.EmptiedPercent(v[0] / 100));
        yield return CycleValues.InAprv(s, Estimate(ValueNames.AlveolarSwingCmH2O, "cmH2O", "A13"), [high, low, r],
            v => ReleaseMechanics.AlveolarSwing(Pressure(v[0]), Pressure(v[1]), v[2] / 100).CmH2O);
    }

    private static IEnumerable<PictureValue> Times(PictureSources s, Charted<VentilatorCheck>? check, Given r)
    {
        var tau = TimeConstant(s, s.SettingAt(check, "tLowS", "T low", "s", x => x.TLowS), r);
        yield return tau;
        foreach (var (name, target) in new[] { (ValueNames.TLowFor75S, 0.75), (ValueNames.TLowFor50S, 0.50), (ValueNames.TLowFor25S, 0.25) })
        {
            yield return CycleValues.InAprv(s, Estimate(name, "s", "A12"), [OxygenValues.AsInput(tau, "time constant")],
                v => ExpiratoryTimeConstant.TimeLowFor(Time(v[0]), target).Seconds);
        }
    }

    private static IEnumerable<PictureValue> Lung(PictureSources s, Given r, Given high, Given low)
    {
        var whole = s.CheckWith(c => c is { PeakExpiratoryFlowLMin: not null, EndReleaseFlowLMin: not null, ReleaseVolumeMl: not null });
        var volume = s.FromCheck(whole, "releaseVolumeMl", "release volume", "mL", c => c.ReleaseVolumeMl);
        var tau = TimeConstant(s, s.SettingAt(whole, "tLowS", "T low", "s", x => x.TLowS), r);
        var tauIn = OxygenValues.AsInput(tau, "time constant");
        var compliance = CycleValues.InAprv(s, Estimate(ValueNames.EffectiveCompliance, "mL/cmH2O", "A13"), [volume, high, low, r, tauIn],
            v => ReleaseMechanics.EffectiveCompliance(GasVolume.FromMillilitres(v[0]), Pressure(v[1]), Pressure(v[2]), v[3] / 100).MlPerCmH2O);
        yield return compliance;
        yield return CycleValues.InAprv(s, Estimate(ValueNames.EffectiveResistance, "cmH2O·s/L", "A13"), [tauIn, OxygenValues.AsInput(compliance, "compliance")],
            v => ReleaseMechanics.EffectiveResistance(Time(v[0]), Compliance.FromMlPerCmH2O(v[1])).CmH2OSecondsPerLitre);
        yield return CycleValues.InAprv(s, Estimate(ValueNames.PeakFlowModelLMin, "L/min", "A13"), [volume, tauIn, r],
            v => ReleaseMechanics.ModelPeakFlow(GasVolume.FromMillilitres(v[0]), Time(v[1]), v[2] / 100).LitresPerMinute);
    }

    private static PictureValue TimeConstant(PictureSources s, Given tLow, Given r) => CycleValues.InAprv(
        s,
        Estimate(ValueNames.ExpiratoryTimeConstantS, "s", "A12"),
        [tLow, r],
        v => ExpiratoryTimeConstant.Compute(Time(v[0]), v[1] / 100).Seconds,
        v => v[1] <= 0 ? "flow reached zero before the release ended." : null,
        v => !ExpiratoryTimeConstant.IsReliable(v[1] / 100) ? "outside validated range: the end-release flow lies outside 2–95 % of peak."
            : RefillsIncompletely(s, v) ? "outside validated range: T high is shorter than four time constants, so the lung does not refill."
            : null);

    private static bool RefillsIncompletely(PictureSources s, double[] v) =>
        s.Settings?.Body.THighS is { } tHigh && IncompleteRefilling.Needed(Time((double)tHigh), ExpiratoryTimeConstant.Compute(Time(v[0]), v[1] / 100));

    private static PictureValue PerKilogram(PictureSources s)
    {
        var volume = s.FromCheck(s.CheckWith(c => c.ReleaseVolumeMl is not null), "releaseVolumeMl", "release volume", "mL", c => c.ReleaseVolumeMl);
        return CycleValues.InAprv(s, new(ValueNames.ReleaseVolumePerKg, "mL/kg", "A2"), [volume, s.PredictedWeight()],
            v => VolumePerKilogram.Compute(GasVolume.FromMillilitres(v[0]), BodyMass.FromKilograms(v[1])),
            doubt: _ => BodyValues.Doubt(s));
    }

    private static Formula Estimate(string name, string unit, string equation) => new(name, unit, equation, ValueKind.Estimated);

    private static AirwayPressure Pressure(double cmH2O) => AirwayPressure.FromCmH2O(cmH2O);

    private static BreathTime Time(double seconds) => BreathTime.FromSeconds(seconds);
}
