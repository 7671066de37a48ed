using System.Globalization;
using UnitVent.Charting.Results;
using UnitVent.Charting.Rules;

namespace UnitVent.Store.Units;

/// <summary>What a unit may choose.</summary>
internal static class ThresholdCheck
{
    private const int LongestReason = 400;

    public static IEnumerable<FieldError> Of(IReadOnlyDictionary<string, double> chosen, string reason)
    {
        foreach (var key in chosen.Keys.Where(k => Threshold.All.All(t => t.Key != k)))
        {
            yield return new(key, "unknown", $"There is no threshold {key}.");
        }

        foreach (var threshold in Threshold.All.Where(t => chosen.TryGetValue(t.Key, out var value) && !(value >= t.Is.Low && value <= t.Is.High)))
        {
            yield return new(
                threshold.Key,
                "limit",
                string.Create(CultureInfo.InvariantCulture, $"{threshold.Rule}, {threshold.Is.Label}: {chosen[threshold.Key]} is outside {threshold.Is.Low}–{threshold.Is.High} {threshold.Is.Unit}").TrimEnd() + ".");
        }

        if (string.IsNullOrWhiteSpace(reason) || reason.Length > LongestReason)
        {
            yield return new("reason", "missing", $"A reason of 1–{LongestReason} characters is needed.");
        }
    }
}
