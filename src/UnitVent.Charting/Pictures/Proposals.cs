using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Pictures;

/// <summary>What phase and method the chart looks like, when that is not what was chosen [common practice]. A person confirms or leaves it.</summary>
internal static class Proposals
{
    private const decimal OxygenForWeaning = 0.50m;
    private const decimal OxygenStepUp = 0.10m;
    private const decimal TwoLevelPLowCmH2O = 5;
    private const decimal TwoLevelTLowS = 1;
    private const double GuidedFromPercent = 68;
    private const double GuidedToPercent = 85;
    private const int ChecksThatShowIt = 3;

    private static readonly Duration Starting = Duration.FromHours(12);
    private static readonly Duration Lately = Duration.FromHours(24);

    /// <summary>The phase that the chart looks like; null when it is the one in force, or nothing speaks for another.</summary>
    public static Proposal<CoursePhase>? Phase(PatientPicture picture)
    {
        var changes = picture.Window.Of<SettingChange>(EntryKind.SettingChange, picture.AsOf).Where(s => s.At > picture.AsOf - Lately || s.Id == picture.Settings?.Id).ToList();
        var proposed = SteppedUp(changes) ?? SteppedDown(changes) ?? Settled(picture, changes);
        return proposed?.Value == picture.Phase ? null : proposed;
    }

    /// <summary>The method that the chart looks like; null when it is the one in force, or nothing speaks for another.</summary>
    public static Proposal<SettingMethod>? Method(PatientPicture picture)
    {
        if (picture.Settings?.Body is not { Mode: VentilationMode.Aprv } settings)
        {
            return null;
        }

        if (settings.PLowCmH2O >= TwoLevelPLowCmH2O && settings.TLowS >= TwoLevelTLowS)
        {
            return picture.Method == SettingMethod.TwoLevel ? null : new(SettingMethod.TwoLevel, $"P low {settings.PLowCmH2O} cmH2O with T low {settings.TLowS} s");
        }

        var lately = ReleaseChecks.WithFlows(picture).TakeLast(ChecksThatShowIt).Select(c => ReleaseChecks.EndFlowPercent(c.Body)!.Value).ToList();
        return picture.Method == SettingMethod.FixedRate && lately.Count == ChecksThatShowIt && lately.TrueForAll(p => p is >= GuidedFromPercent and <= GuidedToPercent)
            ? new(SettingMethod.FlowGuided, $"three checks running ended between {GuidedFromPercent} and {GuidedToPercent} % of peak")
            : null;
    }

    private static Proposal<CoursePhase>? SteppedUp(List<Charted<SettingChange>> changes) => changes.Count > 1 && Up(changes[^2].Body, changes[^1].Body) is { } what
        ? new(CoursePhase.SteppingUp, what)
        : null;

    private static string? Up(SettingChange before, SettingChange after) =>
        after.PHighCmH2O > before.PHighCmH2O ? $"P high {before.PHighCmH2O} → {after.PHighCmH2O} cmH2O"
        : after.FiO2 - before.FiO2 >= OxygenStepUp ? $"FiO2 {before.FiO2} → {after.FiO2}"
        : null;

    private static Proposal<CoursePhase>? SteppedDown(List<Charted<SettingChange>> changes)
    {
        var pressures = changes.Select(c => c.Body.PHighCmH2O).OfType<decimal>().ToList();
        var steps = pressures.Zip(pressures.Skip(1)).Count(p => p.Second < p.First);
        return steps >= 2 && changes[^1].Body.FiO2 <= OxygenForWeaning
            ? new(CoursePhase.Weaning, $"{steps} steps down to P high {pressures[^1]} cmH2O at FiO2 {changes[^1].Body.FiO2}")
            : null;
    }

    private static Proposal<CoursePhase>? Settled(PatientPicture picture, List<Charted<SettingChange>> changes)
    {
        if (picture.Phase != CoursePhase.Starting || changes.Count == 0)
        {
            return null;
        }

        var inMode = changes[^1].At;
        foreach (var change in picture.Window.Of<SettingChange>(EntryKind.SettingChange, picture.AsOf).Reverse().TakeWhile(c => c.Body.Mode == changes[^1].Body.Mode))
        {
            inMode = change.At;
        }

        var settled = picture.Gases.Count(g => g.Gas.At > inMode && !g.Unsettled);
        return picture.AsOf - inMode >= Starting ? new(CoursePhase.Maintaining, "12 h in this mode")
            : settled >= 2 ? new(CoursePhase.Maintaining, $"{settled} settled gases in this mode")
            : null;
    }
}
