using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Tests.Randomness;

public sealed class KeyedRandomTests
{
    /// <summary>First outputs of SplitMix64 seeded with 1234567, from memory of the reference program of Steele GL, et al. Proc. OOPSLA 2014.</summary>
    public static TheoryData<long, ulong> PublishedOutputs => new()
    {
        { 0, 6457827717110365317 },
        { 1, 3203168211198807973 },
        { 2, 9817491932198370423 },
        { 3, 4593380528125082431 },
        { 4, 16408922859458223821 },
    };

    [Theory, MemberData(nameof(PublishedOutputs))]
    public void Bits_OfReferenceSeed_AreThoseOfReferenceProgram(long index, ulong expected) =>
        Assert.Equal(expected, new KeyedRandom(1234567).Bits(index));

    [Fact]
    public void Normal_OverManyIndices_HasMeanZeroAndDeviationNearOne()
    {
        var random = new KeyedRandom(1);
        var values = Enumerable.Range(0, 20_000).Select(i => random.Normal(i)).ToArray();

        var mean = values.Average();
        Expect.Near(0, mean, 0.02, "twice the standard error is 0.014");
        Expect.Near(0.98, Math.Sqrt(values.Average(v => v * v) - (mean * mean)), 0.02, "the cut at 2.5 deviations takes a little away");
        Assert.All(values, v => Assert.InRange(v, -2.5, 2.5));
    }

    [Fact]
    public void Uniform_OverManyIndices_FillsItsRangeEvenly()
    {
        var random = new KeyedRandom(2).For("anything");
        var tenths = Enumerable.Range(0, 10_000).CountBy(i => (int)(10 * random.Uniform(i))).ToDictionary();

        Assert.Equal(10, tenths.Count);
        Assert.All(tenths.Values, count => Assert.InRange(count, 850, 1150));
    }

    [Fact]
    public void For_OtherNameOrIndex_IsAnotherSource()
    {
        var random = new KeyedRandom(3);
        ulong[] seeds = [random.Seed, random.For("a").Seed, random.For("b").Seed, random.For("ab").Seed, random.For(0).Seed, random.For(1).Seed];

        Assert.Equal(seeds.Length, seeds.Distinct().Count());
    }
}
