using NodaTime;
using UnitVent.Simulation.Randomness;

namespace UnitVent.Simulation.Tests.Randomness;

/// <summary>Layout: RFC 9562 section 5.7.</summary>
public sealed class SeededIdTests
{
    /// <summary>RFC 9562 appendix A.6: 2022-02-22 14:22:22 −05:00 begins with 017F22E2-79B0-7.</summary>
    [Fact]
    public void At_TimeOfThePublishedExample_BeginsLikeIt()
    {
        var id = SeededId.At(Instant.FromUtc(2022, 2, 22, 19, 22, 22), new KeyedRandom(1)).ToString();

        Assert.StartsWith("017f22e2-79b0-7", id, StringComparison.Ordinal);
        Assert.Contains(id[19], "89ab");
    }

    [Fact]
    public void At_SameSeedAndTime_IsTheSameIdAndElseAnother()
    {
        var at = Instant.FromUtc(2026, 1, 1, 0, 0);

        Assert.Equal(SeededId.At(at, new KeyedRandom(1)), SeededId.At(at, new KeyedRandom(1)));
        Assert.NotEqual(SeededId.At(at, new KeyedRandom(1)), SeededId.At(at, new KeyedRandom(2)));
        Assert.NotEqual(SeededId.At(at, new KeyedRandom(1)), SeededId.At(at + Duration.FromMilliseconds(1), new KeyedRandom(1)));
    }
}
