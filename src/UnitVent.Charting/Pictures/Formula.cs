using NodaTime;

namespace UnitVent.Charting.Pictures;

/// <summary>Turns inputs into a value, or into the reason why there is none. Nothing that was charted makes it throw.</summary>
internal static class Formula
{
    private const string Undefined = "Cannot be calculated from these values: ";

    /// <summary>Computes the value of an equation from its inputs.</summary>
    /// <param name="equation">The equation.</param>
    /// <param name="inputs">The inputs, in the order in which the computation takes them.</param>
    /// <param name="compute">The computation; it may throw <see cref="ArgumentOutOfRangeException"/> where it is not defined.</param>
    /// <param name="undefined">Says why the computation is not defined for these inputs; null when it is.</param>
    /// <param name="doubt">Says why the value stands outside its validated range; null when it does not.</param>
    public static PictureValue Of(
        this Equation equation, Given[] inputs, Func<double[], double> compute, Func<double[], string?>? undefined = null, Func<double[], string?>? doubt = null)
    {
        var unusable = Array.FindIndex(inputs, g => g.State is not (ValueState.Ok or ValueState.Validity));
        if (unusable >= 0)
        {
            return equation.Without(inputs[unusable].State, inputs[unusable].Because!, inputs);
        }

        var values = Array.ConvertAll(inputs, g => g.Value!.Value);
        try
        {
            return undefined?.Invoke(values) is { } why ? equation.Without(ValueState.Domain, Undefined + why, inputs)
                : compute(values) is var value && double.IsFinite(value) ? equation.With(value, doubt?.Invoke(values) ?? FirstDoubt(inputs), inputs)
                : equation.Without(ValueState.Domain, Undefined + "the result is not a number.", inputs);
        }
        catch (ArgumentOutOfRangeException)
        {
            return equation.Without(ValueState.Domain, Undefined + "one of them lies outside what the formula is made for.", inputs);
        }
    }

    /// <summary>A value read from a device or a slip.</summary>
    public static PictureValue Measured(string name, Given input) =>
        new(name, input.Unit, input.Reading.Value, input.State, input.Because, ValueKind.Measured, null, input.At, [input.Reading]);

    /// <summary>A value that cannot be had.</summary>
    public static PictureValue Without(this Equation equation, ValueState state, string because, params Given[] inputs) =>
        new(equation.Result, equation.Unit, null, state, because, equation.Kind, equation, Oldest(inputs), Readings(inputs));

    private static PictureValue With(this Equation equation, double value, string? doubt, Given[] inputs) =>
        new(equation.Result, equation.Unit, value, doubt is null ? ValueState.Ok : ValueState.Validity, doubt, equation.Kind, equation, Oldest(inputs), Readings(inputs));

    private static string? FirstDoubt(Given[] inputs) => inputs.FirstOrDefault(g => g.State == ValueState.Validity).Because;

    private static Instant? Oldest(Given[] inputs)
    {
        var seen = inputs.Where(g => g.At is not null && !g.Holds).Select(g => g.At).ToList();
        return (seen.Count > 0 ? seen : inputs.Where(g => g.At is not null).Select(g => g.At)).DefaultIfEmpty(null).Min();
    }

    private static Reading[] Readings(Given[] inputs) => Array.ConvertAll(inputs, g => g.Reading);
}
