using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: Respir Care 2024;69:891 (daily, before noon), else common practice.</summary>
public sealed class LiberationRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R38 => new()
    {
        { [.. Ready()], [], "Information", "all recorded, all within" },
        { [.. Ready(fiO2: 0.41m)], [], Clear, "FiO2" },
        { [.. Ready(peep: 9)], [], Clear, "PEEP" },
        { [.. Ready(spO2: 89)], [], Clear, "SpO2" },
        { [.. Ready(pO2: 59)], [], Clear, "P/F 147.5" },
        { [.. Ready(pH: 7.24m)], [], Clear, "pH" },
        { [.. Ready(rass: -3)], [], Clear, "RASS" },
        { [.. Ready(rass: 2)], [], Clear, "RASS" },
        { [.. Ready(effort: Effort.None)], [], Clear, "no effort" },
        { [.. Ready(vasopressor: Vasopressor.Rising)], [], Clear, "vasopressor rising" },
        { [.. Ready(vasopressor: null)], [], CannotTell, "vasopressor not charted" },
        { [.. Ready(rass: null)], [], CannotTell, "RASS not charted" },
        { [.. Ready(), Event(60, EventKind.Prone)], [], Clear, "prone" },
        { [.. Ready(), Event(60, EventKind.RelaxantStart)], [], Clear, "relaxant" },
        { [.. Ready()], [Circumstance.RaisedIcp], Clear, "raised intracranial pressure" },
        { [.. Ready()], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [.. Ready()], [Circumstance.Tracheostomy], "Information", "off-ventilator trial" },
        { [Support(900) with { FiO2 = 0.3m }, .. Ready()], [], Clear, "FiO2 was raised 10 h ago" },
        { [.. Ready(), Result(1000, TrialResult.Failed)], [], Clear, "a trial failed 17 h ago" },
        { [.. Ready(), Result(1441, TrialResult.Failed)], [], "Information", "a trial failed more than a day ago" },
        { [.. Ready(), Result(60, TrialResult.Passed)], [], Clear, "a trial today" },
        { [Chart.Aprv()], [], CannotTell, "another mode" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R39 => new()
    {
        { [Event(150, EventKind.BreathingTrialStart)], [], Clear, "2.5 h" },
        { [Event(151, EventKind.BreathingTrialStart)], [], "Advisory", "past 2.5 h" },
        { [Event(200, EventKind.BreathingTrialStart), Result(100, TrialResult.Passed)], [], Clear, "outcome charted" },
        { [Event(200, EventKind.BreathingTrialStart)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
    };

    public static TheoryData<Entry[], Circumstance[], string, string> R40 => new()
    {
        { [Support(600), Event(60, EventKind.BreathingTrialStart), Support(30) with { FiO2 = 0.45m }], [], "Advisory", "raised" },
        { [Support(600), Event(60, EventKind.BreathingTrialStart), Support(30)], [], Clear, "as it was" },
        { [Support(600), Event(60, EventKind.BreathingTrialStart), Support(30) with { FiO2 = 0.45m }, Result(10, TrialResult.Failed)], [], Clear, "the trial is over" },
        { [Event(60, EventKind.BreathingTrialStart), Support(30)], [], CannotTell, "no settings from before" },
    };

    [Theory, MemberData(nameof(R38))]
    public void R38_TrialScreen(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R38", chart, context, expected, reason);

    [Theory, MemberData(nameof(R39))]
    public void R39_TrialOutcome(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R39", chart, context, expected, reason);

    [Theory, MemberData(nameof(R40))]
    public void R40_TrialOxygen(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R40", chart, context, expected, reason);

    private static SettingChange Support(double minutesAgo) => new() { ChangedAt = Chart.Ago(minutesAgo), Mode = VentilationMode.PressureSupport, PressureSupportCmH2O = 8, PeepCmH2O = 8, FiO2 = 0.4m };

    private static BedsideEvent Result(double minutesAgo, TrialResult result) => Event(minutesAgo, EventKind.BreathingTrialResult) with { Result = result };

    private static Entry[] Ready(
        decimal fiO2 = 0.4m, decimal peep = 8, decimal spO2 = 90, decimal pO2 = 60, decimal pH = 7.25m, int? rass = 1, Effort effort = Effort.Easy, Vasopressor? vasopressor = Vasopressor.Stable) =>
    [
        Support(600) with { FiO2 = fiO2, PeepCmH2O = peep },
        Chart.Gas(30, pO2, 0.4m, pH, bicarbonate: null),
        Chart.Check(spO2: spO2) with { Vasopressor = vasopressor },
        new BreathingCheck { ObservedAt = Chart.Ago(20), Rass = rass, Effort = effort },
    ];
}
