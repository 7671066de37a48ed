using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Simulation.Demo;

/// <summary>Something that is charted at a time of the story.</summary>
internal sealed record ScriptedEntry
{
    public required double Hour { get; init; }

    public required UnitRoleName By { get; init; }

    public required EntryKind Kind { get; init; }

    /// <summary>The entry as the HTTP interface spells it, without its time.</summary>
    public required JsonElement Body { get; init; }

    /// <summary>How long after <see cref="Hour"/> a follow-up is due.</summary>
    public double DueInHours { get; init; }

    public int Minute => (int)Math.Round(Hour * 60);

    public Entry EntryAt(Instant at)
    {
        var body = (Entry)Body.Deserialize(EntryTypes.Of(Kind), ChartJson.Options)!;
        return body is FollowUp followUp ? followUp with { DueAt = at + Duration.FromHours(DueInHours) } : body.EffectiveFrom(at);
    }
}
