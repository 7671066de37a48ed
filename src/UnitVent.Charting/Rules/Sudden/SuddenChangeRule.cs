using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Sudden;

/// <summary>R56: SpO2 fell together with blood pressure or volume from one check to the next.</summary>
public sealed class SuddenChangeRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R56";

    /// <inheritdoc/>
    public override Family Family => Family.Sudden;

    /// <inheritdoc/>
    public override string Seen => "sudden fall of SpO2 with blood pressure or volume";

    /// <inheritdoc/>
    public override string Levels => "urgent";

    /// <inheritdoc/>
    public override string Remarks => "Takes in what it explains: findings of the same check.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.SuddenChange;
        return picture.Check is { } check
            && Recovered("spO2Before", check.Body.SpO2Percent, before => before - options.SpO2FallPoints / 2)
            && Recovered("mapBefore", check.Body.MeanArterialPressureMmHg, before => before - options.ArterialPressureFallMmHg / 2)
            && Recovered("volumeBefore", check.Body.ReleaseVolumeMl ?? check.Body.TidalVolumeMl, before => before * (1 - options.VolumeFall / 2));

        bool Recovered(string name, decimal? now, Func<double, double> edge) =>
            !open.Evidence.TryGetValue(name, out var before) || (double?)now >= edge(before);
    }

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var checks = picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf).Where(c => c.Body.SpO2Percent is not null).TakeLast(2).ToList();
        if (checks.Count < 2 || picture.AsOf - checks[1].At > picture.Limits.Readings)
        {
            return CannotTell("Needs two checks with SpO2, the later one recent.");
        }

        var (before, after) = (checks[0].Body, checks[1].Body);
        var options = picture.Window.Unit.Thresholds.SuddenChange;
        var spO2 = (double)(before.SpO2Percent! - after.SpO2Percent!);
        var pressure = (double?)(before.MeanArterialPressureMmHg - after.MeanArterialPressureMmHg) >= options.ArterialPressureFallMmHg;
        var volumes = Volumes(before, after) is { } pair && 1 - (double)(pair.After / pair.Before) >= options.VolumeFall ? pair : ((decimal Before, decimal After)?)null;
        return spO2 >= options.SpO2FallPoints && (pressure || volumes is not null)
            ? Found(checks[0], checks[1], pressure, volumes, picture)
            : Clear(checks[1].At);
    }

    private RuleOutcome Found(Charted<VentilatorCheck> before, Charted<VentilatorCheck> after, bool pressure, (decimal Before, decimal After)? volume, PatientPicture picture)
    {
        var (b, a) = (before.Body, after.Body);
        var says = $"SpO2 {b.SpO2Percent} → {a.SpO2Percent} %"
            + (pressure ? $", mean arterial pressure {b.MeanArterialPressureMmHg} → {a.MeanArterialPressureMmHg} mmHg" : "")
            + (volume is { } v ? $", volume {v.Before} → {v.After} mL" : "")
            + $" between {Times.Clock(before.At, picture)} and {Times.Clock(after.At, picture)}";
        return Raise(
            Severity.Urgent,
            says,
            "tube, pneumothorax, plug, circuit",
            after.At,
            Evidence.Of(
                (double)(b.SpO2Percent! - a.SpO2Percent!),
                [before.Id, after.Id],
                [("spO2Before", (double)b.SpO2Percent!), ("spO2After", (double)a.SpO2Percent!),
                 .. pressure ? new[] { ("mapBefore", (double)b.MeanArterialPressureMmHg!) } : [],
                 .. volume is { } w ? new[] { ("volumeBefore", (double)w.Before) } : []]));
    }

    private static (decimal Before, decimal After)? Volumes(VentilatorCheck before, VentilatorCheck after) =>
        before.ReleaseVolumeMl is { } releaseBefore && after.ReleaseVolumeMl is { } releaseAfter ? (releaseBefore, releaseAfter)
        : before.TidalVolumeMl is { } tidalBefore && after.TidalVolumeMl is { } tidalAfter ? (tidalBefore, tidalAfter)
        : null;
}
