using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Episodes;

/// <summary>One step in the life of an episode, on its way into the store.</summary>
internal sealed record DeskStep(UnitVentDbContext Db, EpisodeRow Episode, Guid Id, string Kind, Actor Actor, Instant Now)
{
    /// <summary>Adds the event and its audit row; the caller saves.</summary>
    public Result<Guid> Done(string? detail)
    {
        Db.EpisodeEvents.Add(new EpisodeEventRow
        {
            UnitId = Episode.UnitId, Id = Id, EpisodeId = Episode.Id, Kind = Kind, At = Now, RecordedAt = Now, RecordedBy = Actor.Name, Detail = detail,
        });
        AuditTrail.Add(Db, Episode.UnitId, Now, Actor, Kind, Episode.Id, "");
        return Result<Guid>.Of(Id);
    }
}
