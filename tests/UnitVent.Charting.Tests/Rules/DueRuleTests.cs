using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class DueRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R17 => new()
    {
        { [Chart.Aprv(), Chart.Gas(), Chart.Check()], [], Clear, "all fresh" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(360)], [], Clear, "a check exactly at 6 h" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(361)], [], "Advisory", "a check past 6 h" },
        { [Chart.Aprv(800), Chart.Gas(), Chart.Check(721)], [], "Caution", "a check past 12 h" },
        { [Chart.Aprv(), Chart.Gas(720), Chart.Check()], [], Clear, "a gas exactly at 12 h" },
        { [Chart.Aprv(), Chart.Gas(721), Chart.Check()], [], "Advisory", "a gas past 12 h" },
        { [Chart.Aprv(2000) with { Phase = CoursePhase.Weaning }, Chart.Gas(1440), Chart.Check()], [], Clear, "weaning: a gas at 24 h" },
        { [Chart.Aprv(721), Chart.Gas(), Chart.Check() with { SettingsConfirmed = null }], [], "Advisory", "settings unconfirmed past 12 h" },
        { [Chart.Aprv(721), Chart.Gas(), Chart.Check()], [], Clear, "settings confirmed by the check" },
        { [], [], "Caution", "nothing charted for three days" },
        { [Event(60, EventKind.TransportOut)], [], CannotTell, "in transport" },
        { [Event(90, EventKind.TransportOut), Event(60, EventKind.TransportBack)], [], "Caution", "back from transport" },
        { [], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R32 => new()
    {
        { [Chart.Aprv(), Chart.Check(299)], [], Clear, "under 5 h at a 4 h interval" },
        { [Chart.Aprv(), Chart.Check(300)], [], "Advisory", "5 h" },
        { [Chart.Aprv(), Chart.Check(479)], [], "Advisory", "under 8 h" },
        { [Chart.Aprv(), Chart.Check(480)], [], "Caution", "8 h" },
        { [Chart.Aprv(), Chart.Check(480), Event(60, EventKind.OffVentilatorStart)], [], CannotTell, "off the ventilator" },
        { [Chart.Aprv(), Chart.Check(480)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    [Theory, MemberData(nameof(R17))]
    public void R17_NotKnown(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R17", chart, context, expected, reason);

    [Theory, MemberData(nameof(R32))]
    public void R32_CheckDue(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R32", chart, context, expected, reason);

    public static TheoryData<Entry[], Circumstance[], string, string> R31 => new()
    {
        { [Chart.Aprv(), Chart.Gas(300), Chart.Aprv(120, high: 26)], [], Clear, "2 h" },
        { [Chart.Aprv(), Chart.Gas(300), Chart.Aprv(121, high: 26)], [], "Advisory", "past 2 h" },
        { [Chart.Aprv(), Chart.Gas(300), Chart.Aprv(240, high: 26)], [], "Advisory", "4 h" },
        { [Chart.Aprv(), Chart.Gas(300), Chart.Aprv(241, high: 26)], [], "Caution", "past 4 h" },
        { [Chart.Aprv(), Chart.Aprv(241, high: 27)], [], Clear, "P high by 1 only" },
        { [Chart.Aprv(), Chart.Aprv(121, tHigh: 5)], [], "Advisory", "T high by 0.5" },
        { [Chart.Aprv(), Chart.Aprv(121, tLow: 0.6m)], [], "Advisory", "T low by 0.1" },
        { [Chart.Aprv(), Chart.Aprv(241, high: 26), Chart.Gas(30)], [], Clear, "a gas since" },
        { [Chart.Aprv(), Chart.Aprv(241, high: 26), Chart.Gas(30) with { Specimen = Specimen.Venous }], [], "Caution", "a venous gas is no answer" },
        { [Chart.Aprv(), Chart.Aprv(121, fiO2: 0.6m)], [], "Advisory", "FiO2 by 0.10" },
        { [Chart.Aprv(), Chart.Aprv(121, fiO2: 0.6m), Chart.Check()], [], Clear, "answered by SpO2" },
        { [Chart.Aprv(), Chart.Aprv(121, fiO2: 0.59m)], [], Clear, "FiO2 by 0.09" },
        { [Chart.Aprv(2000) with { Phase = CoursePhase.Weaning }, Chart.Aprv(241, high: 26), Bedside()], [], Clear, "weaning: SpO2, rate and EtCO2" },
        { [Chart.Aprv(2000) with { Phase = CoursePhase.Weaning }, Chart.Aprv(241, high: 26), Chart.Check()], [], "Caution", "weaning: SpO2 alone is not enough" },
        { [Chart.Aprv(2000) with { Phase = CoursePhase.Weaning }, Chart.Aprv(721, high: 26), Bedside()], [], "Advisory", "weaning: no gas for 12 h" },
        { [Chart.Aprv(), Chart.Aprv(241, high: 26), new FollowUp { What = "Gas", DueAt = Chart.Now + NodaTime.Duration.FromMinutes(10) }], [], Clear, "a gas is booked" },
        { [Chart.Aprv(), Chart.Aprv(241, high: 26), Event(60, EventKind.TransportOut)], [], CannotTell, "in transport" },
        { [Chart.Aprv(), Chart.Aprv(241, high: 26)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [], [], CannotTell, "no settings" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R33 => new()
    {
        { [Chart.PressureControl(2000), Chart.Check(720) with { PlateauPressureCmH2O = 25 }], [], Clear, "12 h" },
        { [Chart.PressureControl(2000), Chart.Check(721) with { PlateauPressureCmH2O = 25 }], [], "Information", "past 12 h" },
        { [Chart.PressureControl(721)], [], "Information", "never, 12 h after the mode began" },
        { [Chart.Aprv()], [], CannotTell, "APRV" },
        { [Chart.PressureControl(2000)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R51 => new()
    {
        { [Chart.Aprv(), Chart.Gas(), Chart.Check()], [], "Information", "no RASS, no tube" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(), new BreathingCheck { ObservedAt = Chart.Ago(20), Rass = -1 }, new AirwayCheck { ObservedAt = Chart.Ago(20) }], [], Clear, "complete" },
        { [], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    [Theory, MemberData(nameof(R31))]
    public void R31_ChangeUnanswered(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R31", chart, context, expected, reason);

    [Theory, MemberData(nameof(R33))]
    public void R33_PlateauDue(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R33", chart, context, expected, reason);

    [Theory, MemberData(nameof(R51))]
    public void R51_BaselineDue(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R51", chart, context, expected, reason);

    private static VentilatorCheck Bedside() => Chart.Check() with { EtCO2MmHg = 40, TotalRatePerMin = 22 };
}
