using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Rules.Timing;

/// <summary>Where the release is meant to end.</summary>
internal static class EndFlowTarget
{
    /// <summary>End-release flow aimed at in % of peak: the patient's own, else the method's.</summary>
    public static double Percent(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.ReleasedLong;
        return (double?)picture.Targets?.Body.EndReleaseFlowPercent
            ?? (picture.Method == SettingMethod.FixedRate ? options.FixedRateTarget : options.FlowGuidedTarget);
    }
}
