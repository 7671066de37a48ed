using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>R58: SpO2 drifts down over the checks although neither FiO2 nor mean airway pressure was lowered.</summary>
public sealed class SaturationFallingRule : Rule
{
    private const double PressureFallCmH2O = 0.5; // what R54 looks at [common practice]
    private const double WorthALookPoints = 1.5; // half of what matters: J Clin Monit 1992;8:111

    /// <inheritdoc/>
    public override string Id => "R58";

    /// <inheritdoc/>
    public override Family Family => Family.Oxygen;

    /// <inheritdoc/>
    public override string Seen => "SpO2 falling over the checks with FiO2 not lowered";

    /// <inheritdoc/>
    public override string Levels => "drift by 3 points caution";

    /// <inheritdoc/>
    public override string Remarks => "Looks only at checks since FiO2 or mean pressure (by 0.5 cmH2O) was last lowered.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) => picture.Drifts["spO2Percent"].IsBackInside(open.Evidence["spO2Before"]);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var since = Since(picture);
        var checks = picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf).Where(c => c.At >= since && c.Body.SpO2Percent is not null).ToList();
        if (checks.Count == 0 || picture.AsOf - checks[^1].At > picture.Limits.Readings)
        {
            return CannotTell("Needs recent checks with SpO2.");
        }

        var highest = checks.Max(c => c.Body.SpO2Percent!.Value);
        if ((double)(highest - checks[^1].Body.SpO2Percent!.Value) < WorthALookPoints)
        {
            return Clear(checks[^1].At);
        }

        if (checks.Count < Drift.FewestPoints)
        {
            return CannotTell("Needs four checks with SpO2 under alike settings.");
        }

        var drift = Drift.Of(picture.Drifts["spO2Percent"].Points.Where(p => p.At >= since), DriftVariables.SpO2);
        return drift.Verdict == DriftVerdict.NotEnoughData ? CannotTell("Needs four settled checks over four hours.")
            : drift is { Verdict: DriftVerdict.Drifting, Course: DriftCourse.Worse } ? Falling(picture, drift)
            : Clear(checks[^1].At);
    }

    private RuleOutcome Falling(PatientPicture picture, Drift drift)
    {
        var last = drift.Points[^1];
        var fiO2 = (double?)InForce.Settings(picture.Window, last.At)?.Body.FiO2;
        return Raise(
            Severity.Caution,
            $"SpO2 {Numbers.Fixed(drift.StartMedian!.Value)} → {Numbers.Fixed(last.Value)} % over {drift.Count} checks in {Times.Hours(drift.Span)}" + (fiO2 is { } f ? $" at FiO2 {Numbers.Fixed(f, 2)}" : ""),
            "secretions, tube position, release end and volume, collapse, effusion, pneumothorax, position, perfusion of the probe",
            last.At,
            Evidence.Of(drift.StartMedian.Value - last.Value, [last.Entry, .. drift.Points.Select(p => p.Entry)], ("spO2Before", drift.StartMedian.Value), ("spO2After", last.Value)));
    }

    /// <summary>The start of the window, of the epoch, or of the settings that lowered FiO2 or mean pressure last.</summary>
    private static Instant Since(PatientPicture picture)
    {
        var (window, to) = (picture.Window, picture.AsOf);
        var since = Instant.Max(to - window.Unit.DriftWindow, InForce.EpochStart(window, to));
        var changes = window.Of<SettingChange>(EntryKind.SettingChange, to).ToList();
        for (var i = changes.Count - 1; i > 0 && changes[i].At > since; i--)
        {
            if (changes[i].Body.FiO2 < changes[i - 1].Body.FiO2 || Mean(changes[i - 1]) - Mean(changes[i]) >= PressureFallCmH2O)
            {
                return changes[i].At;
            }
        }

        return since;
    }

    private static double? Mean(Charted<SettingChange> settings) => MeanPressure.Computed(settings, null).Value;
}
