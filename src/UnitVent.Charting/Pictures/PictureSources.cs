using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Windows;
using UnitVent.Physiology;

namespace UnitVent.Charting.Pictures;

/// <summary>What the values of one picture are computed from, resolved once.</summary>
internal sealed class PictureSources
{
    public PictureSources(ChartWindow window, Instant now)
    {
        Window = window;
        Now = now;
        Settings = InForce.Settings(window, now);
        Phase = InForce.Phase(window, now);
        Method = InForce.Method(window, now);
        Context = InForce.Context(window, now);
        Check = window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, now);
        Limits = new AgeLimits(window.Unit, Settings?.Body.Mode, Phase);
        SettingsConfirmedAt = Confirmed();
    }

    public ChartWindow Window { get; }

    public Instant Now { get; }

    public Charted<SettingChange>? Settings { get; }

    public Instant? SettingsConfirmedAt { get; }

    public CoursePhase Phase { get; }

    public SettingMethod Method { get; }

    public IReadOnlyList<Charted<ContextChange>> Context { get; }

    public Charted<VentilatorCheck>? Check { get; }

    public PairedGas? LatestArterial => field ??= Window.Latest<BloodGas>(EntryKind.BloodGas, Now, g => g.Specimen == Specimen.Arterial) is { } gas
        ? GasPairing.Pair(Window, gas)
        : null;

    public AgeLimits Limits { get; }

    public PatientFacts Patient => Window.Episode.Patient;

    public BodyMass? Weight => BodySize.Predicted(Patient);

    public BarometricPressure Barometric => BarometricPressure.FromAltitude(Window.Unit.AltitudeM);

    public VentilationMode? Mode => Settings?.Body.Mode;

    public bool Has(Circumstance flag) => Context.Any(c => c.Body.Flag == flag);

    /// <summary>The latest check that carries what a value needs; else the latest check, so that the value can say what it lacks.</summary>
    public Charted<VentilatorCheck>? CheckWith(Func<VentilatorCheck, bool> carries) =>
        Window.Latest(EntryKind.VentilatorCheck, Now, carries) ?? Check;

    /// <summary>A reading of a check.</summary>
    public Given FromCheck(Charted<VentilatorCheck>? check, string name, string label, string unit, Func<VentilatorCheck, decimal?> member) =>
        check is { } c && member(c.Body) is { } value
            ? new Given(name, label, unit, (double)value, c.At, c.Id).NoOlderThan(Limits.Readings, Now)
            : Given.Missing(name, label, unit);

    /// <summary>A setting in force at a check; the present one without a check.</summary>
    public Given SettingAt(Charted<VentilatorCheck>? check, string name, string label, string unit, Func<SettingChange, decimal?> member) =>
        Setting(check is { } c ? InForce.Settings(Window, c.At) : Settings, name, label, unit, member);

    /// <summary>A setting in force now, unusable when nobody confirmed it for too long.</summary>
    public Given SettingNow(string name, string label, string unit, Func<SettingChange, decimal?> member)
    {
        var given = Setting(Settings, name, label, unit, member);
        var stale = SettingsConfirmedAt is { } confirmed && Now - confirmed > Limits.Settings;
        return given.Unless(stale, ValueState.Stale, stale ? FormattableString.Invariant($"The settings were last confirmed {(Now - SettingsConfirmedAt!.Value).TotalHours:0} h ago; not calculated.") : "");
    }

    public Given PredictedWeight() => Weight is { } weight
        ? new Given(ValueNames.PredictedBodyWeightKg, "predicted body weight", "kg", weight.Kilograms, null, null)
        : Given.Missing(ValueNames.PredictedBodyWeightKg, Patient.HeightCm is null ? "height" : "sex", "kg");

    public static Given Setting(Charted<SettingChange>? settings, string name, string label, string unit, Func<SettingChange, decimal?> member) =>
        settings is { } s && member(s.Body) is { } value
            ? new Given(name, label, unit, (double)value, s.At, s.Id) { Holds = true }
            : Given.Missing(name, label, unit);

    private Instant? Confirmed()
    {
        var seen = Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, Now, c => c.SettingsConfirmed == true)?.At;
        return Settings is { } settings ? Instant.Max(settings.At, seen ?? Instant.MinValue) : null;
    }
}
