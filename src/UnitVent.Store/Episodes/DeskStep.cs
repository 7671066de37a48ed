using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Episodes;

/// <summary>One step in the life of an episode, on its way into the store.</summary>
/// <remarks><c>Asked</c> is what was asked for, whole: the same id with something else is a conflict.</remarks>
internal sealed record DeskStep(UnitVentDbContext Db, EpisodeRow Episode, Guid Id, string Kind, string Asked, Actor Actor, Instant Now)
{
    /// <summary>Adds the event, in force from an instant (null for now), and its audit row; the caller saves.</summary>
    public Result<Guid> Done(Instant? at = null)
    {
        Db.EpisodeEvents.Add(new EpisodeEventRow
        {
            UnitId = Episode.UnitId,
            Id = Id,
            EpisodeId = Episode.Id,
            Kind = Kind,
            At = at ?? Now,
            RecordedAt = Now,
            RecordedBy = Actor.Name,
            Detail = Asked,
        });
        AuditTrail.Add(Db, Episode.UnitId, Now, Actor, Kind, Episode.Id, "");
        return Result<Guid>.Of(Id);
    }

    /// <summary>What the same id did before: done already, or a conflict; null when it is new.</summary>
    public static Result<Guid>? Before(EpisodeEventRow? before, Guid episodeId, string kind, string asked) =>
        before is null ? null
        : (before.EpisodeId, before.Kind, before.Detail) == (episodeId, kind, asked) ? Result<Guid>.Of(before.Id)
        : Refusals.IdUsed<Guid>();
}
