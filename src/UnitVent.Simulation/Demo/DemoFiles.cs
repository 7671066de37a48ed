using System.Text.Json;
using UnitVent.Charting.Fields;

namespace UnitVent.Simulation.Demo;

/// <summary>Reads the folder of an invented unit: <c>unit.json</c> and one file a patient in <c>patients</c>.</summary>
internal static class DemoFiles
{
    public static UnitFile Unit(string folder) => Read<UnitFile>(Path.Combine(folder, "unit.json"));

    public static IReadOnlyList<Scenario> Patients(string folder) =>
        [.. Directory.GetFiles(Path.Combine(folder, "patients"), "*.json").Order(StringComparer.Ordinal).Select(Patient)];

    private static Scenario Patient(string path)
    {
        var scenario = Read<Scenario>(path);
        var faults = ScenarioCheck.Faults(scenario).ToList();
        return faults.Count == 0 ? scenario : throw new InvalidDataException($"{path}: {string.Join(" ", faults)}");
    }

    private static T Read<T>(string path)
    {
        try
        {
            return JsonSerializer.Deserialize<T>(File.ReadAllText(path), ChartJson.Options) ?? throw new InvalidDataException($"{path} is empty.");
        }
        catch (JsonException unreadable)
        {
            throw new InvalidDataException($"{path}: {unreadable.Message}", unreadable);
        }
    }
}
