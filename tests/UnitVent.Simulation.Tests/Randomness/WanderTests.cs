using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Tests.Randomness;

public sealed class WanderTests
{
    [Fact]
    public void At_HourAfterHour_HasTheCorrelationOfItsTimeConstant()
    {
        var wander = new Wander(new KeyedRandom(7), correlationHours: 6);
        var values = Enumerable.Range(0, 20_000).Select(h => wander.At(h)).ToArray();

        var variance = values.Average(v => v * v);
        var lagged = values.Zip(values.Skip(1)).Average(pair => pair.First * pair.Second);
        Expect.Near(1, Math.Sqrt(variance), 0.07, "deviation of the series");
        Expect.Near(Math.Exp(-1.0 / 6), lagged / variance, 0.02, "correlation of neighbouring hours");
    }

    [Fact]
    public void At_BetweenHours_LiesOnTheStraightLine()
    {
        var (whole, between) = (new Wander(new KeyedRandom(8), 6), new Wander(new KeyedRandom(8), 6));

        var (at3, at4) = (whole.At(3), whole.At(4));

        Expect.Near((at3 + at4) / 2, between.At(3.5), 1e-12, "hours that were not asked for change nothing");
    }

    [Fact]
    public void At_EarlierThanBefore_IsRefused()
    {
        var wander = new Wander(new KeyedRandom(9), 6);
        wander.At(5);

        Assert.Throws<ArgumentOutOfRangeException>(() => wander.At(4));
    }
}
