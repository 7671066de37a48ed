using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.Volumes;

/// <summary>R42: the plateau pressure is high.</summary>
public sealed class PlateauHighRule : Rule
{
    private const decimal ShortestHoldS = 0.5m; // N Engl J Med 2000;342:1301
    private const decimal HalfImportantChangeCmH2O = 1; // half of 2 cmH2O [common practice]

    /// <inheritdoc/>
    public override string Id => "R42";

    /// <inheritdoc/>
    public override Family Family => Family.VolumeAndPressure;

    /// <inheritdoc/>
    public override string Seen => "plateau high";

    /// <inheritdoc/>
    public override string Levels => "over 30 cmH2O caution, over 35 cmH2O urgent";

    /// <inheritdoc/>
    public override string Remarks => "Quiet with effort during the hold, and with a hold under 0.5 s.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        Plateau(picture) is not { } seen || seen.Body.PlateauPressureCmH2O <= (decimal)picture.Window.Unit.Thresholds.PlateauHigh.CautionCmH2O - HalfImportantChangeCmH2O;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.Settings?.Body.Mode is not (VentilationMode.VolumeControl or VentilationMode.PressureControl) || Plateau(picture) is not { } seen)
        {
            return CannotTell("Needs a recent plateau in a controlled mode.");
        }

        if (seen.Body.Passive == false || seen.Body.HoldS < ShortestHoldS)
        {
            return CannotTell("Not valid: effort during the hold, or a hold under 0.5 s.");
        }

        var (options, plateau) = (picture.Window.Unit.Thresholds.PlateauHigh, (double)seen.Body.PlateauPressureCmH2O!.Value);
        return plateau <= options.CautionCmH2O ? Clear(seen.At) : Raise(
            plateau > options.UrgentCmH2O ? Severity.Urgent : Severity.Caution,
            $"plateau {seen.Body.PlateauPressureCmH2O} cmH2O",
            "tidal volume per kg, PEEP, chest wall and abdomen, one-lung tube, pneumothorax",
            seen.At,
            Evidence.Of(plateau, [seen.Id], ("plateauPressureCmH2O", plateau)));
    }

    private static Charted<VentilatorCheck>? Plateau(PatientPicture picture) =>
        picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.PlateauPressureCmH2O is not null) is { } seen
        && picture.AsOf - seen.At <= picture.Limits.Readings
            ? seen
            : null;
}
