namespace UnitVent.Store.People;

/// <summary>Who acts: a person or a token, with what it is in which unit.</summary>
/// <param name="UserId">The person or token; null for the program itself.</param>
/// <param name="Name">The name that entries carry.</param>
/// <param name="IsAdministrator">Whether it administers units, users and tokens.</param>
/// <param name="Units">Its roles by unit.</param>
public sealed record Actor(Guid? UserId, string Name, bool IsAdministrator, IReadOnlyDictionary<Guid, UnitRole> Units)
{
    /// <summary>Whether it may do something in a unit.</summary>
    public bool May(Operation operation, Guid unitId) => Units.TryGetValue(unitId, out var role) && Permissions.Allows(role, operation);
}
