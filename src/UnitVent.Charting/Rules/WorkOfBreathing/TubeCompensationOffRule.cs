using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>R29: the patient breathes while the resistance of the tube is not made up for.</summary>
public sealed class TubeCompensationOffRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R29";

    /// <inheritdoc/>
    public override Family Family => Family.Effort;

    /// <inheritdoc/>
    public override string Seen => "tube compensation off while breathing";

    /// <inheritdoc/>
    public override string Levels => "own share from 10 % or own rate from 8/min advisory";

    /// <inheritdoc/>
    public override string Remarks => "Quiet where the ventilator does not offer it and where nobody looked.";

    /// <inheritdoc/>
    public override bool SaidOnce => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (picture.Settings is not { Body.TubeCompensation: TubeCompensation.On or TubeCompensation.Off } settings
            || picture.AsOf - picture.SettingsConfirmedAt > picture.Limits.Settings)
        {
            return CannotTell("Not known whether the tube is compensated.");
        }

        var options = picture.Window.Unit.Thresholds.TubeCompensationOff;
        var (share, rate) = (picture[ValueNames.SpontaneousSharePercent], BreathingReadings.OwnRate(picture));
        if (settings.Body.TubeCompensation == TubeCompensation.On)
        {
            return Clear(settings.At);
        }

        var byShare = share.Value >= options.ShareFromPercent;
        if (!byShare && !(rate?.Value >= options.RateFromPerMin))
        {
            return share.Value is null && rate is null ? CannotTell("Needs a recent own share or own rate.") : Clear(share.AsOf ?? rate!.Value.At);
        }

        return Raise(
            Severity.Advisory,
            byShare ? $"own share {Numbers.Fixed(share.Value!.Value)} % with tube compensation off" : $"{Numbers.Fixed(rate!.Value.Value)} own breaths/min with tube compensation off",
            "tube size and resistance, effort, the ventilator’s tube compensation",
            settings.At,
            Evidence.Of(1, [settings.Id], [.. share.Value is { } percent ? new[] { ("sharePercent", percent) } : [], .. rate is { } r ? new[] { ("ratePerMin", r.Value) } : []]));
    }
}
