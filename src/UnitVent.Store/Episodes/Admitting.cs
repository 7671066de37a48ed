using System.Security.Cryptography;
using System.Text;
using System.Text.Json;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Fields;
using UnitVent.Charting.Results;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Recording;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Episodes;

/// <summary>Admits one patient: patient, episode, bed, and the circumstances, phase and method that hold from the start.</summary>
internal static class Admitting
{
    public static async Task<Result<AdmitReceipt>> AdmitAsync(
        UnitVentDbContext db, Guid unitId, Actor actor, Admission admission, Instant now, CancellationToken cancellationToken)
    {
        var asked = JsonSerializer.Serialize(admission, ChartJson.Options);
        await db.Database.ExecuteSqlAsync($"select pg_advisory_xact_lock(hashtextextended({admission.Id.ToString()}, 0))", cancellationToken); // the same admission, one at a time
        var before = await db.EpisodeEvents.AsNoTracking().FirstOrDefaultAsync(e => e.UnitId == unitId && e.Id == admission.Id, cancellationToken);
        if (DeskStep.Before(before, admission.Id, "admit", asked) is { } stood)
        {
            return stood.Succeeded ? Result<AdmitReceipt>.Of(new(stood.Value, true)) : stood.As<AdmitReceipt>();
        }

        var errors = AdmissionCheck.Verdict(admission, now);
        if (errors.Count > 0)
        {
            return Result<AdmitReceipt>.Refused(Refusal.Value, errors);
        }

        return await BedStays.FindAsync(db, unitId, admission.Bed, cancellationToken) is null
            ? Result<AdmitReceipt>.Refused(Refusal.Value, "bed", "bed.unknown", $"There is no bed {admission.Bed} in this unit.")
            : await InsertAsync(db, unitId, actor, admission, asked, now, cancellationToken);
    }

    private static async Task<Result<AdmitReceipt>> InsertAsync(
        UnitVentDbContext db, Guid unitId, Actor actor, Admission admission, string asked, Instant now, CancellationToken cancellationToken)
    {
        var patient = await PatientAsync(db, unitId, actor, admission.Patient, now, cancellationToken);
        var episode = new EpisodeRow
        {
            UnitId = unitId,
            Id = admission.Id,
            PatientId = patient.Id,
            AdmittedAt = now,
            AirwaySecuredAt = Instant.Min(admission.AirwaySecuredAt, now),
            Reason = admission.Reason,
        };
        db.Episodes.Add(episode);
        db.UnitLookups.Add(new UnitLookupRow { Id = episode.Id, UnitId = unitId, EpisodeId = episode.Id });
        if (!await BedStays.TakeAsync(db, episode, admission.Bed, now, cancellationToken))
        {
            return Refusals.BedTaken<AdmitReceipt>(admission.Bed);
        }

        new DeskStep(db, episode, admission.Id, "admit", asked, actor, now).Done();
        db.Entries.AddRange(Circumstances(admission, now).Select(e => EntryRow.Of(unitId, episode.Id, e, now, actor)));
        try
        {
            await db.SaveChangesAsync(cancellationToken);
        }
        catch (DbUpdateException e) when (UniqueViolation.Is(e, BedStayConfiguration.OnePatientABed))
        {
            return Refusals.BedTaken<AdmitReceipt>(admission.Bed);
        }
        catch (DbUpdateException e) when (IsPatientTwice(e))
        {
            return Refusals.PatientAdmitted<AdmitReceipt>();
        }

        await Evaluation.AgainAsync(db, new Place(unitId, episode.Id), episode, now, cancellationToken);
        return Result<AdmitReceipt>.Of(new(episode.Id, false));
    }

    /// <summary>Whether a save failed because the patient is in the unit already.</summary>
    public static bool IsPatientTwice(DbUpdateException exception) =>
        UniqueViolation.Is(exception, EpisodeConfiguration.OneEpisodeAPatient) || UniqueViolation.Is(exception, PatientConfiguration.OneMrnAUnit);

    private static async Task<PatientRow> PatientAsync(
        UnitVentDbContext db, Guid unitId, Actor actor, PatientFacts facts, Instant now, CancellationToken cancellationToken)
    {
        var known = await db.Patients.FirstOrDefaultAsync(p => p.UnitId == unitId && p.Mrn == facts.Mrn, cancellationToken);
        var patient = known ?? new PatientRow { UnitId = unitId, Id = Guid.CreateVersion7() };
        PatientHeads.Change(db, patient, facts, now, actor, "admission");
        if (known is null)
        {
            db.Patients.Add(patient);
        }

        return patient;
    }

    private static IEnumerable<NewEntry> Circumstances(Admission admission, Instant now)
    {
        foreach (var flag in admission.ContextFlags.Distinct())
        {
            yield return new NewEntry(DerivedId(admission.Id, "context " + flag), new ContextChange { Flag = flag, From = now });
        }

        yield return new NewEntry(DerivedId(admission.Id, "phase"), new PhaseChoice { Phase = admission.Phase ?? CoursePhase.Starting, From = now });
        if (admission.Method is { } method)
        {
            yield return new NewEntry(DerivedId(admission.Id, "method"), new MethodChoice { Method = method, From = now });
        }
    }

    /// <summary>An id that follows from the admission's, so that the same admission sent twice makes the same entries (RFC 9562, version 8).</summary>
    private static Guid DerivedId(Guid admission, string name)
    {
        var hash = SHA256.HashData([.. admission.ToByteArray(bigEndian: true), .. Encoding.UTF8.GetBytes(name)]);
        hash[6] = (byte)((hash[6] & 0x0F) | 0x80);
        hash[8] = (byte)((hash[8] & 0x3F) | 0x80);
        return new Guid(hash.AsSpan(0, 16), bigEndian: true);
    }
}
