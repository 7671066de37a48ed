using System.Globalization;
using System.Text.RegularExpressions;

namespace UnitVent.Web.Charting;

/// <summary>Reads a typed number strictly: what cannot be read is refused with a sentence and never repaired.</summary>
public static partial class TypedNumber
{
    private const int MostDigits = 12;

    /// <summary>The number, or what is wrong with the text; neither when nothing was typed.</summary>
    public static (decimal? Value, string? Problem) Read(string text)
    {
        var typed = text.Trim().Replace('\u2212', '-');
        return typed.Length == 0 ? (null, null)
            : typed.Length <= MostDigits && Plain().IsMatch(typed) ? (decimal.Parse(typed, NumberStyles.Number, CultureInfo.InvariantCulture), null)
            : (null, Problem(typed));
    }

    private static string Problem(string typed) => typed switch
    {
        _ when typed.Any(char.IsLetter) => $"“{typed}” has letters in it. Type the number alone; the unit stands beside the field.",
        _ when typed.Contains(',') => $"“{typed}” has a comma in it. Type the decimal point as a point.",
        _ when typed.Count(c => c == '.') > 1 => $"“{typed}” has more than one decimal point.",
        _ when typed.StartsWith('.') || typed.StartsWith("-.", StringComparison.Ordinal) => $"“{typed}” begins with the decimal point. Type the zero before it.",
        _ when typed.EndsWith('.') => $"“{typed}” ends with the decimal point. Type the digits after it or leave the point out.",
        _ => $"“{typed}” cannot be read as a number.",
    };

    [GeneratedRegex(@"^-?\d+(\.\d+)?$", RegexOptions.CultureInvariant)]
    private static partial Regex Plain();
}
