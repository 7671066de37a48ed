using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Charting.Pictures;

/// <summary>What the inputs of computed values are called.</summary>
public static class InputWords
{
    private static readonly Dictionary<string, string> Own = new()
    {
        ["heightCm"] = "height",
        ["sex"] = "sex",
        ["ageYears"] = "age",
        ["sinceAirwaySecuredH"] = "time since the airway was secured",
        ["barometricPressureMmHg"] = "barometric pressure",
        ["fiO2"] = "FiO2",
        ["spO2Percent"] = "SpO2",
        ["etCO2MmHg"] = "EtCO2",
        ["tidalVolumeMl"] = "tidal volume",
        ["pO2"] = "PaO2",
        ["pCO2"] = "PaCO2",
        [ValueNames.MeanAirwayPressureMeasured] = "mean airway pressure",
        [ValueNames.EndReleaseFlowPercent] = "end-release flow in % of peak",
        [ValueNames.ExpiratoryTimeConstantS] = "time constant",
        [ValueNames.EffectiveCompliance] = "compliance",
        [ValueNames.BicarbonateComputedMmolL] = "bicarbonate",
        [ValueNames.BloodBaseExcessMmolL] = "base excess",
    };

    private static readonly Dictionary<string, string> Charted = Enum.GetValues<EntryKind>()
        .SelectMany(k => EntryFields.Of(EntryTypes.Of(k)))
        .GroupBy(f => f.Name)
        .ToDictionary(g => g.Key, g => InSentence(g.First().Label));

    /// <summary>The words for an input, as they stand inside a sentence.</summary>
    public static string Of(string name) =>
        Own.GetValueOrDefault(name) ?? Charted.GetValueOrDefault(name) ?? (ValueWords.Of(name) is { } words ? InSentence(words.Label) : name);

    // A capital falls only at the head of a plain word: "Release volume", not "FiO2" or "P high".
    private static string InSentence(string label)
    {
        var word = label.TakeWhile(char.IsLetter).ToList();
        return word.Count > 1 && word.Skip(1).All(char.IsLower) ? char.ToLowerInvariant(label[0]) + label[1..] : label;
    }
}
