using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules.Oxygen;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>R24: P/F fell, in a step or as a drift, although mean airway pressure is equal or higher.</summary>
public sealed class OxygenationWorseRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R24";

    /// <inheritdoc/>
    public override Family Family => Family.Collapse;

    /// <inheritdoc/>
    public override string Seen => "oxygenation worse at equal or higher mean pressure";

    /// <inheritdoc/>
    public override string Levels => "a step by 20 % alone advisory; a second gas, SpO2 −3 or a drift by 15 % caution; SpO2 under target or PaO2 < 60 mmHg as well urgent";

    /// <inheritdoc/>
    public override string Remarks => "Quiet within 60 min after a pressure rise, across positions, with FiO2 differing by more than 0.1.";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        picture[ValueNames.PfRatio].Value is { } pf
        && pf >= open.Evidence["pfBefore"] * (1 - open.Evidence.GetValueOrDefault("importantFall", picture.Window.Unit.Thresholds.OxygenationWorse.StepFall) / 2);

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var current = picture[ValueNames.PfRatio];
        if (current.Value is not { } pf || picture.LatestGas is not { } latest)
        {
            return CannotTell(current);
        }

        if (latest.Unsettled)
        {
            return CannotTell("The latest gas was drawn before things had settled.");
        }

        var options = picture.Window.Unit.Thresholds.OxygenationWorse;
        var alike = OxygenationFall.Comparable(picture, latest, options);
        return alike.Count == 0 ? CannotTell("No earlier gas to compare with.")
            : pf < options.NotAbovePfMmHg && OxygenationFall.Of(picture, alike, latest, options) is { } fall ? Worse(picture, latest, alike, fall, options)
            : Clear(latest.Gas.At);
    }

    private RuleOutcome Worse(PatientPicture picture, PairedGas latest, List<PairedGas> alike, OxygenationFall fall, OxygenationWorseOptions options)
    {
        var spO2 = OxygenReadings.SpO2(picture);
        var spO2Before = alike.Select(OxygenReadings.SpO2AtDraw).OfType<double>().DefaultIfEmpty(double.NaN).Average();
        var low = spO2?.Percent < OxygenReadings.TargetLow(picture) || OxygenReadings.PaO2(latest) < options.UrgentPaO2MmHg;
        var desaturated = spO2Before - spO2?.Percent >= options.SpO2FallPoints;
        var level = low ? Severity.Urgent : fall.Lasting || desaturated ? Severity.Caution : Severity.Advisory;
        var mean = OxygenationFall.Mean(latest);
        var says = $"P/F {Numbers.Fixed(fall.Step.Before)} → {Numbers.Fixed(fall.Step.After)} in {Times.Hours(fall.Step.Span)}"
            + (mean is { } m ? $" at mean pressure {Numbers.Fixed(m)}" : "")
            + (desaturated ? $"; SpO2 {Numbers.Fixed(spO2Before)} → {Numbers.Fixed(spO2!.Value.Percent)} %" : "");
        return Raise(
            level,
            says,
            "end-release flow, release volume, secretions, tube position, effusion, pneumothorax, position, fluid balance",
            latest.Gas.At,
            Evidence.Of(
                -fall.Step.RelativeChange,
                [latest.Gas.Id, .. alike.Select(g => (Guid?)g.Gas.Id)],
                [("pfBefore", fall.Step.Before), ("pfAfter", fall.Step.After), ("importantFall", fall.Important), .. mean is { } cmH2O ? new[] { ("meanAirwayPressure", cmH2O) } : []]));
    }
}
