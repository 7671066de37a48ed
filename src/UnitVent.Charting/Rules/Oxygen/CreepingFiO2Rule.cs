using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Oxygen;

/// <summary>R55: FiO2 crept up within hours, or SpO2 for the same FiO2 fell.</summary>
public sealed class CreepingFiO2Rule : Rule
{
    private const decimal InformativeUpToPercent = 97; // Chest 2007;132:410
    private const double RoundingSlack = 1e-9;

    private static readonly Duration AroundProcedure = Duration.FromHours(1); // common practice

    /// <inheritdoc/>
    public override string Id => "R55";

    /// <inheritdoc/>
    public override Family Family => Family.Oxygen;

    /// <inheritdoc/>
    public override string Seen => "FiO2 creeping up, or S/F falling";

    /// <inheritdoc/>
    public override string Levels => "FiO2 +0.20 in 8 h, or S/F −20 % (SpO2 up to 97 %), caution";

    /// <inheritdoc/>
    public override string Remarks => "Quiet when a procedure, bronchoscopy, change of tube, tracheostomy or transport lies within an hour of the rise.";

    /// <inheritdoc/>
    public override bool QuietInComfortCare => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.CreepingFiO2;
        return !(open.Evidence.TryGetValue("fiO2Before", out var fiO2) && (double?)picture.Settings?.Body.FiO2 >= fiO2 + options.FiO2Rise - RoundingSlack)
            && !(open.Evidence.TryGetValue("sfBefore", out var sf) && picture[ValueNames.SfRatio].Value < sf * (1 - options.SfFall / 2));
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.CreepingFiO2;
        var from = picture.AsOf - Duration.FromHours(options.WithinHours);
        if (picture.Settings is not { } now || now.Body.FiO2 is not { } fiO2)
        {
            return CannotTell("Needs settings.");
        }

        var lowest = Lowest(picture, from);
        var rise = fiO2 - lowest;
        if ((double)rise < options.FiO2Rise)
        {
            return BySaturation(picture, from, options);
        }

        return ForProcedure(picture, now.At) ? Clear(now.At) : Raise(
            Severity.Caution,
            $"FiO2 {Numbers.Fixed((double)lowest, 2)} → {Numbers.Fixed((double)fiO2, 2)} within {Numbers.Plain(options.WithinHours)} h",
            "P/F and mean pressure, collapse, secretions, tube position, position, fluid balance",
            now.At,
            Evidence.Of((double)rise, [now.Id], ("fiO2Before", (double)lowest), ("fiO2After", (double)fiO2)));
    }

    private RuleOutcome BySaturation(PatientPicture picture, Instant from, CreepingFiO2Options options)
    {
        var points = picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf)
            .SkipWhile(c => c.At < from)
            .Select(c => (c.At, c.Id, Sf: Sf(picture.Window, c)))
            .Where(c => c.Sf is not null).Select(c => new SeriesPoint(c.At, c.Sf!.Value, c.Id)).ToList();
        if (points.Count == 0 || picture.AsOf - points[^1].At > picture.Limits.Readings)
        {
            return CannotTell("Needs a recent SpO2 up to 97 %.");
        }

        return Step.Of(points, points[^1]) is { } step && step.RelativeChange <= -options.SfFall + RoundingSlack && !ForProcedure(picture, picture.Settings!.Value.At)
            ? Raise(
                Severity.Caution,
                $"S/F {Numbers.Fixed(step.Before)} → {Numbers.Fixed(step.After)} in {Times.Hours(step.Span)}",
                "P/F and mean pressure, collapse, secretions, tube position, position, perfusion of the probe",
                points[^1].At,
                Evidence.Of(-step.RelativeChange, [points[^1].Entry, .. points.Select(p => p.Entry)], ("sfBefore", step.Before), ("sfAfter", step.After)))
            : Clear(points[^1].At);
    }

    private static double? Sf(ChartWindow window, Charted<VentilatorCheck> check) =>
        check.Body.SpO2Percent is { } spO2 && spO2 <= InformativeUpToPercent && InForce.Settings(window, check.At) is { Body.FiO2: { } fiO2 } settings
        && !Settling.OfOxygenLasts(window, settings, check.At) && !Settling.IsDisturbed(window, check.At)
            ? (double)(spO2 / fiO2)
            : null;

    /// <summary>The lowest FiO2 in force since an instant.</summary>
    private static decimal Lowest(PatientPicture picture, Instant from)
    {
        var since = picture.Window.Of<SettingChange>(EntryKind.SettingChange, picture.AsOf).Where(s => s.At > from).Select(s => s.Body.FiO2);
        return since.Append(InForce.Settings(picture.Window, from)?.Body.FiO2).OfType<decimal>().Min();
    }

    private static bool ForProcedure(PatientPicture picture, Instant raisedAt) => picture.Window.Latest<BedsideEvent>(
        EntryKind.Event,
        picture.AsOf,
        e => e.What is EventKind.Procedure or EventKind.Bronchoscopy or EventKind.TubeChanged or EventKind.Tracheostomy or EventKind.TransportOut)
        is { } happened && happened.At >= raisedAt - AroundProcedure && happened.At <= raisedAt + AroundProcedure;
}
