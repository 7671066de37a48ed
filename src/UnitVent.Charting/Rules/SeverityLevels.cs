namespace UnitVent.Charting.Rules;

internal static class SeverityLevels
{
    /// <summary>One level lower; information stays.</summary>
    public static Severity LoweredIf(this Severity severity, bool lower) => lower && severity > Severity.Information ? severity - 1 : severity;
}
