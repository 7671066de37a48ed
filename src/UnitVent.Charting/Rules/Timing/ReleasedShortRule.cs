using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Timing;

/// <summary>R02: the release ends while the flow is still high, and carbon dioxide or the released volume shows it.</summary>
public sealed class ReleasedShortRule : Rule
{
    private const double HalfImportantChange = 5; // half of 10 points, the minimum important change of the ratio [common practice]

    /// <inheritdoc/>
    public override string Id => "R02";

    /// <inheritdoc/>
    public override Family Family => Family.Timing;

    /// <inheritdoc/>
    public override string Seen => "released short: end-release flow high, % of peak";

    /// <inheritdoc/>
    public override Family? Joins => Family.Airway;

    /// <inheritdoc/>
    public override string Levels => "over 75 % (flow-guided 90 %) with pH under 7.30, PaCO2 rising or release under 3 mL/kg advisory; with pH under 7.25 caution";

    /// <inheritdoc/>
    public override string Remarks => "The target of the patient shifts the edge. Quiet with effort during the release, a leak, two levels; one release: one level lower.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.EndReleaseFlowPercent].Value is not { } percent || percent <= Edge(picture) - HalfImportantChange;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var flow = picture[ValueNames.EndReleaseFlowPercent];
        if (flow.Value is not { } percent || flow.AsOf is not { } at)
        {
            return CannotTell(flow);
        }

        var check = ReleaseChecks.WithFlows(picture)[^1];
        if (picture.Method == SettingMethod.TwoLevel || ReleaseChecks.NotValid(picture, check) is not null)
        {
            return CannotTell(ReleaseChecks.NotValid(picture, check) ?? "Not judged when two levels are set.");
        }

        return percent > Edge(picture) && Signs(picture) is { Count: > 0 } signs ? Short(picture, check, percent, signs) : Clear(at);
    }

    private static double Edge(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.ReleasedShort;
        return EndFlowTarget.Percent(picture) + (picture.Method == SettingMethod.FixedRate ? options.FixedRateAbove : options.FlowGuidedAbove);
    }

    private static double? PH(PatientPicture picture) =>
        picture.LatestGas is { } gas && picture.AsOf - gas.Gas.At <= picture.Limits.Gas && picture.GasDoubt is null ? (double?)gas.Gas.Body.PH : null;

    /// <summary>What shows that too little is released, in words.</summary>
    private static List<string> Signs(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.ReleasedShort;
        var signs = new List<string>();
        if (PH(picture) is { } pH && pH < options.PHUnder)
        {
            signs.Add($"pH {Numbers.Fixed(pH, 2)}");
        }

        if (CarbonDioxideRise.Of(picture) is { } rise)
        {
            signs.Add($"PaCO2 {Numbers.Fixed(rise.Before)} → {Numbers.Fixed(rise.After)} mmHg");
        }

        if (picture[ValueNames.ReleaseVolumePerKg].Value is { } perKg && perKg < options.VolumeUnderMlPerKg)
        {
            signs.Add($"release {Numbers.Fixed(perKg, 1)} mL/kg");
        }

        return signs;
    }

    private RuleOutcome Short(PatientPicture picture, Charted<VentilatorCheck> check, double percent, List<string> signs)
    {
        var few = ReleaseChecks.AreFew(check.Body);
        var level = PH(picture) < picture.Window.Unit.Thresholds.ReleasedShort.CautionPHUnder ? Severity.Caution : Severity.Advisory;
        return Raise(
            level.LoweredIf(few),
            $"release ended at {Numbers.Fixed(percent)} % of peak, edge {Numbers.Fixed(Edge(picture))} %; {string.Join(", ", signs)}{(few ? "; one release" : "")}",
            "secretions, bronchospasm, kink, wet filter, T low",
            check.At,
            Evidence.Of(percent, [check.Id], ("endReleaseFlowPercent", percent), ("edgePercent", Edge(picture))));
    }
}
