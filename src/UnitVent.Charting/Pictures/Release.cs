using UnitVent.Charting.Entries;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>The release that one check read, with the settings in force at that check, and what a one-compartment lung makes of it.</summary>
internal sealed class Release
{
    private readonly PictureSources s;
    private readonly Charted<VentilatorCheck>? check;
    private readonly Given high;
    private readonly Given low;
    private readonly Given tHigh;
    private readonly Given tLow;
    private readonly PictureValue endFlow;
    private readonly PictureValue timeConstant;
    private readonly Given tau;
    private readonly bool refillsIncompletely;

    public Release(PictureSources sources, Charted<VentilatorCheck>? check)
    {
        (s, this.check) = (sources, check);
        high = s.SettingAt(check, "pHighCmH2O", "P high", "cmH2O", x => x.PHighCmH2O);
        low = s.SettingAt(check, "pLowCmH2O", "P low", "cmH2O", x => x.PLowCmH2O);
        tHigh = s.SettingAt(check, "tHighS", "T high", "s", x => x.THighS);
        tLow = s.SettingAt(check, "tLowS", "T low", "s", x => x.TLowS);
        endFlow = EndFlow();
        timeConstant = TimeConstant();
        tau = OxygenValues.AsInput(timeConstant, "time constant");
        refillsIncompletely = tau.Value is { } seconds && tHigh.Value is { } time && IncompleteRefilling.Needed(Time(time), Time(seconds));
    }

    /// <summary>What flow and settings tell.</summary>
    public IEnumerable<PictureValue> Flow =>
    [
        endFlow,
        InAprv(Equations.Emptied, [EndFlowShare], v => ReleaseMechanics.EmptiedPercent(v[0] / 100)),
        EndPressure(),
        Swing(),
        timeConstant,
        TLowFor(Equations.TLowFor75, 0.75),
        TLowFor(Equations.TLowFor50, 0.50),
        TLowFor(Equations.TLowFor25, 0.25),
    ];

    /// <summary>What the released volume tells as well.</summary>
    public IEnumerable<PictureValue> Lung
    {
        get
        {
            var volume = s.FromCheck(check, "releaseVolumeMl", "release volume", "mL", c => c.ReleaseVolumeMl);
            var compliance = InAprv(Equations.EffectiveCompliance, [volume, OxygenValues.AsInput(Swing(), "alveolar swing")],
                v => Compliance.FromMlPerCmH2O(v[0] / v[1]).MlPerCmH2O);
            yield return compliance;
            yield return InAprv(Equations.EffectiveResistance, [tau, OxygenValues.AsInput(compliance, "compliance")],
                v => ReleaseMechanics.EffectiveResistance(Time(v[0]), Compliance.FromMlPerCmH2O(v[1])).CmH2OSecondsPerLitre);
            yield return InAprv(Equations.PeakFlowModel, [volume, tau, EndFlowShare],
                v => ReleaseMechanics.ModelPeakFlow(GasVolume.FromMillilitres(v[0]), Time(v[1]), v[2] / 100).LitresPerMinute);
        }
    }

    private Given EndFlowShare => OxygenValues.AsInput(endFlow, "end-release flow");

    private PictureValue EndFlow()
    {
        var unreadable = check?.Body.CurveNotReadable == true;
        var peak = s.FromCheck(check, "peakExpiratoryFlowLMin", "peak expiratory flow", "L/min", c => c.PeakExpiratoryFlowLMin);
        var end = s.FromCheck(check, "endReleaseFlowLMin", "end-release flow", "L/min", c => c.EndReleaseFlowLMin);
        return InAprv(
            Equations.EndReleaseFlow,
            [unreadable ? peak with { State = ValueState.Missing, Because = "The flow curve was not readable." } : peak, end],
            v => 100 * ReleaseTermination.Ratio(GasFlow.FromLitresPerMinute(v[0]), GasFlow.FromLitresPerMinute(v[1])),
            v => v[1] >= v[0] ? "end flow is not below the peak; the peak may be from another breath." : null,
            _ => Doubt());
    }

    private string? Doubt() =>
        check?.Body.EffortDuringRelease == true ? "outside validated range: effort during the release."
        : s.Has(Circumstance.AirLeak) ? "outside validated range: air leak."
        : s.Has(Circumstance.Obstructive) ? "outside validated range: obstructive lung."
        : null;

    private PictureValue TimeConstant() => InAprv(
        Equations.TimeConstant,
        [tLow, EndFlowShare],
        v => ExpiratoryTimeConstant.Compute(Time(v[0]), v[1] / 100).Seconds,
        v => v[1] <= 0 ? "flow reached zero before the release ended." : null,
        v => ExpiratoryTimeConstant.IsReliable(v[1] / 100) ? null : "outside validated range: the end-release flow lies outside 2–95 % of peak.");

    private PictureValue TLowFor(Equation equation, double ratio) => InAprv(equation, [tau], v => ExpiratoryTimeConstant.TimeLowFor(Time(v[0]), ratio).Seconds);

    private PictureValue EndPressure() => refillsIncompletely
        ? InAprv(Equations.EndReleasePressureRefilling, [high, low, tHigh, tLow, tau],
            v => v[1] + IncompleteRefilling.TrappedPressure(Pressure(v[0]), Pressure(v[1]), Time(v[2]), Time(v[3]), Time(v[4]), Time(v[4])).CmH2O)
        : InAprv(Equations.EndReleasePressure, [high, low, EndFlowShare],
            v => ReleaseMechanics.EndReleaseAlveolarPressure(Pressure(v[0]), Pressure(v[1]), v[2] / 100).CmH2O);

    // The swing is the volume of a lung of 1 mL/cmH2O.
    private PictureValue Swing() => refillsIncompletely
        ? InAprv(Equations.AlveolarSwingRefilling, [high, low, tHigh, tLow, tau],
            v => IncompleteRefilling.ReleaseVolume(Compliance.FromMlPerCmH2O(1), Pressure(v[0]), Pressure(v[1]), Time(v[2]), Time(v[3]), Time(v[4]), Time(v[4])).Millilitres)
        : InAprv(Equations.AlveolarSwing, [high, low, EndFlowShare],
            v => ReleaseMechanics.AlveolarSwing(Pressure(v[0]), Pressure(v[1]), v[2] / 100).CmH2O);

    private PictureValue InAprv(Equation equation, Given[] inputs, Func<double[], double> compute, Func<double[], string?>? undefined = null, Func<double[], string?>? doubt = null) =>
        CycleValues.InAprv(s, equation, inputs, compute, undefined, doubt);

    private static AirwayPressure Pressure(double cmH2O) => AirwayPressure.FromCmH2O(cmH2O);

    private static BreathTime Time(double seconds) => BreathTime.FromSeconds(seconds);
}
