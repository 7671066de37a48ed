namespace UnitVent.Simulation.Tests;

internal static class Expect
{
    public static void Near(double expected, double actual, double tolerance, string reason)
        => Assert.True(Math.Abs(expected - actual) <= tolerance, $"Expected {expected} ± {tolerance}, got {actual}: {reason}.");
}
