using System.Text.Json;
using System.Text.Json.Serialization;
using NodaTime;
using NodaTime.Text;

namespace UnitVent.Charting.Fields;

/// <summary>Calendar dates as ISO 8601 year-month-day.</summary>
public sealed class LocalDateJson : JsonConverter<LocalDate>
{
    /// <inheritdoc/>
    public override LocalDate Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options) =>
        LocalDatePattern.Iso.Parse(reader.GetString() ?? "") is { Success: true } parsed ? parsed.Value : throw new JsonException("Not a date.");

    /// <inheritdoc/>
    public override void Write(Utf8JsonWriter writer, LocalDate value, JsonSerializerOptions options) =>
        writer.WriteStringValue(LocalDatePattern.Iso.Format(value));
}
