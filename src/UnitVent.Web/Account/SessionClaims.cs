using System.Globalization;
using System.Security.Claims;
using NodaTime;

namespace UnitVent.Web.Account;

/// <summary>What a session says about itself. Rights in units are not in it: they are read anew for every action.</summary>
public static class SessionClaims
{
    public const string MustChangePassword = "must-change-password";

    private const string Session = "session";
    private const string SignedInAt = "signed-in-at";
    private const string DisplayName = "display-name";

    /// <summary>Marks a person's identity as a session that begins now.</summary>
    public static void Begin(ClaimsPrincipal person, string displayName, bool mustChangePassword, Instant now)
    {
        var identity = (ClaimsIdentity)person.Identity!;
        identity.AddClaim(new Claim(Session, Guid.NewGuid().ToString("N")));
        identity.AddClaim(new Claim(SignedInAt, now.ToUnixTimeSeconds().ToString(CultureInfo.InvariantCulture)));
        identity.AddClaim(new Claim(DisplayName, displayName));
        if (mustChangePassword)
        {
            identity.AddClaim(new Claim(MustChangePassword, ""));
        }
    }

    public static Guid? UserIdOf(ClaimsPrincipal person) =>
        Guid.TryParse(person.FindFirstValue(ClaimTypes.NameIdentifier), out var id) ? id : null;

    public static string? SessionOf(ClaimsPrincipal person) => person.FindFirstValue(Session);

    public static string NameOf(ClaimsPrincipal person) => person.FindFirstValue(DisplayName) ?? "";

    public static Instant? BeginOf(ClaimsPrincipal person) =>
        long.TryParse(person.FindFirstValue(SignedInAt), CultureInfo.InvariantCulture, out var seconds) ? Instant.FromUnixTimeSeconds(seconds) : null;
}
