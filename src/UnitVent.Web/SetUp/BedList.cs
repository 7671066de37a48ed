using System.Globalization;

namespace UnitVent.Web.SetUp;

/// <summary>Reads beds as people write them: <c>1-12, A, B</c>.</summary>
public static class BedList
{
    private const int LongestRun = 200;

    public static IReadOnlyList<string> Read(string? text) =>
        [.. (text ?? "").Split([',', ';', '\n'], StringSplitOptions.RemoveEmptyEntries | StringSplitOptions.TrimEntries).SelectMany(Run)];

    private static IEnumerable<string> Run(string part) =>
        part.Split(['-', '–'], StringSplitOptions.TrimEntries) is [var first, var last]
        && int.TryParse(first, CultureInfo.InvariantCulture, out var from) && int.TryParse(last, CultureInfo.InvariantCulture, out var to)
        && from >= 0 && to >= from && to - from < LongestRun
            ? Enumerable.Range(from, to - from + 1).Select(n => n.ToString(CultureInfo.InvariantCulture))
            : [part];
}
