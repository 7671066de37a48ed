using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice, but for the rapid shallow index: N Engl J Med 1991;324:1445.</summary>
public sealed class WorkOfBreathingRuleTests : RuleTable
{
    // The check's total is 6.6 L/min: 3.96 is a share of 60 %.
    public static TheoryData<Entry[], Circumstance[], string, string> R19b => new()
    {
        { [Chart.Aprv(high: 20), Own(rate: 31, minuteVolume: 4)], [], "Caution", "61 %, 31/min, P high 20" },
        { [Chart.Aprv(high: 20), Own(rate: 31, minuteVolume: 3.9m)], [], Clear, "59 %" },
        { [Chart.Aprv(high: 20), Own(rate: 30, minuteVolume: 4)], [], Clear, "30/min" },
        { [Chart.Aprv(high: 19), Own(rate: 31, minuteVolume: 4)], [], Clear, "P high 19" },
        { [Chart.Aprv() with { Phase = CoursePhase.Weaning }, Own(rate: 31, minuteVolume: 4)], [], CannotTell, "weaning" },
        { [Chart.Aprv(), Own(rate: null, minuteVolume: 4)], [], CannotTell, "no rate" },
        { [Chart.Aprv(), Own(rate: 31, minuteVolume: 4) with { ObservedAt = Chart.Ago(361) }], [], CannotTell, "stale" },
        { [Chart.Aprv(), Own(rate: 31, minuteVolume: 4)], [Circumstance.ComfortCare], "Caution", "distress is said in comfort care too" },
        { [Chart.PressureControl(), Own(rate: 31, minuteVolume: 4)], [], CannotTell, "another mode" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R19c => new()
    {
        { [Chart.Aprv(), Own(rate: 35), Seen(Effort.Moderate)], [], "Caution", "35/min and moderate effort" },
        { [Chart.Aprv(), Own(rate: 34), Seen(Effort.Strong)], [], Clear, "34/min" },
        { [Chart.Aprv(), Own(rate: 40), Seen(Effort.Easy)], [], Clear, "easy" },
        { [Chart.PressureControl(), Own(rate: null) with { TotalRatePerMin = 35 }, Seen(Effort.Strong)], [], "Caution", "the total rate in another mode" },
        { [Chart.Aprv(), Own(rate: null) with { TotalRatePerMin = 40 }, Seen(Effort.Strong)], [], CannotTell, "in APRV the total counts the releases too" },
        { [Chart.Aprv(), Own(100, rate: 20), Seen(Effort.Strong) with { SpontaneousRatePerMin = 36 }], [], "Caution", "the younger rate is the breathing check's" },
        { [Chart.Aprv(), Own(rate: 40)], [], CannotTell, "no effort" },
        { [Chart.Aprv(), Own(rate: 40), Seen(Effort.Strong, 361)], [], CannotTell, "effort stale" },
        { [Chart.Aprv(), Own(rate: 35), Seen(Effort.Moderate)], [Circumstance.ComfortCare], "Caution", "distress is said in comfort care too" },
    };

    // Male 175 cm: 70.566 kg, so 8 mL/kg are 564.5 mL.
    public static TheoryData<Entry[], Circumstance[], string, string> R19d => new()
    {
        { [Chart.Aprv(), Own(volume: 565), Seen(Effort.Strong)], [], "Caution", "just over 8 mL/kg and strong effort" },
        { [Chart.Aprv(), Own(volume: 564), Seen(Effort.Strong)], [], Clear, "just under 8 mL/kg" },
        { [Chart.Aprv(), Own(volume: 700), Seen(Effort.Moderate)], [], Clear, "moderate effort" },
        { [Chart.Aprv(), Seen(Effort.Strong) with { SpontaneousTidalVolumeMl = 565 }], [], "Caution", "the breathing check's own volume" },
        { [Chart.Aprv(), Own(volume: null), Seen(Effort.Strong)], [], CannotTell, "no own volume" },
        { [Chart.Aprv(), Own(volume: 700)], [], CannotTell, "no effort" },
        { [Chart.Aprv(), Own(361, volume: 700), Seen(Effort.Strong)], [], CannotTell, "stale" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R29 => new()
    {
        { [Tube(TubeCompensation.Off), Own(minuteVolume: 0.67m, rate: null)], [], "Advisory", "own share just over 10 %" },
        { [Tube(TubeCompensation.Off), Own(minuteVolume: 0.6m, rate: 8)], [], "Advisory", "own rate 8" },
        { [Tube(TubeCompensation.Off), Own(minuteVolume: 0.6m, rate: 7)], [], Clear, "hardly breathing" },
        { [Tube(TubeCompensation.On), Own(minuteVolume: 3, rate: 20)], [], Clear, "on" },
        { [Tube(TubeCompensation.NotOffered), Own(minuteVolume: 3, rate: 20)], [], CannotTell, "not offered" },
        { [Tube(TubeCompensation.NotSeen), Own(minuteVolume: 3, rate: 20)], [], CannotTell, "nobody looked" },
        { [Chart.Aprv(), Own(minuteVolume: 3, rate: 20)], [], CannotTell, "not charted" },
        { [Tube(TubeCompensation.Off)], [], CannotTell, "no reading" },
        { [Tube(TubeCompensation.Off), Own(361, minuteVolume: 3, rate: 20)], [], CannotTell, "readings stale" },
        { [Tube(TubeCompensation.Off) with { ChangedAt = Chart.Ago(721) }, Own(minuteVolume: 3, rate: 20) with { SettingsConfirmed = null }], [], CannotTell, "settings stale" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R30b => new()
    {
        { [Scored(2)], [], "Caution", "RASS +2" },
        { [Scored(1)], [], Clear, "RASS +1" },
        { [Scored(4), Chart.Aprv(), Own(minuteVolume: 4)], [], "Caution", "RASS +4 at a high own share" },
        { [Scored(3)], [Circumstance.ComfortCare], "Caution", "distress is said in comfort care too" },
        { [Scored(3) with { ObservedAt = Chart.Ago(361) }], [], CannotTell, "stale" },
        { [new BreathingCheck { ObservedAt = Chart.Ago(20), RassNotAssessable = true }], [], CannotTell, "not assessable" },
    };

    /// <summary>Rate by tidal volume 105: N Engl J Med 1991;324:1445. 4 mL/kg are 282.3 mL.</summary>
    public static TheoryData<Entry[], Circumstance[], string, string> R45 => new()
    {
        { [Support(), Own(rate: 36, volume: 450)], [], "Caution", "36/min" },
        { [Support(), Own(rate: 35, volume: 450)], [], Clear, "35/min" },
        { [Support(), Own(rate: 20, volume: 282)], [], "Caution", "just under 4 mL/kg" },
        { [Support(), Own(rate: 20, volume: 283)], [], Clear, "just over 4 mL/kg" },
        { [Support(), Own(rate: 32, volume: 304)], [], "Caution", "105.3" },
        { [Support(), Own(rate: 21, volume: 400)], [], Clear, "52.5" },
        { [Support(), Own(rate: 35, volume: 334)], [], Clear, "104.8" },
        { [Support(30), Own(21, rate: 40, volume: 450)], [], CannotTell, "read in the first 10 min" },
        { [Support(30), Own(20, rate: 40, volume: 450)], [], "Caution", "read after 10 min" },
        { [Support(), Own(361, rate: 40)], [], CannotTell, "stale" },
        { [Support(), Own(rate: null, volume: null)], [], CannotTell, "neither rate nor volume" },
        { [Chart.Aprv(), Own(rate: 40, volume: 450)], [], CannotTell, "another mode" },
    };

    [Theory, MemberData(nameof(R19b))]
    public void R19b_OwnShareHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R19b", chart, context, expected, reason);

    [Theory, MemberData(nameof(R19c))]
    public void R19c_FastAndLabouring(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R19c", chart, context, expected, reason);

    [Theory, MemberData(nameof(R19d))]
    public void R19d_LargeOwnBreaths(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R19d", chart, context, expected, reason);

    [Theory, MemberData(nameof(R29))]
    public void R29_TubeCompensationOff(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R29", chart, context, expected, reason);

    [Theory, MemberData(nameof(R30b))]
    public void R30b_Agitated(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R30b", chart, context, expected, reason);

    [Theory, MemberData(nameof(R45))]
    public void R45_SupportUnsettled(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R45", chart, context, expected, reason);

    private static VentilatorCheck Own(double minutesAgo = 25, decimal? rate = 20, decimal? volume = 300, decimal? minuteVolume = null) => Chart.Check(minutesAgo) with
    {
        SpontaneousRatePerMin = rate,
        SpontaneousTidalVolumeMl = volume,
        SpontaneousMinuteVolumeLMin = minuteVolume,
    };

    private static BreathingCheck Seen(Effort effort, double minutesAgo = 20) => new() { ObservedAt = Chart.Ago(minutesAgo), Effort = effort };

    private static BreathingCheck Scored(int rass) => new() { ObservedAt = Chart.Ago(20), Rass = rass };

    private static SettingChange Tube(TubeCompensation compensation) => Chart.Aprv() with { TubeCompensation = compensation };

    private static SettingChange Support(double minutesAgo = 600) =>
        new() { ChangedAt = Chart.Ago(minutesAgo), Mode = VentilationMode.PressureSupport, PressureSupportCmH2O = 8, PeepCmH2O = 5, FiO2 = 0.4m };
}
