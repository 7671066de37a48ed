using System.Text.Json;
using System.Text.Json.Serialization;
using NodaTime;
using NodaTime.Text;

namespace UnitVent.Charting.Fields;

/// <summary>Instants as RFC 3339 with an offset; written in UTC.</summary>
public sealed class InstantJson : JsonConverter<Instant>
{
    internal static readonly OffsetDateTimePattern Rfc3339 = OffsetDateTimePattern.Rfc3339;

    /// <inheritdoc/>
    public override Instant Read(ref Utf8JsonReader reader, Type typeToConvert, JsonSerializerOptions options) =>
        Rfc3339.Parse(reader.GetString() ?? "") is { Success: true } parsed ? parsed.Value.ToInstant() : throw new JsonException("Not an RFC 3339 time.");

    /// <inheritdoc/>
    public override void Write(Utf8JsonWriter writer, Instant value, JsonSerializerOptions options) =>
        writer.WriteStringValue(InstantPattern.ExtendedIso.Format(value));
}
