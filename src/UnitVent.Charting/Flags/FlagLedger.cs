using NodaTime;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Flags;

/// <summary>Carries flags on from one evaluation to the next. Pure.</summary>
public static class FlagLedger
{
    /// <summary>What happens to the open flags of an episode in the light of a new picture.</summary>
    /// <param name="open">The open flags.</param>
    /// <param name="picture">The picture.</param>
    /// <param name="newId">Makes ids for flags that are raised.</param>
    /// <returns>The steps in order; empty when nothing changed.</returns>
    public static IReadOnlyList<FlagStep> Next(IReadOnlyList<Flag> open, PatientPicture picture, Func<Guid> newId) => [];

    /// <summary>The flag after a step. A step of kind Raised makes a new one.</summary>
    /// <param name="flag">The flag before; null when it is being raised.</param>
    /// <param name="step">The step.</param>
    /// <param name="episodeId">The episode.</param>
    /// <param name="at">When.</param>
    public static Flag Apply(Flag? flag, FlagStep step, Guid episodeId, Instant at) => flag ?? new Flag(step.FlagId, episodeId, step.Finding, at);
}
