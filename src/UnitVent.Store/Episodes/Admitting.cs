using System.Security.Cryptography;
using System.Text;
using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Store.Live;
using UnitVent.Store.Model;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Recording;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Episodes;

/// <summary>Admits one patient: patient, episode, bed, and the circumstances, phase and method that hold from the start.</summary>
internal static class Admitting
{
    public static async Task<Result<AdmitReceipt>> AdmitAsync(
        UnitVentDbContext db, Guid unitId, Actor actor, Admission admission, Instant now, CancellationToken cancellationToken)
    {
        if (await db.Episodes.AsNoTracking().AnyAsync(e => e.UnitId == unitId && e.Id == admission.Id, cancellationToken))
        {
            return Result<AdmitReceipt>.Of(new(admission.Id, true));
        }

        var errors = AdmissionCheck.Verdict(admission, now);
        if (errors.Count > 0)
        {
            return Result<AdmitReceipt>.Refused(Refusal.Value, errors);
        }

        return await BedStays.FindAsync(db, unitId, admission.Bed, cancellationToken) is null
            ? Result<AdmitReceipt>.Refused(Refusal.Value, "bed", "bed.unknown", $"There is no bed {admission.Bed} in this unit.")
            : await InsertAsync(db, unitId, actor, admission, now, cancellationToken);
    }

    private static async Task<Result<AdmitReceipt>> InsertAsync(
        UnitVentDbContext db, Guid unitId, Actor actor, Admission admission, Instant now, CancellationToken cancellationToken)
    {
        var patient = await PatientAsync(db, unitId, actor, admission.Patient, now, cancellationToken);
        var episode = new EpisodeRow
        {
            UnitId = unitId, Id = admission.Id, PatientId = patient.Id, AdmittedAt = now, AirwaySecuredAt = Instant.Min(admission.AirwaySecuredAt, now), Reason = admission.Reason,
        };
        db.Episodes.Add(episode);
        db.UnitLookups.Add(new UnitLookupRow { Id = episode.Id, UnitId = unitId, EpisodeId = episode.Id });
        if (!await BedStays.TakeAsync(db, episode, admission.Bed, now, cancellationToken))
        {
            return Refusals.BedTaken<AdmitReceipt>(admission.Bed);
        }

        new DeskStep(db, episode, admission.Id, "admit", actor, now).Done(admission.Bed);
        db.Entries.AddRange(Circumstances(admission, now).Select(e => EntryRow.Of(unitId, episode.Id, e, now, actor)));
        try
        {
            await db.SaveChangesAsync(cancellationToken);
        }
        catch (DbUpdateException e) when (UniqueViolation.Is(e))
        {
            return Lost(e, admission);
        }

        var window = await WindowLoader.OfEpisodeAsync(db, new Place(unitId, episode.Id), now, cancellationToken) ?? throw new InvalidOperationException("A new episode has a window.");
        await Evaluation.CarryOnAsync(db, episode, PatientPicture.At(window, now), Evaluation.Program, cancellationToken);
        await db.SaveChangesAsync(cancellationToken);
        await Notices.SendAsync(db, unitId, cancellationToken);
        return Result<AdmitReceipt>.Of(new(episode.Id, false));
    }

    private static Result<AdmitReceipt> Lost(DbUpdateException exception, Admission admission) =>
        UniqueViolation.Is(exception, BedStayConfiguration.OnePatientABed) ? Refusals.BedTaken<AdmitReceipt>(admission.Bed)
        : UniqueViolation.Is(exception, EpisodeConfiguration.OneEpisodeAPatient) || UniqueViolation.Is(exception, PatientConfiguration.OneMrnAUnit)
            ? Result<AdmitReceipt>.Refused(Refusal.Conflict, "patient.mrn", "patient.admitted", "This patient is admitted in the unit already.")
            : Refusals.IdUsed<AdmitReceipt>();

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
