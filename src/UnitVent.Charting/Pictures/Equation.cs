using System.Text.RegularExpressions;
using UnitVent.Charting.Wording;

namespace UnitVent.Charting.Pictures;

/// <summary>An equation: how a number is made, where that is printed, and where it must not be relied on.</summary>
/// <param name="Id">Its id, as values carry it.</param>
/// <param name="Result">The name of the value it makes; a plain word when no value of the picture stands on it.</param>
/// <param name="Unit">The result's unit; empty for pure numbers.</param>
/// <param name="Form">The formula. Inputs stand in braces (<c>{a|b}</c>: whichever was recorded), what is left out when an input
/// was not recorded in square brackets, and definitions of letters after a semicolon.</param>
/// <param name="Limits">The range it was made for, and what is answered outside.</param>
/// <param name="Source">Where it is printed.</param>
public sealed partial record Equation(string Id, string Result, string Unit, string Form, string Limits, string Source)
{
    /// <summary>Gets where its result comes from.</summary>
    public ValueKind Kind { get; init; } = ValueKind.Derived;

    /// <summary>Gets its version: raised whenever the same inputs give another number.</summary>
    public int Version { get; init; } = 1;

    /// <summary>Gets the formula with its inputs by what they are called.</summary>
    public string InWords => Input().Replace(Form, m => InputWords.Of(m.Groups["name"].Value.Split('|')[0]));

    /// <summary>The formula with the numbers put in.</summary>
    /// <param name="inputs">The inputs; each that the formula names outside square brackets must be among them.</param>
    public string WithNumbers(IReadOnlyList<Reading> inputs)
    {
        var known = inputs.Where(r => r.Value is not null).DistinctBy(r => r.Name).ToDictionary(r => r.Name, r => r.Value!.Value);
        var kept = Optional().Replace(Form, m => Input().Matches(m.Value).All(i => NameAmong(i, known) is not null) ? m.Groups["part"].Value : "");
        return Input().Replace(kept, m => Written(known[NameAmong(m, known)!]));
    }

    private static string? NameAmong(Match input, Dictionary<string, double> known) => Array.Find(input.Groups["name"].Value.Split('|'), known.ContainsKey);

    private static string Written(double value) => value < 0 ? $"({Numbers.Plain(value)})" : Numbers.Plain(value);

    [GeneratedRegex(@"\{(?<name>[^}]+)\}")]
    private static partial Regex Input();

    [GeneratedRegex(@"\[(?<part>[^\]]*)\]")]
    private static partial Regex Optional();
}
