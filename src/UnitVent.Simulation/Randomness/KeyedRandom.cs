namespace UnitVent.Simulation.Randomness;

/// <summary>Random numbers that are looked up by name and index instead of drawn in turn, so that leaving some out changes none of the others.</summary>
/// <remarks>Mixing function: SplitMix64, Steele GL, et al. Proc. OOPSLA 2014, p. 453-472.</remarks>
public readonly record struct KeyedRandom(ulong Seed)
{
    private const ulong Golden = 0x9E3779B97F4A7C15;

    /// <summary>Where normal numbers are cut, in deviations: a reading further out is repeated before it is charted.</summary>
    public double LargestDeviation { get; init; } = 2.5;

    /// <summary>An independent source for a part of the simulation.</summary>
    public KeyedRandom For(string name)
    {
        unchecked
        {
            var hash = Seed;
            foreach (var character in name)
            {
                hash = Mix(hash + Golden + character);
            }

            return this with { Seed = hash };
        }
    }

    /// <summary>An independent source for a numbered part of the simulation.</summary>
    public KeyedRandom For(long index) => this with { Seed = Bits(index) };

    public ulong Bits(long index)
    {
        unchecked
        {
            return Mix(Seed + (Golden * ((ulong)index + 1)));
        }
    }

    /// <summary>Evenly spread in [0, 1).</summary>
    public double Uniform(long index) => (Bits(index) >> 11) * (1.0 / (1UL << 53));

    /// <summary>Normally distributed with mean 0 and deviation 1, cut at <see cref="LargestDeviation"/>.</summary>
    public double Normal(long index)
    {
        var pair = For(index);
        var radius = Math.Sqrt(-2 * Math.Log(1 - pair.Uniform(0)));
        return Math.Clamp(radius * Math.Cos(2 * Math.PI * pair.Uniform(1)), -LargestDeviation, LargestDeviation);
    }

    private static ulong Mix(ulong z)
    {
        unchecked
        {
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
            return z ^ (z >> 31);
        }
    }
}
