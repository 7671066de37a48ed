using System.Globalization;
using UnitVent.Charting.Pictures;

namespace UnitVent.Handover.Wording;

/// <summary>Numbers as a sheet prints them: no trailing zeros, a leading zero, the true minus sign, a space that does not break before the unit.</summary>
internal static class Numbers
{
    private const char Minus = '\u2212';
    private const char UnbreakableSpace = '\u00A0';

    private static readonly Dictionary<string, int> Decimals = new()
    {
        [ValueNames.PredictedBodyWeightKg] = 1,
        [ValueNames.VentilatorDays] = 1,
        [ValueNames.PfRatio] = 0,
        [ValueNames.MeanAirwayPressureComputed] = 1,
        [ValueNames.MeanAirwayPressureMeasured] = 1,
        [ValueNames.EndReleaseFlowPercent] = 0,
        [ValueNames.ReleaseVolumePerKg] = 1,
        [ValueNames.TidalVolumePerKg] = 1,
        [ValueNames.ExpiratoryTimeConstantS] = 2,
        [ValueNames.EffectiveCompliance] = 0,
        [ValueNames.StaticCompliance] = 0,
        [ValueNames.DrivingPressureCmH2O] = 0,
        [ValueNames.SpontaneousSharePercent] = 0,
    };

    /// <summary>A value with its unit, or that it is not known and why.</summary>
    public static string Known(PictureValue value) => value.Value is null
        ? $"not known. {value.Because}"
        : value.Because is { } doubt ? $"{WithUnit(Bare(value)!, value.Unit)} ({doubt.TrimEnd('.')})" : WithUnit(Bare(value)!, value.Unit);

    /// <summary>A value without its unit; null when it cannot be had.</summary>
    public static string? Bare(PictureValue value) => value.Value is { } number
        ? Signed(Math.Round((decimal)number, Decimals[value.Name], MidpointRounding.AwayFromZero).ToString("0.##", CultureInfo.InvariantCulture))
        : null;

    /// <summary>A number as it was typed, without trailing zeros.</summary>
    public static string Typed(decimal number) => Signed(number.ToString("0.####", CultureInfo.InvariantCulture));

    public static string Typed(decimal? number, string unit) => number is { } known ? WithUnit(Typed(known), unit) : "not recorded";

    /// <summary>A pH, which keeps its trailing zero.</summary>
    public static string AcidBase(decimal pH) => pH.ToString("0.00#", CultureInfo.InvariantCulture);

    public static string WithUnit(string number, string unit) => unit.Length == 0 ? number : $"{number}{UnbreakableSpace}{unit}";

    private static string Signed(string text) => text.Replace('-', Minus);
}
