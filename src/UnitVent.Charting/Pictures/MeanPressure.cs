using UnitVent.Charting.Entries;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>Mean airway pressure, computed from settings and measured.</summary>
internal static class MeanPressure
{
    /// <summary>Mean pressure from settings; volume control needs peak and plateau of a check as well.</summary>
    public static PictureValue Computed(Charted<SettingChange>? settings, Charted<VentilatorCheck>? check) => settings?.Body.Mode switch
    {
        VentilationMode.Aprv => Equations.MeanPressureAprv.Of(
            [Set(settings, "pHighCmH2O", "P high", "cmH2O", s => s.PHighCmH2O), Set(settings, "pLowCmH2O", "P low", "cmH2O", s => s.PLowCmH2O),
             Set(settings, "tHighS", "T high", "s", s => s.THighS), Set(settings, "tLowS", "T low", "s", s => s.TLowS)],
            v => MeanAirwayPressure.Aprv(Pressure(v[0]), Pressure(v[1]), Time(v[2]), Time(v[3])).CmH2O,
            v => v[1] >= v[0] ? "P low must be below P high." : null),
        VentilationMode.PressureControl => Equations.MeanPressureControlled.Of(
            [Set(settings, "peepCmH2O", "PEEP", "cmH2O", s => s.PeepCmH2O),
             Set(settings, "inspiratoryPressureAbovePeepCmH2O", "inspiratory pressure", "cmH2O", s => s.InspiratoryPressureAbovePeepCmH2O),
             Set(settings, "inspiratoryTimeS", "inspiratory time", "s", s => s.InspiratoryTimeS), Set(settings, "setRatePerMin", "set rate", "/min", s => s.SetRatePerMin),
             .. WhenRecorded(settings, "riseTimeS", "rise time", s => s.RiseTimeS)],
            v => MeanAirwayPressure.PressureControl(Pressure(v[0]), Pressure(v[1]), Time(v[2]), BreathRate.FromPerMinute(v[3]), Time(v.ElementAtOrDefault(4))).CmH2O),
        VentilationMode.VolumeControl => VolumeControl(settings, check),
        null => Equations.MeanPressureAprv.Without(ValueState.Missing, "Needs settings."),
        _ => Equations.MeanPressureControlled.Without(ValueState.Mode, "Not defined in this mode: mean pressure cannot be computed from its settings."),
    };

    /// <summary>Mean pressure as a check shows it.</summary>
    public static PictureValue Measured(Charted<VentilatorCheck>? check) => Formula.Measured(
        ValueNames.MeanAirwayPressureMeasured,
        check is { } c && c.Body.MeanAirwayPressureCmH2O is { } mean
            ? new Given("meanAirwayPressureCmH2O", "mean airway pressure", "cmH2O", (double)mean, c.At, c.Id)
            : Given.Missing("meanAirwayPressureCmH2O", "mean airway pressure", "cmH2O"));

    /// <summary>The measured value when there is one that agrees with the computed one or stands alone; else the computed one.</summary>
    public static PictureValue Best(PictureValue computed, PictureValue measured) =>
        measured.Value is { } m && (computed.Value is not { } c || Agree(m, c)) ? measured : computed;

    private static bool Agree(double measured, double computed) => computed > 0 && MeanPressureAgreement.IsWithinTolerance(Pressure(measured), Pressure(computed));

    private static PictureValue VolumeControl(Charted<SettingChange>? settings, Charted<VentilatorCheck>? check) => Equations.MeanPressureVolumeControlled.Of(
        [Read(check, "peakPressureCmH2O", "peak pressure", c => c.PeakPressureCmH2O), Read(check, "plateauPressureCmH2O", "plateau", c => c.PlateauPressureCmH2O),
         Set(settings, "peepCmH2O", "PEEP", "cmH2O", s => s.PeepCmH2O), Set(settings, "inspiratoryTimeS", "inspiratory time", "s", s => s.InspiratoryTimeS),
         Set(settings, "setRatePerMin", "set rate", "/min", s => s.SetRatePerMin), .. WhenRecorded(settings, "pauseTimeS", "pause", s => s.PauseTimeS)],
        v => MeanAirwayPressure.VolumeControl(
            Pressure(v[0]), Pressure(v[1]), Pressure(v[2]), Time(v[3] - v.ElementAtOrDefault(5)), Time(v.ElementAtOrDefault(5)), BreathRate.FromPerMinute(v[4])).CmH2O);

    private static Given[] WhenRecorded(Charted<SettingChange>? settings, string name, string label, Func<SettingChange, decimal?> member) =>
        settings is { } s && member(s.Body) is not null ? [Set(settings, name, label, "s", member)] : [];

    private static Given Set(Charted<SettingChange>? settings, string name, string label, string unit, Func<SettingChange, decimal?> member) =>
        PictureSources.Setting(settings, name, label, unit, member);

    private static Given Read(Charted<VentilatorCheck>? check, string name, string label, Func<VentilatorCheck, decimal?> member) =>
        check is { } c && member(c.Body) is { } value ? new(name, label, "cmH2O", (double)value, c.At, c.Id) : Given.Missing(name, label, "cmH2O");

    private static AirwayPressure Pressure(double cmH2O) => AirwayPressure.FromCmH2O(cmH2O);

    private static BreathTime Time(double seconds) => BreathTime.FromSeconds(seconds);
}
