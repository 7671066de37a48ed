using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Api;

/// <summary>An entry as it stands in the chart.</summary>
public sealed record EntryItem(
    Guid Id,
    Guid EpisodeId,
    EntryKind Kind,
    Instant EffectiveAt,
    Instant RecordedAt,
    string RecordedBy,
    StrikeOut? Struck,
    Guid? Corrects,
    string? CorrectionReason,
    Guid? ReplacedBy,
    JsonElement Body)
{
    public static EntryItem Of(ChartEntry entry) => new(
        entry.Id,
        entry.EpisodeId,
        entry.Kind,
        entry.EffectiveAt,
        entry.RecordedAt,
        entry.RecordedBy,
        entry.Struck,
        entry.Corrects,
        entry.CorrectionReason,
        entry.ReplacedBy,
        JsonSerializer.SerializeToElement(entry.Body, entry.Body.GetType(), ChartJson.Options));
}
