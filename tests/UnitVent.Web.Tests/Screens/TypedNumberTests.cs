using UnitVent.Web.Charting;

namespace UnitVent.Web.Tests.Screens;

public sealed class TypedNumberTests
{
    public static TheoryData<string, string, string> Taken => new()
    {
        { "7.40", "7.40", "the trailing zero of a pH says how exact it is" },
        { " 28 ", "28", "blanks around it mean nothing" },
        { "-5", "-5", "a base excess below zero" },
        { "\u22125", "-5", "the true minus sign is a minus" },
        { "0", "0", "zero is a value" },
        { "0.50", "0.50", "kept as typed" },
    };

    public static TheoryData<string, string> Refused => new()
    {
        { "1,5", "a decimal comma could be a thousands comma" },
        { "1.2.3", "two decimal points" },
        { "28 cmH2O", "the unit stands beside the field" },
        { "1e3", "letters" },
        { ".5", "a missing digit looks the same" },
        { "5.", "a missing digit looks the same" },
        { "--5", "two signs" },
        { "5-3", "a sign where none fits" },
        { "1 2", "a blank inside" },
        { "9999999999999999999999999999999", "longer than any reading" },
    };

    [Theory, MemberData(nameof(Taken))]
    public void Read_OfPlainNumber_KeepsItAsTyped(string text, string expected, string reason)
    {
        var (value, problem) = TypedNumber.Read(text);

        Assert.True(problem is null && value?.ToString(System.Globalization.CultureInfo.InvariantCulture) == expected, $"{text} → {value} {problem}: {reason}");
    }

    [Theory, MemberData(nameof(Refused))]
    public void Read_OfAnythingElse_RefusesWithASentenceAndNoValue(string text, string reason)
    {
        var (value, problem) = TypedNumber.Read(text);

        Assert.True(value is null && problem?.EndsWith('.') == true, $"{text} → {value} {problem}: {reason}");
    }

    [Fact]
    public void Read_OfNothing_IsNeitherValueNorProblem() => Assert.Equal((null, null), TypedNumber.Read("  "));
}
