using System.Globalization;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Wording;

namespace UnitVent.Handover.Wording;

/// <summary>Values as a sheet prints them: rounded as the screen rounds them, with a space before the unit that does not break.</summary>
internal static class Printed
{
    private const char UnbreakableSpace = '\u00A0';

    /// <summary>A value with its unit, or that it is not known and why.</summary>
    public static string Known(PictureValue value) => value.Value is null
        ? $"not known. {value.Because}"
        : value.Because is { } doubt ? $"{WithUnit(Bare(value)!, value.Unit)} ({doubt.TrimEnd('.')})" : WithUnit(Bare(value)!, value.Unit);

    /// <summary>A value without its unit; null when it cannot be had.</summary>
    public static string? Bare(PictureValue value) => value.Value is { } number ? Numbers.Fixed(number, ValueWords.Of(value.Name)!.Decimals) : null;

    /// <summary>A number as it was typed, without trailing zeros.</summary>
    public static string Typed(decimal number) => Numbers.Plain((double)number);

    public static string Typed(decimal? number, string unit) => number is { } known ? WithUnit(Typed(known), unit) : "not recorded";

    /// <summary>A pH, which keeps its trailing zero.</summary>
    public static string AcidBase(decimal pH) => pH.ToString("0.00#", CultureInfo.InvariantCulture);

    public static string WithUnit(string number, string unit) => unit.Length == 0 ? number : $"{number}{UnbreakableSpace}{unit}";
}
