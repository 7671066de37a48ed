using NodaTime;
using UnitVent.Charting.Rules;

namespace UnitVent.Simulation.Cohort;

/// <summary>One card of one patient, or one crossing of the baseline, from its opening on.</summary>
/// <param name="Family">The family.</param>
/// <param name="Rule">The rule that led when it opened; of the baseline, the limit.</param>
/// <param name="OpenedAt">When it opened.</param>
/// <param name="ClosedAt">When it closed; null while it is open at the end.</param>
public sealed record CardLife(Family Family, string Rule, Instant OpenedAt, Instant? ClosedAt)
{
    internal bool OpenAt(Instant at) => OpenedAt <= at && (ClosedAt is null || ClosedAt > at);
}
