using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Due;

/// <summary>R33: no plateau was measured for hours in a controlled mode.</summary>
public sealed class PlateauDueRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R33";

    /// <inheritdoc/>
    public override Family Family => Family.Due;

    /// <inheritdoc/>
    public override string Seen => "plateau not measured";

    /// <inheritdoc/>
    public override string Levels => "12 h, due list only (information)";

    /// <inheritdoc/>
    public override string Remarks => "Volume control and pressure control.";

    /// <inheritdoc/>
    public override bool QuietOffUnit => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override IEnumerable<Instant> Moments(PatientPicture picture) => DueAt(picture) is { } due ? [due] : [];

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (DueAt(picture) is not { } due)
        {
            return CannotTell("Not judged in this mode.");
        }

        return picture.AsOf <= due ? Clear(picture.AsOf) : Raise(
            Severity.Information,
            $"plateau was due {Times.Clock(due, picture)}",
            "plateau with a passive hold of half a second or longer",
            due,
            Evidence.Of(0, [], ("hoursOverdue", (picture.AsOf - due).TotalHours)));
    }

    private static Instant? DueAt(PatientPicture picture)
    {
        if (picture.Settings is not { Body.Mode: VentilationMode.VolumeControl or VentilationMode.PressureControl } settings)
        {
            return null;
        }

        var last = picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.PlateauPressureCmH2O is not null)?.At;
        return (last ?? Instant.Max(settings.At, picture.Window.Episode.AdmittedAt)) + Duration.FromHours(picture.Window.Unit.Thresholds.PlateauDue.Hours);
    }
}
