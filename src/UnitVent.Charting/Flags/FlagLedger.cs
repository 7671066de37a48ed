using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules;
using UnitVent.Charting.Windows;

namespace UnitVent.Charting.Flags;

/// <summary>Carries flags on from one evaluation to the next. Pure.</summary>
/// <remarks>
/// What cannot be told never clears what was raised. What was acknowledged is neither cleared nor calmed; it is open again when the time
/// is over or a worse value comes. What rested on an entry that no longer stands is closed as corrected.
/// </remarks>
public static class FlagLedger
{
    // An older entry that is not in the window was not struck out, only left behind.
    private static readonly Duration WindowSureFor = ChartWindow.Span - Duration.FromHours(1);

    /// <summary>What happens to the open flags of an episode in the light of a new picture.</summary>
    /// <param name="open">The open flags.</param>
    /// <param name="picture">The picture.</param>
    /// <param name="newId">Makes ids for flags that are raised.</param>
    /// <returns>The steps in order; empty when nothing changed.</returns>
    public static IReadOnlyList<FlagStep> Next(IReadOnlyList<Flag> open, PatientPicture picture, Func<Guid> newId)
    {
        ArgumentNullException.ThrowIfNull(picture);
        var steps = new List<FlagStep>();
        foreach (var outcome in picture.Outcomes)
        {
            var flag = open.FirstOrDefault(f => f.Finding.Rule == outcome.Rule);
            var step = outcome switch
            {
                RuleOutcome.Raised raised when flag is null => new FlagStep(FlagStepKind.Raised, newId(), raised.Finding),
                RuleOutcome.Raised raised => Again(flag, raised.Finding),
                _ when flag is not null => NoLonger(flag, outcome, picture),
                _ => null,
            };
            if (flag is { InHand: not null } && IsBack(flag, picture) && (step?.Kind is null or FlagStepKind.StillTrue or FlagStepKind.Milder))
            {
                step = new FlagStep(FlagStepKind.Reopened, flag.Id, step?.Finding ?? flag.Finding);
            }

            if (step is not null)
            {
                steps.Add(step);
            }
        }

        return steps;
    }

    /// <summary>The flag after a step. A step of kind Raised makes a new one.</summary>
    /// <param name="flag">The flag before; null when it is being raised.</param>
    /// <param name="step">The step.</param>
    /// <param name="episodeId">The episode.</param>
    /// <param name="at">When.</param>
    public static Flag Apply(Flag? flag, FlagStep step, Guid episodeId, Instant at)
    {
        ArgumentNullException.ThrowIfNull(step);
        var current = flag ?? new Flag(step.FlagId, episodeId, step.Finding, at);
        return step.Kind switch
        {
            FlagStepKind.Raised or FlagStepKind.StillTrue or FlagStepKind.Milder => current with { Finding = step.Finding },
            FlagStepKind.Worse or FlagStepKind.Reopened => current with { Finding = step.Finding, InHand = null },
            FlagStepKind.Cleared => current with { State = FlagState.Cleared, ClosedAt = at, InHand = null },
            FlagStepKind.ClosedByCorrection => current with { State = FlagState.ClosedByCorrection, ClosedAt = at, InHand = null },
            FlagStepKind.Acknowledged => current,
        };
    }

    /// <summary>Whether a flag is in hand no longer: its time is over, or it rests on a setting that is another now.</summary>
    private static bool IsBack(Flag flag, PatientPicture picture) =>
        flag.ComesBackAt <= picture.AsOf || (flag.IsHeard && picture.Settings?.At > flag.InHand!.At);

    private static FlagStep? Again(Flag flag, Finding found)
    {
        var before = flag.Finding;
        var newer = found.SeenAt != before.SeenAt || !found.Entries.SequenceEqual(before.Entries);
        FlagStepKind? kind = found.Severity > before.Severity || (newer && found.Badness > before.Badness) ? FlagStepKind.Worse
            : found.Severity < before.Severity ? FlagStepKind.Milder
            : found.Says != before.Says || newer ? FlagStepKind.StillTrue
            : null;
        return kind is { } happened ? new(happened, flag.Id, found) : null;
    }

    private static FlagStep? NoLonger(Flag flag, RuleOutcome outcome, PatientPicture picture) =>
        RestsOnCorrectedEntry(flag.Finding, picture) ? new(FlagStepKind.ClosedByCorrection, flag.Id, flag.Finding)
        : outcome is RuleOutcome.Clear && RuleSet.Of(flag.Finding.Rule).IsBackInside(flag.Finding, picture) ? new(FlagStepKind.Cleared, flag.Id, flag.Finding)
        : null;

    private static bool RestsOnCorrectedEntry(Finding finding, PatientPicture picture)
    {
        var youngest = finding.Entries.Count > 0 ? finding.Entries[0] : Guid.Empty;
        return youngest != Guid.Empty
            && picture.AsOf - finding.SeenAt < WindowSureFor
            && picture.Window.Standing.All(e => e.Id != youngest);
    }
}
