namespace UnitVent.Web.Hosting;

/// <summary>The names of the policies that pages and endpoints demand. What a person may do in a unit is decided by the store.</summary>
public static class Policies
{
    /// <summary>Signed in, even with a one-time code that has still to be changed.</summary>
    public const string SignedIn = "signed-in";

    /// <summary>May open the administration page.</summary>
    public const string Administer = "administer";

    /// <summary>A bearer token, for the HTTP interface.</summary>
    public const string Token = "token";

    /// <summary>A signed-in person or a bearer token.</summary>
    public const string SessionOrToken = "session-or-token";
}
