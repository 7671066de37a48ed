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
}
