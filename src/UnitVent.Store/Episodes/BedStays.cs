using Microsoft.EntityFrameworkCore;
using NodaTime;
using UnitVent.Store.Model;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Episodes;

/// <summary>Who lies where. The database holds that one bed has one patient.</summary>
internal static class BedStays
{
    /// <summary>Ends the stay in the present bed; the caller saves.</summary>
    public static async Task LeaveAsync(UnitVentDbContext db, EpisodeRow episode, Instant at, CancellationToken cancellationToken)
    {
        var stay = await db.BedStays.FirstOrDefaultAsync(s => s.UnitId == episode.UnitId && s.EpisodeId == episode.Id && s.Until == null, cancellationToken);
        if (stay is not null)
        {
            stay.Until = Instant.Max(at, stay.From);
        }
    }

    /// <summary>Begins a stay; false when there is no such bed or it is taken. The caller saves.</summary>
    public static async Task<bool> TakeAsync(UnitVentDbContext db, EpisodeRow episode, string bedName, Instant at, CancellationToken cancellationToken)
    {
        var bed = await FindAsync(db, episode.UnitId, bedName, cancellationToken);
        if (bed is null || await IsTakenAsync(db, episode.UnitId, bed.Id, cancellationToken))
        {
            return false;
        }

        db.BedStays.Add(new BedStayRow { UnitId = episode.UnitId, Id = Guid.CreateVersion7(), EpisodeId = episode.Id, BedId = bed.Id, From = at });
        return true;
    }

    public static Task<BedRow?> FindAsync(UnitVentDbContext db, Guid unitId, string name, CancellationToken cancellationToken) =>
        db.Beds.AsNoTracking().FirstOrDefaultAsync(b => b.UnitId == unitId && b.Name == name && !b.Retired, cancellationToken);

    private static Task<bool> IsTakenAsync(UnitVentDbContext db, Guid unitId, Guid bedId, CancellationToken cancellationToken) =>
        db.BedStays.AnyAsync(s => s.UnitId == unitId && s.BedId == bedId && s.Until == null, cancellationToken);

    public static Task<string> LastBedAsync(UnitVentDbContext db, EpisodeRow episode, CancellationToken cancellationToken) =>
        db.BedStays.Where(s => s.UnitId == episode.UnitId && s.EpisodeId == episode.Id)
            .OrderByDescending(s => s.From).ThenByDescending(s => s.Until)
            .Join(db.Beds, s => new { s.UnitId, Id = s.BedId }, b => new { b.UnitId, b.Id }, (s, b) => b.Name)
            .FirstAsync(cancellationToken);
}
