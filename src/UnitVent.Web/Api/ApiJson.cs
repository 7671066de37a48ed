using System.Text.Json;
using System.Text.Json.Serialization;
using UnitVent.Charting.Fields;

namespace UnitVent.Web.Api;

/// <summary>How the interface writes its answers: as the chart writes JSON, with null where something was not recorded.</summary>
public static class ApiJson
{
    public static void Configure(JsonSerializerOptions options)
    {
        options.DefaultIgnoreCondition = JsonIgnoreCondition.Never;
        options.NumberHandling = JsonNumberHandling.Strict;
        foreach (var converter in ChartJson.Options.Converters)
        {
            options.Converters.Add(converter);
        }
    }
}
