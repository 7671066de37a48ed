using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Windows;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Rules.Drive;

/// <summary>R53: total minute volume fell at the same settings; it does not wait for a gas.</summary>
public sealed class MinuteVolumeFellRule : Rule
{
    /// <inheritdoc/>
    public override string Id => "R53";

    /// <inheritdoc/>
    public override Family Family => Family.Drive;

    /// <inheritdoc/>
    public override string Seen => "minute volume fell at the same settings";

    /// <inheritdoc/>
    public override Family? Joins => Family.CarbonDioxide;

    /// <inheritdoc/>
    public override string Levels => "30 % under the highest of the checks of the last 9 h caution";

    /// <inheritdoc/>
    public override string Remarks => "Quiet while a relaxant acts; checks at other settings do not count.";

    /// <inheritdoc/>
    public override bool IsBackInside(Finding open, PatientPicture picture) =>
        SettingsHeld.VentilationSince(picture) > open.SeenAt
        || (Checks(picture) is [.., var last] && Total(last) >= open.Evidence["before"] * (1 - picture.Window.Unit.Thresholds.MinuteVolumeFell.Fall / 2));

    /// <inheritdoc/>
    protected override RuleOutcome Look(PatientPicture picture)
    {
        if (RelaxantReadings.Acting(picture) is not null)
        {
            return CannotTell("A relaxant acts.");
        }

        var options = picture.Window.Unit.Thresholds.MinuteVolumeFell;
        if (Checks(picture) is not [.., var last] || picture.AsOf - last.At > picture.Limits.Readings)
        {
            return CannotTell("Needs a recent check with total minute volume.");
        }

        var from = Instant.Max(SettingsHeld.VentilationSince(picture), InForce.EpochStart(picture.Window, picture.AsOf));
        var before = Checks(picture).Where(c => c.At >= Instant.Max(from, last.At - Duration.FromHours(options.WithinHours)) && c.Id != last.Id).ToList();
        return before.Count == 0 ? CannotTell("No earlier check at the same settings to compare with.")
            : before.MaxBy(Total) is var highest && Total(last) <= Total(highest) * (1 - options.Fall) ? Fell(picture, highest, last)
            : Clear(last.At);
    }

    private static List<Charted<VentilatorCheck>> Checks(PatientPicture picture) =>
        [.. picture.Window.Of<VentilatorCheck>(EntryKind.VentilatorCheck, picture.AsOf).Where(c => c.Body.TotalMinuteVolumeLMin is not null)];

    private static double Total(Charted<VentilatorCheck> check) => (double)check.Body.TotalMinuteVolumeLMin!.Value;

    private RuleOutcome Fell(PatientPicture picture, Charted<VentilatorCheck> highest, Charted<VentilatorCheck> last)
    {
        var (before, after) = (Total(highest), Total(last));
        return Raise(
            Severity.Caution,
            $"minute volume {Numbers.Fixed(before, 1)} → {Numbers.Fixed(after, 1)} L/min since {Times.Clock(highest.At, picture)} at the same settings",
            "own rate and volume, sedation, release volume, leak, tube and secretions, EtCO2",
            last.At,
            Evidence.Of(1 - after / before, [last.Id, highest.Id], ("before", before), ("after", after)));
    }
}
