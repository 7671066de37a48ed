namespace UnitVent.Simulation.Randomness;

/// <summary>Slow correlated wander about zero with deviation 1: a first-order autoregressive series of hourly values, joined by straight lines.</summary>
/// <remarks>x(n) = φ x(n − 1) + √(1 − φ²) ε(n), φ = exp(−1 h / correlation time). Has to be asked in order of time.</remarks>
public sealed class Wander(KeyedRandom random, double correlationHours)
{
    private readonly double carried = Math.Exp(-1 / correlationHours);
    private long hour;
    private double last = random.Normal(0);
    private double next = double.NaN;

    /// <summary>The value at a time that is not before the last one asked for.</summary>
    public double At(double hours)
    {
        var whole = (long)Math.Floor(hours);
        ArgumentOutOfRangeException.ThrowIfLessThan(whole, hour, nameof(hours));
        if (double.IsNaN(next))
        {
            next = After(last, 1);
        }

        for (; hour < whole; hour++)
        {
            (last, next) = (next, After(next, hour + 2));
        }

        return double.Lerp(last, next, hours - hour);
    }

    private double After(double value, long index) => (carried * value) + (Math.Sqrt(1 - (carried * carried)) * random.Normal(index));
}
