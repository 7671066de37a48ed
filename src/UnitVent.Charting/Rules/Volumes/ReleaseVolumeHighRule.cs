using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Volumes;

/// <summary>R04: the release volume is high for the size of the lung.</summary>
public sealed class ReleaseVolumeHighRule : Rule
{
    private const double HalfImportantChangeMlPerKg = 0.5; // half of 1 mL/kg [common practice]

    /// <inheritdoc/>
    public override string Id => "R04";

    /// <inheritdoc/>
    public override Family Family => Family.VolumeAndPressure;

    /// <inheritdoc/>
    public override string Seen => "release volume high";

    /// <inheritdoc/>
    public override string Levels => "over 8 mL/kg advisory, over 10 mL/kg or a swing over 15 cmH2O caution, over 12 mL/kg urgent";

    /// <inheritdoc/>
    public override string Remarks => "Quiet with a leak; an estimated height or one release: one level lower.";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.ReleaseVolumePerKg].Value is not { } perKg
        || perKg <= picture.Window.Unit.Thresholds.ReleaseVolumeHigh.AdvisoryMlPerKg - HalfImportantChangeMlPerKg;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var volume = picture[ValueNames.ReleaseVolumePerKg];
        if (volume.Value is not { } perKg || volume.AsOf is not { } at)
        {
            return CannotTell(volume);
        }

        var check = picture.Window.Of<Charting.Entries.VentilatorCheck>(Charting.Entries.EntryKind.VentilatorCheck, picture.AsOf).Last(c => c.Body.ReleaseVolumeMl is not null);
        if (ReleaseChecks.NotValid(picture, check) is { } why)
        {
            return CannotTell(why);
        }

        var swing = picture[ValueNames.AlveolarSwingCmH2O].Value;
        if (Level(picture.Window.Unit.Thresholds.ReleaseVolumeHigh, perKg, swing) is not { } level)
        {
            return Clear(at);
        }

        var few = (check.Body.ReleasesAveraged ?? 1) < 2;
        var estimated = picture.Window.Episode.Patient.HeightEstimated == true;
        var says = $"release {Numbers.Fixed(perKg, 1)} mL/kg"
            + (swing is { } s ? $", alveolar swing {Numbers.Fixed(s)} cmH2O" : "")
            + (few ? "; one release" : "") + (estimated ? "; height estimated" : "");
        return Raise(
            level.LoweredIf(few).LoweredIf(estimated),
            says,
            "P high and P low, T low, height and sex for lung size, effort during the release",
            at,
            Evidence.Of(perKg, [check.Id], [("releaseVolumePerKg", perKg), .. swing is { } cmH2O ? new[] { ("alveolarSwingCmH2O", cmH2O) } : []]));
    }

    private static Severity? Level(ReleaseVolumeHighOptions options, double perKg, double? swing) =>
        perKg > options.UrgentMlPerKg ? Severity.Urgent
        : perKg > options.CautionMlPerKg || swing > options.CautionSwingCmH2O ? Severity.Caution
        : perKg > options.AdvisoryMlPerKg ? Severity.Advisory
        : null;
}
