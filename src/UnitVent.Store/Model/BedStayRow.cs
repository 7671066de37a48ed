using NodaTime;

namespace UnitVent.Store.Model;

/// <summary>Which bed an episode lies in. Open until it ends; one bed holds one patient.</summary>
internal sealed class BedStayRow
{
    public Guid UnitId { get; set; }

    public Guid Id { get; set; }

    public Guid EpisodeId { get; set; }

    public Guid BedId { get; set; }

    public Instant From { get; set; }

    public Instant? Until { get; set; }
}
