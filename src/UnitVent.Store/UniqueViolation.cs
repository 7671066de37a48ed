using Microsoft.EntityFrameworkCore;
using Npgsql;

namespace UnitVent.Store;

/// <summary>Tells a broken uniqueness from other failures of a save.</summary>
internal static class UniqueViolation
{
    public static bool Is(DbUpdateException exception, string? constraint = null) =>
        exception.InnerException is PostgresException { SqlState: PostgresErrorCodes.UniqueViolation } postgres
        && (constraint is null || postgres.ConstraintName == constraint);
}
