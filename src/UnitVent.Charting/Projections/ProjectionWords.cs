using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules.Timing;
using UnitVent.Charting.Wording;
using UnitVent.Physiology;

namespace UnitVent.Charting.Projections;

/// <summary>The sentences of a projection.</summary>
internal static class ProjectionWords
{
    private const double SmallestClaimMmHg = 5;
    private const double HighestReadable = 90; // above it the projection itself refuses

    public static string Of(ProjectionRefusal refusal) => refusal switch
    {
        ProjectionRefusal.TerminationRatio => "The end-release flow lies outside 5–90 % of peak, where a small error of flow is a large one of the time constant.",
        ProjectionRefusal.Compliance => "Release volume and pressures do not describe a lung: compliance outside 5–150 mL/cmH2O.",
        ProjectionRefusal.OwnRate => "Needs the own rate of the check that belongs to the gas.",
        ProjectionRefusal.PressureStep => "P high − P low would change by more than 30 %.",
        ProjectionRefusal.TimeLow => "T low would change by more than 50 %.",
        ProjectionRefusal.DeadSpace => "The release volume would not exceed the dead space.",
        ProjectionRefusal.AlveolarVentilation => "Alveolar ventilation would fall below half or rise above twice what it is.",
        ProjectionRefusal.PaCO2 => "PaCO2 would lie outside 15–150 mmHg.",
        ProjectionRefusal.DeadSpaceBand => "The answer hangs on the dead space, which is not known well enough.",
    };

    public static string Direction(double now, double expected) =>
        Math.Abs(expected - now) < SmallestClaimMmHg ? "No change of PaCO2 by 5 mmHg or more is expected; the model tells no direction below that."
        : expected > now ? "PaCO2 would be expected to rise."
        : "PaCO2 would be expected to fall.";

    /// <summary>Why the release would end outside the patient's window; null when it would not.</summary>
    public static string? OutsideWindow(PatientPicture picture, double percent)
    {
        if (picture.Method == SettingMethod.TwoLevel)
        {
            return null;
        }

        var (late, early) = (picture.Window.Unit.Thresholds.ReleasedLong, picture.Window.Unit.Thresholds.ReleasedShort);
        var (below, above) = picture.Method == SettingMethod.FixedRate
            ? (late.FixedRateCautionBelow, early.FixedRateAbove)
            : (late.FlowGuidedCautionBelow, early.FlowGuidedAbove);
        var target = EndFlowTarget.Percent(picture);
        var (low, high) = (target - below, Math.Min(HighestReadable, target + above));
        return percent < low || percent > high
            ? $"The release would end at {Numbers.Fixed(percent)} % of peak, outside this patient's {Numbers.Fixed(low)}–{Numbers.Fixed(high)} %."
            : null;
    }
}
