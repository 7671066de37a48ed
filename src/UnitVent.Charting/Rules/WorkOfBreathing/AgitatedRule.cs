using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.WorkOfBreathing;

/// <summary>R30b: the patient is agitated.</summary>
public sealed class AgitatedRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R30b";

    /// <inheritdoc/>
    public override Family Family => Family.Effort;

    /// <inheritdoc/>
    public override string Seen => "agitated";

    /// <inheritdoc/>
    public override string Levels => "RASS +2 or more caution";

    /// <inheritdoc/>
    public override string Remarks => "Says the own share of minute ventilation when it is known.";

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (BreathingReadings.Rass(picture) is not { } rass)
        {
            return CannotTell("Needs a recent RASS.");
        }

        var share = picture[ValueNames.SpontaneousSharePercent].Value;
        return rass.Value < picture.Window.Unit.Thresholds.Agitated.RassFrom
            ? Clear(rass.At)
            : Raise(
                Severity.Caution,
                $"RASS +{rass.Value}" + (share is { } percent ? $" at an own share of {Numbers.Fixed(percent)} %" : ""),
                "comfort, pain, delirium, effort, the tube and its fixation, PaCO2 and oxygen",
                rass.At,
                Evidence.Of(rass.Value, [rass.Entry], [("rass", rass.Value), .. share is { } s ? new[] { ("sharePercent", s) } : []]));
    }
}
