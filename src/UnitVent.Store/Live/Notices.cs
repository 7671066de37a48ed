using Microsoft.EntityFrameworkCore;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Live;

/// <summary>Tells every node that something of a unit changed. Delivered on commit only; it carries ids, no data.</summary>
internal static class Notices
{
    public const string Channel = "unitvent";

    public static Task<int> SendAsync(UnitVentDbContext db, Guid unitId, CancellationToken cancellationToken) =>
        db.Database.ExecuteSqlAsync($"select pg_notify('unitvent', {unitId.ToString()})", cancellationToken);
}
