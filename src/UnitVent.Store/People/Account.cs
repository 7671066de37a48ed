using Microsoft.AspNetCore.Identity;

namespace UnitVent.Store.People;

/// <summary>A person who signs in.</summary>
public sealed class Account : IdentityUser<Guid>
{
    /// <summary>Gets or sets the name on screens, sheets and entries.</summary>
    public string DisplayName { get; set; } = "";

    /// <summary>Gets or sets whether the person administers units, users and tokens.</summary>
    public bool IsAdministrator { get; set; }

    /// <summary>Gets or sets whether the person may no longer sign in.</summary>
    public bool Disabled { get; set; }

    /// <summary>Gets or sets whether the password has to be changed at the next sign-in.</summary>
    public bool MustChangePassword { get; set; }
}
