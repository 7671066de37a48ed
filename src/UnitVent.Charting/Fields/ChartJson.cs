using System.Text.Json;
using System.Text.Json.Serialization;

namespace UnitVent.Charting.Fields;

/// <summary>How what is charted is written as JSON: the same in the HTTP interface and in the store.</summary>
public static class ChartJson
{
    /// <summary>Gets the options: camelCase, choices by name, instants in RFC 3339, nothing unknown, nothing written for what was not recorded.</summary>
    public static JsonSerializerOptions Options { get; } = Create();

    private static JsonSerializerOptions Create()
    {
        var options = new JsonSerializerOptions(JsonSerializerDefaults.Web)
        {
            PropertyNameCaseInsensitive = false,
            NumberHandling = JsonNumberHandling.Strict,
            DefaultIgnoreCondition = JsonIgnoreCondition.WhenWritingNull,
            UnmappedMemberHandling = JsonUnmappedMemberHandling.Disallow,
            Converters = { new JsonStringEnumConverter(JsonNamingPolicy.CamelCase, allowIntegerValues: false), new InstantJson(), new LocalDateJson() },
        };
        options.MakeReadOnly(populateMissingResolver: true);
        return options;
    }
}
