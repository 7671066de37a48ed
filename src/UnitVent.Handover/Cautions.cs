using NodaTime;
using UnitVent.Handover.Wording;

namespace UnitVent.Handover;

/// <summary>What stands at the foot of every page.</summary>
internal static class Cautions
{
    public const string Demonstration = "DEMONSTRATION DATA";

    private const string Always = "From charting, not monitoring. Observations only, not orders; local protocol and the responsible clinician decide.";

    public static IReadOnlyList<string> Foot(Times times, Instant printedAt, Instant asOf, string printedBy) =>
        [Always, $"Printed {times.OnDay(printedAt)} by {printedBy} · data as of {times.OnDay(asOf)} · valid until next check"];
}
