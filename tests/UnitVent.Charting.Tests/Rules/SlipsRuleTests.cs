using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class SlipsRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R14 => new()
    {
        // 7.340/48 with constants 0.0307 and 6.105: 25.32 mmol/L; a pH shift of 0.03 and 0.06 is 27.1 and 29.1.
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 25.3m)], [], Clear, "fits" },
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 27.0m)], [], Clear, "within 0.03" },
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 27.5m)], [], "Advisory", "beyond 0.03" },
        { [Chart.Gas(pH: 7.340m, pCO2: 48.0m, bicarbonate: 29.5m)], [], "Caution", "beyond 0.06" },
        { [Chart.Gas(pH: 7.3m, pCO2: 48, bicarbonate: 27)], [], Clear, "rounding of pH to one decimal explains it" },
        { [Chart.Gas(bicarbonate: 35) with { BicarbonateKind = BicarbonateKind.Standard }], [], CannotTell, "standard bicarbonate" },
        { [Chart.Gas(bicarbonate: null)], [], CannotTell, "no bicarbonate" },
        { [Chart.Gas(bicarbonate: 35)], [Circumstance.ComfortCare], CannotTell, "comfort care" },
        { [], [], CannotTell, "no gas" },
    };

    [Theory, MemberData(nameof(R14))]
    public void R14_GasDoesNotFit(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R14", chart, context, expected, reason);
}
