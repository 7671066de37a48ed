using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.StepDown;

/// <summary>The steps by which P high was lowered.</summary>
internal static class StepsDown
{
    /// <summary>For so long a step is looked at [common practice].</summary>
    public static readonly Duration LookedAtFor = Duration.FromHours(12);

    /// <summary>The latest settings against those before; null without two of APRV.</summary>
    public static Step? Latest(PatientPicture picture) =>
        picture.Settings is { Body.Mode: VentilationMode.Aprv } now
        && picture.Window.Latest<SettingChange>(EntryKind.SettingChange, now.At - Duration.Epsilon) is { Body.Mode: VentilationMode.Aprv } before
            ? new(before, now)
            : null;

    /// <summary>When P high was lowered the time before: at these settings or earlier ones; null when it was not.</summary>
    public static Instant? Previous(PatientPicture picture, Charted<SettingChange> until)
    {
        var changes = picture.Window.Of<SettingChange>(EntryKind.SettingChange, until.At).ToList();
        var i = changes.FindLastIndex(c => changes.IndexOf(c) is > 0 and var at && c.Body.PHighCmH2O < changes[at - 1].Body.PHighCmH2O);
        return i < 0 ? null : changes[i].At;
    }

    /// <summary>When the latest step is no longer looked at.</summary>
    public static IEnumerable<Instant> Moments(PatientPicture picture) => Latest(picture) is { Down: > 0 } step ? [step.Now.At + LookedAtFor] : [];

    /// <summary>Two settings in a row.</summary>
    public readonly record struct Step(Charted<SettingChange> Before, Charted<SettingChange> Now)
    {
        public decimal Down => Before.Body.PHighCmH2O - Now.Body.PHighCmH2O ?? 0;

        public decimal Longer => Now.Body.THighS - Before.Body.THighS ?? 0;
    }
}
