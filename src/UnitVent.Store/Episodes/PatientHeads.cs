using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Episodes;

/// <summary>Keeps what is known of a patient: the head says how it is, the facts how it came to be.</summary>
internal static class PatientHeads
{
    public static void Change(UnitVentDbContext db, PatientRow head, PatientFacts facts, Instant at, Actor actor, string? reason)
    {
        (head.Mrn, head.Facts) = (facts.Mrn!, JsonSerializer.Serialize(facts, ChartJson.Options));
        db.PatientFacts.Add(new PatientFactRow
        {
            UnitId = head.UnitId,
            Id = Guid.CreateVersion7(),
            PatientId = head.Id,
            RecordedAt = at,
            RecordedBy = actor.Name,
            Reason = reason,
            Facts = head.Facts,
        });
    }
}
