using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Bedside;

/// <summary>What an input of a computed value is called.</summary>
public static class InputWords
{
    private static readonly Dictionary<string, string> Own = new()
    {
        ["predictedBodyWeightKg"] = "Predicted body weight",
        ["barometricPressureMmHg"] = "Barometric pressure",
        ["heightCm"] = "Height",
        ["pCO2"] = "PaCO2",
        ["pO2"] = "PaO2",
        ["fiO2"] = "FiO2",
    };

    private static readonly Dictionary<string, string> Charted = Enum.GetValues<EntryKind>()
        .SelectMany(k => EntryFields.Of(EntryTypes.Of(k)))
        .GroupBy(f => f.Name)
        .ToDictionary(g => g.Key, g => g.First().Label);

    public static string Of(string name) => Own.GetValueOrDefault(name) ?? ValueWords.Of(name)?.Label ?? Charted.GetValueOrDefault(name) ?? name;
}
