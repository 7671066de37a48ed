using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Volumes;

/// <summary>R06: P high lies above its limit.</summary>
public sealed class PHighRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R06";

    /// <inheritdoc/>
    public override Family Family => Family.VolumeAndPressure;

    /// <inheritdoc/>
    public override string Seen => "P high above its limit";

    /// <inheritdoc/>
    public override string Levels => "over 30 cmH2O advisory, over 35 cmH2O caution";

    /// <inheritdoc/>
    public override string Remarks => "Stiff chest wall + 5 cmH2O; a limit of the patient replaces the advisory one, the caution one lies as far above it as the unit’s.";

    /// <inheritdoc/>
    public override bool SaidOnce => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.Settings is not { Body: { Mode: VentilationMode.Aprv, PHighCmH2O: { } high } } settings)
        {
            return CannotTell("Needs settings of APRV.");
        }

        var options = picture.Window.Unit.Thresholds.PHigh;
        var allowance = picture.Has(Circumstance.ChestWallStiff) ? options.StiffChestWallCmH2O : 0;
        var limit = (double?)picture.Targets?.Body.PHighLimitCmH2O ?? options.AdvisoryCmH2O + allowance;
        return (double)high <= limit ? Clear(settings.At) : Raise(
            (double)high > limit + options.CautionCmH2O - options.AdvisoryCmH2O ? Severity.Caution : Severity.Advisory,
            $"P high {high} cmH2O, limit {Numbers.Plain(limit)}",
            "release volume and swing, mean pressure, blood pressure, chest wall and abdomen",
            settings.At,
            Evidence.Of((double)high, [settings.Id], ("pHighCmH2O", (double)high), ("limitCmH2O", limit)));
    }
}
