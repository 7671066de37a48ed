namespace UnitVent.Store.Model;

internal sealed class BedRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public string Name { get; set; } = "";

    /// <summary>The place in walking order.</summary>
    public int Position { get; set; }

    public bool Retired { get; set; }
}
