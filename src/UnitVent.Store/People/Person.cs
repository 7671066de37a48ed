namespace UnitVent.Store.People;

/// <summary>A person as administrators see one.</summary>
/// <param name="Id">The person's id.</param>
/// <param name="UserName">The name to sign in with.</param>
/// <param name="DisplayName">The name on screens and entries.</param>
/// <param name="IsAdministrator">Whether the person administers.</param>
/// <param name="Disabled">Whether the person may no longer sign in.</param>
/// <param name="Roles">The person's roles by unit code.</param>
public sealed record Person(Guid Id, string UserName, string DisplayName, bool IsAdministrator, bool Disabled, IReadOnlyDictionary<string, UnitRole> Roles);
