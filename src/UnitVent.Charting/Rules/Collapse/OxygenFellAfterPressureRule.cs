using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules.Oxygen;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>R54: oxygen fell within hours after mean airway pressure was lowered.</summary>
public sealed class OxygenFellAfterPressureRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R54";

    /// <inheritdoc/>
    public override Family Family => Family.Collapse;

    /// <inheritdoc/>
    public override string Seen => "oxygen fell after mean pressure was lowered";

    /// <inheritdoc/>
    public override string Levels => "P/F −20 % or SpO2 −4 within 4 h after a fall by 0.5 cmH2O caution";

    /// <inheritdoc/>
    public override string Remarks => "Held against the values of the 12 h before in the same epoch; a value that has not settled does not count.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.OxygenFellAfterPressure;
        return Back("pfBefore", picture[ValueNames.PfRatio].Value, before => before * (1 - options.PfFall / 2))
            && Back("spO2Before", OxygenReadings.SpO2(picture)?.Percent, before => before - options.SpO2FallPoints / 2);

        bool Back(string name, double? now, Func<double, double> edge) => !open.Evidence.TryGetValue(name, out var before) || now >= edge(before);
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var gas = picture.LatestGas is { Unsettled: false } latest && picture.AsOf - latest.Gas.At <= picture.Limits.Gas ? latest.Gas.At : (Instant?)null;
        if ((OxygenReadings.SpO2(picture)?.At ?? gas) is not { } reading)
        {
            return CannotTell("Needs a recent SpO2 or arterial gas that has settled.");
        }

        var options = picture.Window.Unit.Thresholds.OxygenFellAfterPressure;
        var seen = Instant.Max(reading, gas ?? reading);
        if (MeanPressureFall.Of(picture.Window, seen, Duration.FromHours(options.WithinHours)) is not { } fall || fall.Before - fall.After < options.PressureFallCmH2O)
        {
            return Clear(seen);
        }

        var gases = picture.Series.OfOxygen(ValueNames.PfRatio).ToList();
        var spO2 = picture.Series.Saturation().ToList();
        var byGas = Response(gases, fall.ChangedAt) is { } pf && pf.RelativeChange <= -options.PfFall ? pf : null;
        var bySpO2 = Response(spO2, fall.ChangedAt) is { } s && s.Before - s.After >= options.SpO2FallPoints ? s : null;
        return byGas is null && bySpO2 is null ? Clear(seen) : Fell(fall, gases, spO2, byGas, bySpO2);
    }

    /// <summary>The youngest value, when it came after the change, against the values before the change; null without either.</summary>
    private static Step? Response(List<SeriesPoint> points, Instant changedAt) =>
        points.Count > 0 && points[^1].At > changedAt ? Step.Of(points.Where(p => p.At <= changedAt), points[^1]) : null;

    private RuleOutcome Fell(MeanPressureFall fall, List<SeriesPoint> gases, List<SeriesPoint> spO2, Step? byGas, Step? bySpO2)
    {
        var says = $"mean pressure {Numbers.Fixed(fall.Before, 1)} → {Numbers.Fixed(fall.After, 1)} cmH2O, then "
            + string.Join(", ", new[]
            {
                byGas is null ? null : $"P/F {Numbers.Fixed(byGas.Before)} → {Numbers.Fixed(byGas.After)}",
                bySpO2 is null ? null : $"SpO2 {Numbers.Fixed(bySpO2.Before)} → {Numbers.Fixed(bySpO2.After)} %",
            }.OfType<string>());
        var seen = new[] { byGas is null ? (SeriesPoint?)null : gases[^1], bySpO2 is null ? null : spO2[^1] }.OfType<SeriesPoint>().OrderByDescending(p => p.At).ToList();
        return Raise(
            Severity.Caution,
            says,
            "what changed the mean pressure, end-release flow, position, secretions, the probe",
            seen[0].At,
            Evidence.Of(
                Math.Max(-(byGas?.RelativeChange ?? 0), -(bySpO2?.RelativeChange ?? 0)),
                [.. seen.Select(p => p.Entry), fall.Latest.Id],
                [("meanBefore", fall.Before), ("meanAfter", fall.After),
                 .. byGas is null ? [] : new[] { ("pfBefore", byGas.Before), ("pfAfter", byGas.After) },
                 .. bySpO2 is null ? [] : new[] { ("spO2Before", bySpO2.Before), ("spO2After", bySpO2.After) }]));
    }
}
