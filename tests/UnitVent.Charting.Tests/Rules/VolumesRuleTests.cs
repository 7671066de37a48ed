using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class VolumesRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R04 => new()
    {
        // Male 175 cm: 70.566 kg, so 8, 10 and 12 mL/kg are 564.5, 705.7 and 846.8 mL.
        { [Chart.Aprv(), Chart.Check(release: 564)], [], Clear, "just under 8 mL/kg" },
        { [Chart.Aprv(), Chart.Check(release: 565)], [], "Advisory", "just over 8" },
        { [Chart.Aprv(), Chart.Check(release: 705)], [], "Advisory", "just under 10" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [], "Caution", "just over 10" },
        { [Chart.Aprv(), Chart.Check(release: 847)], [], "Urgent", "just over 12" },
        { [Chart.Aprv(high: 35, low: 0), Chart.Check(peak: 100, end: 57, release: 400)], [], "Caution", "swing 15.05" },
        { [Chart.Aprv(high: 35, low: 0), Chart.Check(peak: 100, end: 58, release: 400)], [], Clear, "swing 14.7" },
        { [Chart.Aprv(), Chart.Check(release: 706) with { ReleasesAveraged = 1 }], [], "Advisory", "one release is one level lower" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [Circumstance.AirLeak], CannotTell, "air leak" },
        { [Chart.Aprv(), Chart.Check(release: null)], [], CannotTell, "no release volume" },
        { [Chart.Aprv(), Chart.Check(361, release: 706)], [], CannotTell, "stale" },
    };

    [Theory, MemberData(nameof(R04))]
    public void R04_ReleaseVolumeHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R04", chart, context, expected, reason);

    [Fact]
    public void EstimatedHeight_LowersReleaseVolumeByOneLevel()
    {
        var chart = new Chart().With(Chart.Aprv(), Chart.Check(release: 706));
        chart.Patient = chart.Patient with { HeightEstimated = true };

        Assert.Equal(Severity.Advisory, Found(chart, "R04").Severity);
    }

    public static TheoryData<Entry[], Circumstance[], string, string> R06 => new()
    {
        { [Chart.Aprv(high: 30)], [], Clear, "on the limit" },
        { [Chart.Aprv(high: 31)], [], "Advisory", "over 30" },
        { [Chart.Aprv(high: 35)], [], "Advisory", "on the caution limit" },
        { [Chart.Aprv(high: 36)], [], "Caution", "over 35" },
        { [Chart.Aprv(high: 35)], [Circumstance.ChestWallStiff], Clear, "stiff chest wall" },
        { [Chart.Aprv(high: 36)], [Circumstance.ChestWallStiff], "Advisory", "stiff chest wall, over 35" },
        { [Chart.Aprv(high: 27), Target(t => t with { PHighLimitCmH2O = 26 })], [], "Advisory", "the patient's own limit" },
        { [Chart.PressureControl()], [], CannotTell, "another mode" },
    };

    // Male 175 cm: 70.566 kg, so 6.5, 8 and 10 mL/kg are 458.7, 564.5 and 705.7 mL.
    public static TheoryData<Entry[], Circumstance[], string, string> R41 => new()
    {
        { [Chart.PressureControl(), Tidal(564)], [], Clear, "just under 8 mL/kg" },
        { [Chart.PressureControl(), Tidal(565)], [], "Caution", "just over 8" },
        { [Chart.PressureControl(), Tidal(706)], [], "Urgent", "just over 10" },
        { [Chart.PressureControl(), Tidal(458)], [Circumstance.Ards], Clear, "ARDS, just under 6.5" },
        { [Chart.PressureControl(), Tidal(459)], [Circumstance.Ards], "Advisory", "ARDS, just over 6.5" },
        { [Support(), Tidal(706)], [], "Advisory", "pressure support" },
        { [Chart.PressureControl(), Tidal(706)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.PressureControl(), Tidal(706) with { LeakPercent = 31 }], [], CannotTell, "leak" },
        { [Chart.PressureControl(), Tidal(706) with { ObservedAt = Chart.Ago(361) }], [], CannotTell, "stale" },
        { [Chart.PressureControl(), Chart.Check()], [], CannotTell, "no tidal volume" },
        { [Chart.Aprv(), Tidal(706)], [], CannotTell, "APRV" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R42 => new()
    {
        { [Chart.PressureControl(), Plateau(30)], [], Clear, "on the limit" },
        { [Chart.PressureControl(), Plateau(31)], [], "Caution", "over 30" },
        { [Chart.PressureControl(), Plateau(35)], [], "Caution", "on the urgent limit" },
        { [Chart.PressureControl(), Plateau(36)], [], "Urgent", "over 35" },
        { [Chart.PressureControl(), Plateau(36) with { Passive = false }], [], CannotTell, "effort" },
        { [Chart.PressureControl(), Plateau(36) with { HoldS = 0.4m }], [], CannotTell, "a short hold" },
        { [Chart.PressureControl(), Plateau(36) with { ObservedAt = Chart.Ago(361) }], [], CannotTell, "stale" },
        { [Chart.PressureControl(), Chart.Check()], [], CannotTell, "no plateau" },
    };

    // PEEP 10.
    public static TheoryData<Entry[], Circumstance[], string, string> R43 => new()
    {
        { [Chart.PressureControl(), Plateau(25)], [Circumstance.Ards], Clear, "15" },
        { [Chart.PressureControl(), Plateau(26)], [Circumstance.Ards], "Caution", "16, ARDS" },
        { [Chart.PressureControl(), Plateau(26)], [], "Advisory", "16, no ARDS" },
        { [Chart.PressureControl(), Plateau(26) with { Passive = false }], [Circumstance.Ards], CannotTell, "no passive hold" },
        { [Chart.PressureControl(), Plateau(26) with { ObservedAt = Chart.Ago(361) }], [], CannotTell, "stale" },
        { [Chart.Aprv(), Plateau(26)], [], CannotTell, "APRV" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R44 => new()
    {
        { [Chart.PressureControl(), Trapped(5)], [], Clear, "on the limit" },
        { [Chart.PressureControl(), Trapped(5.1m)], [], "Advisory", "over 5" },
        { [Chart.PressureControl(), Trapped(10)], [], "Advisory", "on the caution limit" },
        { [Chart.PressureControl(), Trapped(10.1m)], [], "Caution", "over 10" },
        { [Chart.PressureControl(), Trapped(12) with { ObservedAt = Chart.Ago(361) }], [], CannotTell, "stale" },
        { [Chart.PressureControl(), Chart.Check()], [], CannotTell, "not measured" },
        { [Chart.Aprv(), Trapped(12)], [], CannotTell, "APRV" },
    };

    [Theory, MemberData(nameof(R06))]
    public void R06_PHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R06", chart, context, expected, reason);

    [Theory, MemberData(nameof(R41))]
    public void R41_TidalVolumeHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R41", chart, context, expected, reason);

    [Theory, MemberData(nameof(R42))]
    public void R42_PlateauHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R42", chart, context, expected, reason);

    [Theory, MemberData(nameof(R43))]
    public void R43_DrivingPressureHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R43", chart, context, expected, reason);

    [Theory, MemberData(nameof(R44))]
    public void R44_TrappedPressure(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R44", chart, context, expected, reason);

    private static SettingChange Support() => Chart.PressureControl() with { Mode = VentilationMode.PressureSupport, PressureSupportCmH2O = 10 };

    private static VentilatorCheck Tidal(decimal millilitres) => Chart.Check(release: null, peak: null, end: null) with { TidalVolumeMl = millilitres };

    private static VentilatorCheck Plateau(decimal cmH2O) => Tidal(400) with { PlateauPressureCmH2O = cmH2O, Passive = true, HoldS = 0.5m };

    private static VentilatorCheck Trapped(decimal cmH2O) => Tidal(400) with { AutoPeepCmH2O = cmH2O };
}
