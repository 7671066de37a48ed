namespace UnitVent.Web.Account;

/// <summary>Where to go after signing in: only within this program.</summary>
public static class LocalPath
{
    public static string Of(string? wanted) =>
        wanted is ['/', not ('/' or '\\'), ..] && !wanted.Any(char.IsControl) ? wanted : "/";
}
