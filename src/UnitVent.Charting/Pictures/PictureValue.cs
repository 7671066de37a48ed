using NodaTime;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Pictures;

/// <summary>One computed number: the value, or why it cannot be had, and how it was made. Unrounded.</summary>
/// <param name="Name">Its name as the HTTP interface spells it.</param>
/// <param name="Unit">Its unit; empty for pure numbers.</param>
/// <param name="Value">The value; null unless the state is <see cref="ValueState.Ok"/> or <see cref="ValueState.Validity"/>.</param>
/// <param name="State">How far it can be had.</param>
/// <param name="Because">One sentence when the state is not <see cref="ValueState.Ok"/>; null otherwise.</param>
/// <param name="Kind">Where it comes from.</param>
/// <param name="Equation">The equation; null for measured values.</param>
/// <param name="AsOf">The time of its oldest reading; of its settings when it rests on nothing else; null without either.</param>
/// <param name="Inputs">What it was made from.</param>
public sealed record PictureValue(
    string Name,
    string Unit,
    double? Value,
    ValueState State,
    string? Because,
    ValueKind Kind,
    Equation? Equation,
    Instant? AsOf,
    IReadOnlyList<Reading> Inputs)
{
    /// <summary>Gets the word for the value where it stands for a class; null where it is a number.</summary>
    public string? Word { get; init; }

    /// <summary>Gets the equation with the numbers put in and the result, rounded as it is shown; null where nothing was computed.</summary>
    public string? Working => Value is { } value && Equation is { } equation && ValueWords.Of(Name) is { } words
        ? $"{equation.WithNumbers(Inputs)} → {Word ?? $"{Numbers.Fixed(value, words.Decimals)} {Unit}".TrimEnd()}"
        : null;
}
