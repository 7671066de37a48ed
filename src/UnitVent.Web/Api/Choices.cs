using System.Text.Json;

namespace UnitVent.Web.Api;

/// <summary>Choices as the interface spells them: camelCase.</summary>
public static class Choices
{
    public static IEnumerable<string> Names<T>()
        where T : struct, Enum => Enum.GetNames<T>().Select(JsonNamingPolicy.CamelCase.ConvertName);

    /// <summary>The choice with a name; null when there is none.</summary>
    public static T? Read<T>(string? name)
        where T : struct, Enum =>
        Enum.GetValues<T>().Where(v => JsonNamingPolicy.CamelCase.ConvertName(v.ToString()) == name).Select(v => (T?)v).FirstOrDefault();
}
