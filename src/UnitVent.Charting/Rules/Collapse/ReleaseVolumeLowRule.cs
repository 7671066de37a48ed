using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Collapse;

/// <summary>R05: the release volume is low while the patient is acidotic, or it falls from check to check.</summary>
public sealed class ReleaseVolumeLowRule : Rule
{
    private const double HalfImportantChangeMlPerKg = 0.5; // half of 1 mL/kg [common practice]
    private const string LookAt = "P high and P low, end-release flow, secretions, tube position, stiffening, leak";

    /// <inheritdoc/>
    public override string Id => "R05";

    /// <inheritdoc/>
    public override Family Family => Family.Collapse;

    /// <inheritdoc/>
    public override string Seen => "release volume low or falling";

    /// <inheritdoc/>
    public override string Levels => "under 4 mL/kg with pH under 7.30 caution; a drift by 1 mL/kg at the same settings advisory";

    /// <inheritdoc/>
    public override bool QuietOnEcmo => true;

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) => open.Evidence.TryGetValue("before", out var before)
        ? DriftOf(picture).IsBackInside(before)
        : !(picture[ValueNames.ReleaseVolumePerKg].Value < picture.Window.Unit.Thresholds.ReleaseVolumeLow.UnderMlPerKg + HalfImportantChangeMlPerKg)
            || PH(picture) >= picture.Window.Unit.Thresholds.ReleaseVolumeLow.PHUnder + DriftVariables.PH.TrendMinimum.From(0) / 2;

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        var options = picture.Window.Unit.Thresholds.ReleaseVolumeLow;
        var volume = picture[ValueNames.ReleaseVolumePerKg];
        if (volume.Value is not { } perKg || volume.AsOf is not { } at)
        {
            return CannotTell(volume);
        }

        if (perKg < options.UnderMlPerKg && PH(picture) < options.PHUnder)
        {
            return Low(picture, perKg);
        }

        return ReleaseDrift.ChecksEnough(picture, SettingsHeld.CycleSince(picture))
            && DriftOf(picture) is { Verdict: DriftVerdict.Drifting, Direction: DriftDirection.Down } drift ? Falling(drift)
            : perKg < options.UnderMlPerKg && PH(picture) is null ? CannotTell("Needs a recent arterial pH.")
            : Clear(at);
    }

    private static double? PH(PatientPicture picture) =>
        picture.LatestGas is { } gas && picture.AsOf - gas.Gas.At <= picture.Limits.Gas ? (double?)gas.Gas.Body.PH : null;

    private static Drift DriftOf(PatientPicture picture)
    {
        var variable = DriftVariables.ReleaseVolume with { Worse = WorseWhen.Falling, TrendMinimum = MinimumChange.InUnits(picture.Window.Unit.Thresholds.ReleaseVolumeLow.FallMlPerKg) };
        return ReleaseDrift.Of(picture, variable, SettingsHeld.CycleSince(picture), 0, 100);
    }

    private RuleOutcome Low(PatientPicture picture, double perKg)
    {
        var (check, gas) = (picture.Window.Latest<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf, c => c.ReleaseVolumeMl is not null)!.Value, picture.LatestGas!.Gas);
        return RaiseOnGas(
            picture,
            Severity.Caution,
            $"release {Numbers.Fixed(perKg, 1)} mL/kg with pH {Numbers.Typed(gas.Body.PH!.Value)}",
            LookAt,
            Evidence.Of(-perKg, check.At > gas.At ? [check.Id, gas.Id] : [gas.Id, check.Id], ("releaseVolumePerKg", perKg), ("pH", (double)gas.Body.PH!.Value)));
    }

    private RuleOutcome Falling(Drift drift)
    {
        var (before, after) = (drift.StartMedian!.Value, drift.Points[^1].Value);
        return Raise(
            Severity.Advisory,
            $"release {Numbers.Fixed(before, 1)} → {Numbers.Fixed(after, 1)} mL/kg in {Times.Hours(drift.Span)}, {drift.Count} checks at the same settings",
            LookAt,
            drift.Points[^1].At,
            Evidence.Of(-after, drift.Points.Select(p => p.Entry).Reverse(), ("before", before), ("after", after), ("checks", drift.Count)));
    }
}
