using UnitVent.Charting.Entries;
using UnitVent.Charting.Windows;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>What conventional modes allow: tidal volume per kg, static compliance, driving pressure, mechanical power: A2, A18, A30.</summary>
internal static class ConventionalValues
{
    private const string NotInAprv = "Not defined in APRV: no plateau is measured.";
    private const double ShortestHoldS = 0.5; // ARDS Network protocol: N Engl J Med 2000;342:1301

    public static IEnumerable<PictureValue> Of(PictureSources s)
    {
        yield return PerKilogram(s);
        var check = s.CheckWith(c => c is { PlateauPressureCmH2O: not null, TidalVolumeMl: not null });
        var plateau = s.FromCheck(check, "plateauPressureCmH2O", "plateau", "cmH2O", c => c.PlateauPressureCmH2O);
        var peep = s.SettingAt(check, "peepCmH2O", "PEEP", "cmH2O", x => x.PeepCmH2O);
        var auto = check is { } c && c.Body.AutoPeepCmH2O is not null ? new[] { s.FromCheck(check, "autoPeepCmH2O", "auto-PEEP", "cmH2O", x => x.AutoPeepCmH2O) } : [];
        var volume = s.FromCheck(check, "tidalVolumeMl", "tidal volume", "mL", x => x.TidalVolumeMl);
        var driving = Static(s, Equations.DrivingPressure, [plateau, peep, .. auto], check,
            v => StaticMechanics.DrivingPressure(Pressure(v[0]), Pressure(v[1] + v.ElementAtOrDefault(2))).CmH2O);
        yield return driving;
        yield return Static(s, Equations.StaticCompliance, [plateau, peep, volume, .. auto], check,
            v => StaticMechanics.StaticCompliance(GasVolume.FromMillilitres(v[2]), Pressure(v[0]), Pressure(v[1] + v.ElementAtOrDefault(3))).MlPerCmH2O);
        yield return Power(s, OxygenValues.AsInput(driving, "driving pressure"));
    }

    private static PictureValue PerKilogram(PictureSources s)
    {
        var volume = s.FromCheck(s.CheckWith(c => c.TidalVolumeMl is not null), "tidalVolumeMl", "tidal volume", "mL", c => c.TidalVolumeMl);
        return s.Mode == VentilationMode.Aprv
            ? Equations.TidalVolumePerKg.Without(ValueState.Mode, "Not defined in APRV: see the release volume.")
            : Equations.TidalVolumePerKg.Of([volume, s.PredictedWeight()], v => VolumePerKilogram.Compute(GasVolume.FromMillilitres(v[0]), BodyMass.FromKilograms(v[1])), doubt: _ => BodyValues.Doubt(s));
    }

    private static PictureValue Static(PictureSources s, Equation equation, Given[] inputs, Charted<VentilatorCheck>? check, Func<double[], double> compute) =>
        s.Mode == VentilationMode.Aprv
            ? equation.Without(ValueState.Mode, NotInAprv)
            : equation.Of(inputs, compute, v => v[0] <= v[1] ? "the plateau is not above PEEP." : null, _ => Doubt(s, check));

    private static string? Doubt(PictureSources s, Charted<VentilatorCheck>? check) =>
        s.Mode is VentilationMode.PressureSupport or VentilationMode.Cpap || check?.Body.Passive == false ? "outside validated range: the patient breathes actively."
        : (double?)check?.Body.HoldS < ShortestHoldS ? "outside validated range: the hold was shorter than 0.5 s."
        : null;

    private static PictureValue Power(PictureSources s, Given driving)
    {
        var check = s.CheckWith(c => c is { TidalVolumeMl: not null, PeakPressureCmH2O: not null });
        var rate = s.FromCheck(check, "totalRatePerMin", "total rate", "/min", c => c.TotalRatePerMin);
        var volume = s.FromCheck(check, "tidalVolumeMl", "tidal volume", "mL", c => c.TidalVolumeMl);
        var settings = check is { } c ? InForce.Settings(s.Window, c.At) : s.Settings;
        return s.Mode switch
        {
            VentilationMode.Aprv => Equations.PowerVolumeControlled.Without(ValueState.Mode, "No agreed way to compute mechanical power in APRV."),
            VentilationMode.VolumeControl => Equations.PowerVolumeControlled.Of(
                [rate, volume, s.FromCheck(check, "peakPressureCmH2O", "peak pressure", "cmH2O", x => x.PeakPressureCmH2O), driving],
                v => MechanicalPower.VolumeControlled(BreathRate.FromPerMinute(v[0]), GasVolume.FromMillilitres(v[1]), Pressure(v[2]), Pressure(v[3]))),
            VentilationMode.PressureControl => Equations.PowerPressureControlled.Of(
                [rate, volume, PictureSources.Setting(settings, "inspiratoryPressureAbovePeepCmH2O", "inspiratory pressure", "cmH2O", x => x.InspiratoryPressureAbovePeepCmH2O),
                 PictureSources.Setting(settings, "peepCmH2O", "PEEP", "cmH2O", x => x.PeepCmH2O)],
                v => MechanicalPower.PressureControlled(BreathRate.FromPerMinute(v[0]), GasVolume.FromMillilitres(v[1]), Pressure(v[2]), Pressure(v[3]))),
            null => Equations.PowerVolumeControlled.Without(ValueState.Missing, "Needs settings."),
            _ => Equations.PowerVolumeControlled.Without(ValueState.Mode, "Not defined in this mode."),
        };
    }

    private static AirwayPressure Pressure(double cmH2O) => AirwayPressure.FromCmH2O(cmH2O);
}
