using System.Globalization;

namespace UnitVent.Charting.Wording;

/// <summary>Numbers as they are written everywhere: a leading zero, the true minus sign, no sign before a zero.</summary>
public static class Numbers
{
    private const char Minus = '\u2212';

    /// <summary>A number with fixed decimals: <c>−0.5</c>.</summary>
    public static string Fixed(double value, int decimals = 0)
    {
        var text = Math.Round(value, decimals, MidpointRounding.AwayFromZero).ToString("F" + decimals, CultureInfo.InvariantCulture);
        return text.StartsWith('-') && text.AsSpan(1).ContainsAnyInRange('1', '9') ? Minus + text[1..] : text.TrimStart('-');
    }

    /// <summary>A number exactly as it was typed.</summary>
    public static string Typed(decimal value) => value.ToString(CultureInfo.InvariantCulture).Replace('-', Minus);

    /// <summary>A number as it enters an equation: as many as four decimals, no trailing zeros.</summary>
    public static string Plain(double value)
    {
        var text = value.ToString("0.####", CultureInfo.InvariantCulture);
        return text == "-0" ? "0" : text.Replace('-', Minus);
    }
}
