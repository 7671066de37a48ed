using System.Globalization;
using System.Text.RegularExpressions;

namespace UnitVent.Charting.Tests.Pictures;

/// <summary>Computes a formula as it is written, numbers put in: a second way to the same value, from the text alone.</summary>
internal sealed partial class WrittenFormula
{
    private static readonly Dictionary<string, Func<double[], double>> Functions = new()
    {
        ["ln"] = v => Math.Log(v[0]),
        ["log10"] = v => Math.Log10(v[0]),
        ["exp"] = v => Math.Exp(v[0]),
        ["max"] = v => Math.Max(v[0], v[1]),
    };

    private readonly Dictionary<string, double> letters = [];
    private Queue<string> tokens = new();

    /// <summary>The value of a formula; what stands after a semicolon defines letters.</summary>
    public static double Compute(string text)
    {
        var parts = text.Split("; ");
        var formula = new WrittenFormula();
        foreach (var definition in parts.Skip(1).Reverse())
        {
            var (letter, form) = (definition.Split(" = ")[0], definition.Split(" = ")[1]);
            formula.letters[letter] = formula.Whole(form);
        }

        return formula.Whole(parts[0]);
    }

    private double Whole(string text)
    {
        tokens = new(Token().Matches(text).Select(m => m.Value));
        var value = Sum();
        return tokens.Count == 0 ? value : throw new FormatException($"'{tokens.Peek()}' is left over in {text}.");
    }

    private double Sum()
    {
        var value = Taken("−") ? -Product() : Product();
        while (tokens.TryPeek(out var sign) && sign is "+" or "−")
        {
            tokens.Dequeue();
            value += sign == "+" ? Product() : -Product();
        }

        return value;
    }

    private double Product()
    {
        var value = Power();
        while (tokens.TryPeek(out var sign) && sign is "×" or "÷")
        {
            tokens.Dequeue();
            value *= sign == "×" ? Power() : 1 / Power();
        }

        return value;
    }

    private double Power() => Factor() is var value && Taken("^") ? Math.Pow(value, Power()) : value;

    private double Factor()
    {
        var token = tokens.Dequeue();
        return token == "(" ? Enclosed()[0]
            : Functions.TryGetValue(token, out var function) && Taken("(") ? function(Enclosed())
            : letters.TryGetValue(token, out var letter) ? letter
            : double.Parse(token, CultureInfo.InvariantCulture);
    }

    private double[] Enclosed()
    {
        List<double> values = [Sum()];
        while (Taken(","))
        {
            values.Add(Sum());
        }

        return Taken(")") ? [.. values] : throw new FormatException("A bracket is open.");
    }

    private bool Taken(string token) => tokens.TryPeek(out var next) && next == token && tokens.Dequeue() is not null;

    [GeneratedRegex(@"[0-9.]+|[A-Za-z][A-Za-z0-9]*|\S")]
    private static partial Regex Token();
}
