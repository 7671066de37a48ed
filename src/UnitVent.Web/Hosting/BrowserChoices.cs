namespace UnitVent.Web.Hosting;

/// <summary>What a browser keeps between visits: the look, and which unit was open. Neither says anything about a patient.</summary>
public static class BrowserChoices
{
    public const string LookCookie = "__Host-look";
    public const string UnitCookie = "__Host-unit";

    public static string Look(HttpContext http) => http.Request.Cookies[LookCookie] is "light" or "dark" ? http.Request.Cookies[LookCookie]! : "auto";

    public static string? UnitCode(HttpContext http) => http.Request.Cookies[UnitCookie] is { Length: > 0 and <= 20 } code ? code : null;
}
