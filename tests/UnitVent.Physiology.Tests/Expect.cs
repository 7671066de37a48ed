namespace UnitVent.Physiology.Tests;

internal static class Expect
{
    /// <summary>Compares with a printed value; the tolerance is half its last digit unless the source is coarser.</summary>
    public static void Near(double expected, double actual, double tolerance, string reason)
        => Assert.True(Math.Abs(expected - actual) <= tolerance, $"Expected {expected} ± {tolerance}, got {actual}: {reason}.");

    public static void Refused(Func<object> compute) => Assert.Throws<ArgumentOutOfRangeException>(compute);

    /// <summary>Refused with these words in the message; a message names the argument too, as in <c>Parameter 'pH'</c>.</summary>
    public static void RefusedSaying(string words, Func<object> compute)
        => Assert.Contains(words, Assert.Throws<ArgumentOutOfRangeException>(compute).Message, StringComparison.Ordinal);
}
