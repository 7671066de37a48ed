using NodaTime;
using UnitVent.Charting.Flags;

namespace UnitVent.Store.Model;

/// <summary>One step in the life of a flag with the numbers of that moment. Append-only.</summary>
internal sealed class FlagEventRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid FlagId { get; set; }

    public FlagStepKind Kind { get; set; }

    public Instant At { get; set; }

    public string By { get; set; } = "";

    public string Finding { get; set; } = "";

    public string? InHand { get; set; }
}
