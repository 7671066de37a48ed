using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.Volumes;

/// <summary>R44: auto-PEEP was measured and is high.</summary>
public sealed class TrappedPressureRule : Rule
{
    private const decimal HalfImportantChangeCmH2O = 1; // half of 2 cmH2O [common practice]

    /// <inheritdoc/>
    public override string Id => "R44";

    /// <inheritdoc/>
    public override Family Family => Family.VolumeAndPressure;

    /// <inheritdoc/>
    public override string Seen => "trapped pressure measured";

    /// <inheritdoc/>
    public override string Levels => "over 5 cmH2O advisory, over 10 cmH2O caution";

    /// <inheritdoc/>
    public override string Remarks => "Volume control and pressure control.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        AutoPeep(picture) is not { } seen || seen.Body.AutoPeepCmH2O <= (decimal)picture.Window.Unit.Thresholds.TrappedPressure.AdvisoryCmH2O - HalfImportantChangeCmH2O;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.Settings?.Body.Mode is not (VentilationMode.VolumeControl or VentilationMode.PressureControl) || AutoPeep(picture) is not { } seen)
        {
            return CannotTell("Needs a recent auto-PEEP in a controlled mode.");
        }

        var (options, trapped) = (picture.Window.Unit.Thresholds.TrappedPressure, (double)seen.Body.AutoPeepCmH2O!.Value);
        return trapped <= options.AdvisoryCmH2O ? Clear(seen.At) : Raise(
            trapped > options.CautionCmH2O ? Severity.Caution : Severity.Advisory,
            $"auto-PEEP {seen.Body.AutoPeepCmH2O} cmH2O",
            "expiratory time and flow, rate, bronchospasm, secretions, kink, blood pressure",
            seen.At,
            Evidence.Of(trapped, [seen.Id], ("autoPeepCmH2O", trapped)));
    }

    private static Charted<VentilatorCheck>? AutoPeep(PatientPicture picture) =>
        picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.AutoPeepCmH2O is not null) is { } seen
        && picture.AsOf - seen.At <= picture.Limits.Readings
            ? seen
            : null;
}
