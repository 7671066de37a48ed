using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class DriveRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R19a => new()
    {
        { [Chart.Aprv(1000), Own(265, 0.6m), Own(25, 0.6m)], [], "Advisory", "9 % in two checks 4 h apart" },
        { [Chart.Aprv(1000), Own(264, 0.6m), Own(25, 0.6m)], [], Clear, "less than 4 h apart" },
        { [Chart.Aprv(1000), Own(265, 0.67m), Own(25, 0.6m)], [], Clear, "the earlier one not low" },
        { [Chart.Aprv(1000), Own(265, 0.6m), Own(25, 0.67m)], [], Clear, "over 10 %" },
        { [Chart.Aprv(1000), Own(265, 0.6m), Own(100, 2), Own(25, 0.6m)], [], Clear, "not in a row" },
        { [Chart.Aprv(1000), Own(25, 0)], [], Clear, "one check" },
        { [Chart.Aprv(1000), Own(265, 0.6m), Own(25, 0.6m), CO2(400, 45), CO2(30, 50.7m)], [], "Caution", "PaCO2 +5.7 mmHg" },
        { [Chart.Aprv(1000), Own(265, 0.6m), Own(25, 0.6m), CO2(400, 45), CO2(30, 50.5m)], [], "Advisory", "PaCO2 +5.5 mmHg" },
        { [Chart.Aprv(1000), Own(500, 1.65m), Own(265, 0.6m), Own(25, 0.6m)], [], "Caution", "25 → 9 %" },
        { [Chart.Aprv(1000), Own(500, 1.5m), Own(265, 0.6m), Own(25, 0.6m)], [], "Advisory", "23 → 9 %" },
        { [Chart.Aprv(1000), Silent(265), Silent(25)], [], "Advisory", "own rate 0 in both, although the volumes do not add up" },
        { [Chart.Aprv(719), Own(265, 0), Own(25, 0)], [], CannotTell, "first 12 h of APRV" },
        { [Chart.Aprv(720), Own(265, 0), Own(25, 0)], [], "Advisory", "after 12 h" },
        { [Chart.Aprv(1000), Own(265, 0), Own(25, 0), Event(300, EventKind.RelaxantStart)], [], CannotTell, "a relaxant acts" },
        { [Chart.Aprv(1000), Own(265, 0), Own(25, 0), new BreathingCheck { ObservedAt = Chart.Ago(60), Relaxant = Relaxant.Infusion }], [], CannotTell, "a relaxant by the breathing check" },
        { [Chart.Aprv(1000), Own(265, 0), Own(25, 0)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.PressureControl(1000), Own(265, 0), Own(25, 0)], [], CannotTell, "another mode" },
        { [Chart.Aprv(1000), Own(601, 0), Own(361, 0)], [], CannotTell, "stale" },
        { [Chart.Aprv(1000)], [], CannotTell, "no check" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R20 => new()
    {
        { [Chart.Aprv(), Event(60, EventKind.RelaxantStart)], [], "Advisory", "an hour ago, no gas" },
        { [Chart.Aprv(), Chart.Gas(70), Event(60, EventKind.RelaxantStart)], [], "Advisory", "the gas came before" },
        { [Chart.Aprv(), Event(60, EventKind.RelaxantStart), Chart.Gas(20)], [], Clear, "a gas came after" },
        { [Chart.Aprv(), Event(60, EventKind.RelaxantStart), Event(10, EventKind.RelaxantStop)], [], Clear, "over" },
        { [Chart.Aprv(), new BreathingCheck { ObservedAt = Chart.Ago(60), Relaxant = Relaxant.Bolus }], [], "Advisory", "by the breathing check" },
        { [Chart.Aprv(), new BreathingCheck { ObservedAt = Chart.Ago(361), Relaxant = Relaxant.Bolus }], [], Clear, "a bolus of 6 h ago" },
        { [Chart.Aprv(), new BreathingCheck { ObservedAt = Chart.Ago(60), Relaxant = Relaxant.None }], [], Clear, "none" },
        { [Chart.Aprv()], [], Clear, "none charted" },
        { [Chart.Aprv(), Event(60, EventKind.RelaxantStart)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [Chart.PressureControl(), Event(60, EventKind.RelaxantStart)], [], CannotTell, "another mode" },
        { [Event(60, EventKind.RelaxantStart)], [], CannotTell, "no settings" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R30 => new()
    {
        { [Chart.Aprv(), .. Asleep(505, -3, 0.6m), .. Asleep(265, -4, 0.6m), .. Asleep(25, -3, 0.6m)], [], "Advisory", "both for 8 h" },
        { [Chart.Aprv(), .. Asleep(504, -3, 0.6m), .. Asleep(265, -4, 0.6m), .. Asleep(25, -3, 0.6m)], [], Clear, "less than 8 h" },
        { [Chart.Aprv(), .. Asleep(505, -2, 0.6m), .. Asleep(265, -4, 0.6m), .. Asleep(25, -3, 0.6m)], [], Clear, "not deep 8 h ago" },
        { [Chart.Aprv(), .. Asleep(505, -3, 0.6m), .. Asleep(265, -4, 0.6m), .. Asleep(25, -2, 0.6m)], [], Clear, "lighter now" },
        { [Chart.Aprv(), .. Asleep(505, -3, 0.6m), .. Asleep(265, -4, 0.6m), .. Asleep(25, -3, 0.67m)], [], Clear, "own share over 10 %" },
        { [Chart.Aprv(), .. Asleep(505, -3, 0.6m), .. Asleep(25, -3, 0.6m), Target(t => t with { RassHigh = -3 })], [], Clear, "a target as deep" },
        { [Chart.Aprv(), .. Asleep(505, -3, 0.6m), .. Asleep(25, -3, 0.6m), Target(t => t with { RassHigh = -2 })], [], "Advisory", "a lighter target" },
        { [Chart.Aprv(), .. Asleep(505, -3, 0), .. Asleep(25, -3, 0), Event(100, EventKind.RelaxantStart)], [], CannotTell, "a relaxant acts" },
        { [Chart.Aprv(), Own(505, 0), Own(25, 0)], [], CannotTell, "no RASS" },
        { [Chart.Aprv(1000), .. Asleep(900, -3, 0.6m), .. Asleep(361, -3, 0.6m), Own(25, 0.6m)], [], CannotTell, "RASS stale" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R53 => new()
    {
        { [Chart.Aprv(), Total(400, 9), Total(300, 10), Total(25, 7)], [], "Caution", "30 % under the highest" },
        { [Chart.Aprv(), Total(400, 9), Total(300, 10), Total(25, 7.1m)], [], Clear, "29 %" },
        { [Chart.Aprv(), Total(565, 10), Total(25, 7)], [], "Caution", "9 h before" },
        { [Chart.Aprv(), Total(566, 10), Total(300, 8), Total(25, 7)], [], Clear, "more than 9 h before" },
        { [Chart.Aprv(), Total(300, 10), Chart.Aprv(200, tHigh: 6), Total(25, 7)], [], CannotTell, "at other settings" },
        { [Chart.Aprv(), Total(300, 10), Chart.Aprv(200, fiO2: 0.6m), Total(25, 7)], [], "Caution", "FiO2 does not matter to it" },
        { [Chart.PressureControl(), Total(300, 10), Total(25, 7)], [], "Caution", "in any mode" },
        { [Chart.Aprv(), Total(300, 10), Total(25, 7), Event(100, EventKind.RelaxantStart)], [], CannotTell, "a relaxant acts" },
        { [Chart.Aprv(), Total(300, 10), Event(280, EventKind.RelaxantStart), Event(200, EventKind.RelaxantStop), Total(25, 7)], [], CannotTell, "another epoch" },
        { [Chart.Aprv(1000), Total(500, 10), Total(361, 7)], [], CannotTell, "stale" },
        { [Chart.Aprv(), Total(25, 7)], [], CannotTell, "nothing to compare with" },
    };

    [Theory, MemberData(nameof(R19a))]
    public void R19a_OwnShareLow(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R19a", chart, context, expected, reason);

    [Theory, MemberData(nameof(R20))]
    public void R20_RelaxantBegun(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R20", chart, context, expected, reason);

    [Theory, MemberData(nameof(R30))]
    public void R30_DeepSedation(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R30", chart, context, expected, reason);

    [Theory, MemberData(nameof(R53))]
    public void R53_MinuteVolumeFell(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R53", chart, context, expected, reason);

    [Fact]
    public void Sentence_OfMinuteVolume_CarriesItsNumbersFirst() => Assert.Equal(
        "minute volume 10.0 → 7.0 L/min since 07:00 at the same settings",
        Found(new Chart().With(Chart.Aprv(), Total(300, 10), Total(25, 7)), "R53").Says);

    /// <summary>A check whose total is 6.6 L/min: 0.66 is a share of 10 %.</summary>
    private static VentilatorCheck Own(double minutesAgo, decimal litresPerMin) => Chart.Check(minutesAgo) with { SpontaneousMinuteVolumeLMin = litresPerMin };

    /// <summary>No own breaths, and releases that make more than the total.</summary>
    private static VentilatorCheck Silent(double minutesAgo) => Chart.Check(minutesAgo, release: 700) with { SpontaneousRatePerMin = 0 };

    private static Entry[] Asleep(double minutesAgo, int rass, decimal ownLitresPerMin) =>
        [new BreathingCheck { ObservedAt = Chart.Ago(minutesAgo), Rass = rass }, Own(minutesAgo, ownLitresPerMin)];

    private static VentilatorCheck Total(double minutesAgo, decimal litresPerMin) => Chart.Check(minutesAgo) with { TotalMinuteVolumeLMin = litresPerMin };

    private static BloodGas CO2(double minutesAgo, decimal pCO2) => Chart.Gas(minutesAgo, pCO2: pCO2, bicarbonate: null);
}
