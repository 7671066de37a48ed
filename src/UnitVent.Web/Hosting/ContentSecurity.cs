using System.Security.Cryptography;

namespace UnitVent.Web.Hosting;

/// <summary>The content-security policy: nothing from elsewhere, no inline script but the import map, no evaluated text.</summary>
/// <remarks>The components need inline style attributes; their style elements cannot carry a nonce and are named by hash.</remarks>
public static class ContentSecurity
{
    private static readonly object NonceKey = new();

    /// <summary>The hashes of the style elements that the theme writes, light and dark. A test renders the theme and compares.</summary>
    public static IReadOnlyList<string> ThemeStyleHashes { get; } =
    [
        "sha256-ktKK7Zv7htgNiUfk5gyriqVJUMU7emNct5K2m6GIbXs=",
        "sha256-XzQsP9HYv5dA8MQauHPLC9ALegSBxGglPvgN6fxiZvk=",
        "sha256-OsgDvK8iikSfN4lyl/VPHHgKU/At6M/m2QvhUiZzhTU=",
        "sha256-HEp7NBRAdgtRngCu51EuO44adVHptCXULj/ggGmLMOw=",
    ];

    /// <summary>For sheets: the browser's own viewer brings its own scripts and styles.</summary>
    public const string ForSheets = "frame-ancestors 'none'";

    /// <summary>The nonce of this response; made on first use.</summary>
    public static string NonceOf(HttpContext http)
    {
        if (http.Items[NonceKey] is not string nonce)
        {
            http.Items[NonceKey] = nonce = Convert.ToBase64String(RandomNumberGenerator.GetBytes(16));
        }

        return nonce;
    }

    public static string PolicyFor(HttpContext http) => string.Join("; ",
        "default-src 'none'",
        $"script-src 'self' 'nonce-{NonceOf(http)}'",
        $"style-src 'self' {string.Join(' ', ThemeStyleHashes.Select(h => $"'{h}'"))}",
        "style-src-attr 'unsafe-inline'",
        "img-src 'self' data:",
        "font-src 'self'",
        "connect-src 'self'",
        "object-src 'none'",
        "form-action 'self'",
        "base-uri 'self'",
        "frame-ancestors 'none'");
}
