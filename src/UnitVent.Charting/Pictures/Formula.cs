using NodaTime;

namespace UnitVent.Charting.Pictures;

/// <summary>Turns inputs into a value, or into the reason why there is none. Nothing that was charted makes it throw.</summary>
/// <param name="Name">The value's name.</param>
/// <param name="Unit">Its unit.</param>
/// <param name="Equation">The equation's id.</param>
/// <param name="Kind">Where it comes from.</param>
internal readonly record struct Formula(string Name, string Unit, string Equation, ValueKind Kind = ValueKind.Derived)
{
    private const string Undefined = "Cannot be calculated from these values: ";

    /// <summary>Computes the value from its inputs.</summary>
    /// <param name="inputs">The inputs, in the order in which the computation takes them.</param>
    /// <param name="compute">The computation; it may throw <see cref="ArgumentOutOfRangeException"/> where it is not defined.</param>
    /// <param name="undefined">Says why the computation is not defined for these inputs; null when it is.</param>
    /// <param name="doubt">Says why the value stands outside its validated range; null when it does not.</param>
    public PictureValue Of(Given[] inputs, Func<double[], double> compute, Func<double[], string?>? undefined = null, Func<double[], string?>? doubt = null)
    {
        var unusable = Array.FindIndex(inputs, g => g.State is not (ValueState.Ok or ValueState.Validity));
        if (unusable >= 0)
        {
            return Without(inputs[unusable].State, inputs[unusable].Because!, inputs);
        }

        var values = Array.ConvertAll(inputs, g => g.Value!.Value);
        try
        {
            return undefined?.Invoke(values) is { } why ? Without(ValueState.Domain, Undefined + why, inputs)
                : compute(values) is var value && double.IsFinite(value) ? With(value, doubt?.Invoke(values) ?? FirstDoubt(inputs), inputs)
                : Without(ValueState.Domain, Undefined + "the result is not a number.", inputs);
        }
        catch (ArgumentOutOfRangeException)
        {
            return Without(ValueState.Domain, Undefined + "one of them lies outside what the formula is made for.", inputs);
        }
    }

    /// <summary>A value read from a device or a slip.</summary>
    public PictureValue Measured(Given input) => (this with { Kind = ValueKind.Measured, Equation = "" }).Of([input], v => v[0]);

    /// <summary>A value that cannot be had.</summary>
    public PictureValue Without(ValueState state, string because, params Given[] inputs) =>
        new(Name, Unit, null, state, because, Kind, Equation, Oldest(inputs), Readings(inputs));

    private PictureValue With(double value, string? doubt, Given[] inputs) =>
        new(Name, Unit, value, doubt is null ? ValueState.Ok : ValueState.Validity, doubt, Kind, Equation, Oldest(inputs), Readings(inputs));

    private static string? FirstDoubt(Given[] inputs) => inputs.FirstOrDefault(g => g.State == ValueState.Validity).Because;

    private static Instant? Oldest(Given[] inputs)
    {
        var seen = inputs.Where(g => g.At is not null && !g.Holds).Select(g => g.At).ToList();
        return (seen.Count > 0 ? seen : inputs.Where(g => g.At is not null).Select(g => g.At)).DefaultIfEmpty(null).Min();
    }

    private static Reading[] Readings(Given[] inputs) => Array.ConvertAll(inputs, g => g.Reading);
}
