using UnitVent.Charting.Results;

namespace UnitVent.Store;

/// <summary>The refusals that more than one use case gives, in one wording.</summary>
internal static class Refusals
{
    public static Result<T> NotFound<T>(string what) => Result<T>.Refused(Refusal.NotFound, "", "not-found", $"There is no such {what}.");

    public static Result<T> Denied<T>() => Result<T>.Refused(Refusal.Denied, "", "denied", "Your role in this unit does not allow this.");

    public static Result<T> Unavailable<T>() => Result<T>.Refused(Refusal.Unavailable, "", "store.unavailable", "The store did not answer. Nothing was saved.");

    public static Result<T> IdUsed<T>() => Result<T>.Refused(Refusal.Conflict, "id", "id.used", "This id was used for something else.");

    public static Result<T> BedTaken<T>(string bed) => Result<T>.Refused(Refusal.Conflict, "bed", "bed.taken", $"Bed {bed} is taken.");

    public static Result<T> Ended<T>() => Result<T>.Refused(Refusal.Conflict, "", "episode.ended", "The episode has ended.");

    public static Result<T> NeedsReason<T>() => Result<T>.Refused(Refusal.Value, "reason", "missing", "A reason is needed.");
}
