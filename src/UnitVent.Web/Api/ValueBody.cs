using NodaTime;
using UnitVent.Charting.Pictures;

namespace UnitVent.Web.Api;

/// <summary>One computed number with what it was made from, or why it cannot be had.</summary>
public sealed record ValueBody(
    double? Value, string Unit, ValueState State, string? Because, ValueKind Kind, string Equation, string? Working, string? Word, Instant? AsOf, IReadOnlyList<Reading> Inputs)
{
    public static ValueBody Of(PictureValue value) =>
        new(value.Value, value.Unit, value.State, value.Because, value.Kind, value.Equation?.Id ?? "", value.Working, value.Word, value.AsOf, value.Inputs);
}
