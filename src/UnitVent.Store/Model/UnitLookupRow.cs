namespace UnitVent.Store.Model;

/// <summary>Which unit an id belongs to: asked before the scope is known, so it is outside row-level security and carries nothing else.</summary>
internal sealed class UnitLookupRow
{
    public Guid Id { get; set; }

    public Guid UnitId { get; set; }

    public Guid EpisodeId { get; set; }
}
