using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Slips;

/// <summary>R13: mean airway pressure as measured does not go with the settings in force.</summary>
public sealed class MeanPressuresDifferRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R13";

    /// <inheritdoc/>
    public override Family Family => Family.Entry;

    /// <inheritdoc/>
    public override string Seen => "measured and computed mean airway pressure differ";

    /// <inheritdoc/>
    public override string Levels => "more than 2 cmH2O and 10 % advisory, more than 20 % as well caution";

    /// <inheritdoc/>
    public override string Remarks => "Quiet when the check was read under other settings, and in pressure support and CPAP.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var (measured, computed) = (picture[ValueNames.MeanAirwayPressureMeasured], picture[ValueNames.MeanAirwayPressureComputed]);
        if (measured.Value is not { } seen || computed.Value is not { } expected || measured.AsOf is not { } at)
        {
            return CannotTell(measured.Value is null ? measured : computed);
        }

        if (picture.Settings is not { } settings || InForce.Settings(picture.Window, at)?.Id != settings.Id || settings.Body.Mode is VentilationMode.PressureSupport or VentilationMode.Cpap)
        {
            return CannotTell("The check was read under other settings, or the mode has no mean pressure of its own.");
        }

        var options = picture.Window.Unit.Thresholds.MeanPressuresDiffer;
        var (difference, share) = (Math.Abs(seen - expected), Math.Abs(seen - expected) / expected);
        return difference <= options.AdvisoryCmH2O || share <= options.AdvisoryShare ? Clear(at) : Raise(
            share > options.CautionShare ? Severity.Caution : Severity.Advisory,
            $"mean airway pressure measured {Numbers.Fixed(seen, 1)}, from the settings {Numbers.Fixed(expected, 1)} cmH2O",
            "the settings as charted, the reading, leak, effort, new settings that were never charted",
            at,
            Evidence.Of(share, [measured.Inputs[0].Entry, settings.Id], ("measuredCmH2O", seen), ("computedCmH2O", expected)));
    }
}
