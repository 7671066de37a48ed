using System.Globalization;
using NodaTime;

namespace UnitVent.Charting.Pictures;

/// <summary>An input on its way into a formula: what was charted, or why it cannot be used.</summary>
internal readonly record struct Given(string Name, string Label, string Unit, double? Value, Instant? At, Guid? Entry)
{
    public ValueState State { get; init; }

    public string? Because { get; init; }

    /// <summary>Whether it holds from its time on, as settings do, so that its time says nothing of the age of what is computed from it.</summary>
    public bool Holds { get; init; }

    public Reading Reading => new(Name, State is ValueState.Ok or ValueState.Validity ? Value : null, Unit, At, Entry);

    public static Given Missing(string name, string label, string unit = "") =>
        new(name, label, unit, null, null, null) { State = ValueState.Missing, Because = $"Needs {label}." };

    /// <summary>The same input, unusable when it is older than its limit.</summary>
    public Given NoOlderThan(Duration limit, Instant now) =>
        State == ValueState.Ok && At is { } at && now - at > limit
            ? this with
            {
                State = ValueState.Stale,
                Because = string.Create(CultureInfo.InvariantCulture, $"{Capital(Label)} is {(now - at).TotalHours:0} h old; not calculated."),
            }
            : this;

    /// <summary>The same input, unusable for a reason.</summary>
    public Given Unless(bool refused, ValueState state, string because) =>
        refused && State == ValueState.Ok ? this with { State = state, Because = because } : this;

    private static string Capital(string label) => char.ToUpperInvariant(label[0]) + label[1..];
}
