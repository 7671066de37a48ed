using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Volumes;

/// <summary>R41: the tidal volume is high for the size of the lung.</summary>
public sealed class TidalVolumeHighRule : Rule
{
    private const double HalfImportantChangeMlPerKg = 0.5; // half of 1 mL/kg [common practice]

    /// <inheritdoc/>
    public override string Id => "R41";

    /// <inheritdoc/>
    public override Family Family => Family.VolumeAndPressure;

    /// <inheritdoc/>
    public override string Seen => "tidal volume high";

    /// <inheritdoc/>
    public override string Levels => "over 8 mL/kg caution, over 10 mL/kg urgent, ARDS over 6.5 mL/kg advisory; pressure support: advisory";

    /// <inheritdoc/>
    public override string Remarks => "Volume control, pressure control, pressure support; quiet with a leak.";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.TidalVolumePerKg].Value is not { } perKg
        || perKg <= Edge(picture) - HalfImportantChangeMlPerKg;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var volume = picture[ValueNames.TidalVolumePerKg];
        if (picture.Settings?.Body.Mode is not (VentilationMode.VolumeControl or VentilationMode.PressureControl or VentilationMode.PressureSupport))
        {
            return CannotTell("Not judged in this mode.");
        }

        if (volume is not { Value: { } perKg, AsOf: { } at })
        {
            return CannotTell(volume);
        }

        var check = picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.TidalVolumeMl is not null)!.Value;
        return check.Body.LeakPercent > ReleaseChecks.LeakThatInvalidatesPercent || picture.Has(Circumstance.AirLeak) ? CannotTell("Not valid with a leak.")
            : Level(picture, perKg) is not { } level ? Clear(at)
            : Raise(
                level,
                $"tidal volume {Numbers.Fixed(perKg, 1)} mL/kg",
                "height and sex for lung size, plateau and driving pressure, effort, double triggering",
                at,
                Evidence.Of(perKg, [check.Id], ("tidalVolumePerKg", perKg)));
    }

    private static Severity? Level(PatientPicture picture, double perKg)
    {
        var options = picture.Window.Unit.Thresholds.TidalVolumeHigh;
        var supported = picture.Settings!.Value.Body.Mode == VentilationMode.PressureSupport;
        return perKg > options.UrgentMlPerKg && !supported ? Severity.Urgent
            : perKg > options.CautionMlPerKg && !supported ? Severity.Caution
            : perKg > Edge(picture) ? Severity.Advisory
            : null;
    }

    private static double Edge(PatientPicture picture) => picture.Has(Circumstance.Ards) && picture.Settings?.Body.Mode != VentilationMode.PressureSupport
        ? picture.Window.Unit.Thresholds.TidalVolumeHigh.ArdsAdvisoryMlPerKg
        : picture.Window.Unit.Thresholds.TidalVolumeHigh.CautionMlPerKg;
}
