using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Timing;

/// <summary>R08: little of the cycle is spent at P high.</summary>
public sealed class ShareAtPHighRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R08";

    /// <inheritdoc/>
    public override Family Family => Family.Timing;

    /// <inheritdoc/>
    public override string Seen => "share of the cycle at P high low";

    /// <inheritdoc/>
    public override string Levels => "under 80 % advisory, under 70 % caution";

    /// <inheritdoc/>
    public override string Remarks => "Quiet when flow-guided and with two levels.";

    /// <inheritdoc/>
    public override bool SaidOnce => true;

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var share = picture[ValueNames.ShareAtPHighPercent];
        if (SettingsHeld.Aprv(picture) is not { } settings || share.Value is not { } percent || picture.Method != SettingMethod.FixedRate)
        {
            return CannotTell(share.Because ?? "Judged at a fixed rate only.");
        }

        var options = picture.Window.Unit.Thresholds.ShareAtPHigh;
        return percent >= options.AdvisoryUnderPercent
            ? Clear(settings.At)
            : Raise(
                percent < options.CautionUnderPercent ? Severity.Caution : Severity.Advisory,
                $"{Numbers.Fixed(percent)} % of the cycle at P high, edge {Numbers.Fixed(options.AdvisoryUnderPercent)} %",
                "T high and T low, mean pressure, end-release flow",
                settings.At,
                Evidence.Of(-percent, [settings.Id], ("sharePercent", percent)));
    }
}
