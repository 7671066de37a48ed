using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Store.Model;

/// <summary>An entry of a chart. Append-only; the body is stored as it was sent.</summary>
internal sealed class EntryRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid EpisodeId { get; set; }

    public EntryKind Kind { get; set; }

    public Instant EffectiveAt { get; set; }

    public Instant RecordedAt { get; set; }

    public string RecordedBy { get; set; } = "";

    public Guid? RecordedById { get; set; }

    public long Sequence { get; set; }

    public Guid? Corrects { get; set; }

    public string? CorrectionReason { get; set; }

    public List<string> Confirmed { get; set; } = [];

    public string Body { get; set; } = "";

    public static EntryRow Of(Guid unit, Guid episode, NewEntry entry, Instant now, People.Actor actor) => new()
    {
        UnitId = unit,
        Id = entry.Id,
        EpisodeId = episode,
        Kind = entry.Body.Kind,
        EffectiveAt = entry.Body.EffectiveAt() ?? now,
        RecordedAt = now,
        RecordedBy = actor.Name,
        RecordedById = actor.UserId,
        Corrects = entry.Corrects,
        CorrectionReason = entry.CorrectionReason,
        Confirmed = [.. entry.Confirmed],
        Body = JsonSerializer.Serialize<object>(entry.Body, ChartJson.Options),
    };

    public Entry ReadBody() => (Entry)JsonSerializer.Deserialize(Body, EntryTypes.Of(Kind), ChartJson.Options)!;

    public ChartEntry ToEntry(StrikeOut? struck = null, Guid? replacedBy = null) =>
        new(Id, EpisodeId, EffectiveAt, RecordedAt, RecordedBy, Sequence, ReadBody())
        {
            Corrects = Corrects,
            CorrectionReason = CorrectionReason,
            Confirmed = Confirmed,
            Struck = struck,
            ReplacedBy = replacedBy,
        };
}
