using UnitVent.Charting.Results;

namespace UnitVent.Store;

/// <summary>The refusals that more than one use case gives, in one wording.</summary>
internal static class Refusals
{
    public static Result<T> NotFound<T>(string what) => Result<T>.Refused(Refusal.NotFound, "", "not-found", $"There is no such {what}.");

    public static Result<T> Denied<T>() => Result<T>.Refused(Refusal.Denied, "", "denied", "Your role in this unit does not allow this.");

    public static Result<T> Unavailable<T>() => Result<T>.Refused(Refusal.Unavailable, "", "store.unavailable", "The store did not answer. Nothing was saved.");

    public static Result<T> OutcomeUnknown<T>() => Result<T>.Refused(
        Refusal.Unavailable, "", "store.unknown", "The store did not answer. Whether this was saved is not known: look before you do it again.");

    public static Result<T> ChangedMeanwhile<T>() => Result<T>.Refused(Refusal.Conflict, "", "changed", "Somebody else changed this meanwhile. Look again.");

    public static Result<T> IdUsed<T>() => Result<T>.Refused(Refusal.Conflict, "id", "id.used", "This id was used for something else.");

    public static Result<T> BedTaken<T>(string bed) => Result<T>.Refused(Refusal.Conflict, "bed", "bed.taken", $"Bed {bed} is taken.");

    public static Result<T> PatientAdmitted<T>() =>
        Result<T>.Refused(Refusal.Conflict, "patient.mrn", "patient.admitted", "A patient with this MRN is in the unit already.");

    public static Result<T> Ended<T>() => Result<T>.Refused(Refusal.Conflict, "", "episode.ended", "The episode has ended.");

    public static Result<T> Missing<T>(string field, string message) => Result<T>.Refused(Refusal.Value, field, "missing", message);

    public static Result<T> NeedsReason<T>() => Missing<T>("reason", "A reason is needed.");
}
