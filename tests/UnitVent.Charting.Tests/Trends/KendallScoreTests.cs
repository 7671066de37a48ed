using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class KendallScoreTests
{
    /// <summary>Upper tails as the tables of Kendall (Biometrika 1938;30:81) and Gilbert (1987, table A18) print them, as remembered; each equals a count of orders over n!.</summary>
    public static TheoryData<int, int, double> PublishedUpperTails => new()
    {
        { 4, 0, .625 }, { 4, 2, .375 }, { 4, 4, .1667 }, { 4, 6, .0417 },
        { 5, 0, .5917 }, { 5, 2, .4083 }, { 5, 4, .2417 }, { 5, 6, .1167 }, { 5, 8, .0417 }, { 5, 10, .0083 },
        { 6, 1, .5 }, { 6, 3, .3597 }, { 6, 5, .2347 }, { 6, 7, .1361 }, { 6, 9, .0681 }, { 6, 11, .0278 }, { 6, 13, .0083 }, { 6, 15, .0014 },
        { 7, 9, .1194 }, { 7, 11, .0681 }, { 7, 13, .0345 }, { 7, 15, .0151 }, { 7, 17, .0054 }, { 7, 19, .0014 }, { 7, 21, .0002 },
        { 8, 12, .0894 }, { 8, 14, .0543 }, { 8, 16, .0305 }, { 8, 18, .0156 }, { 8, 20, .0071 },
        { 9, 14, .0901 }, { 9, 16, .0597 }, { 9, 18, .0376 }, { 9, 20, .0223 },
        { 10, 17, .0779 }, { 10, 19, .0542 }, { 10, 21, .0363 }, { 10, 23, .0233 }, { 10, 25, .0143 },
    };

    [Theory, MemberData(nameof(PublishedUpperTails))]
    public void UpperTail_WithoutTies_IsThePublishedOne(int count, int score, double expected) =>
        Assert.Equal(expected, KendallScores.UpperTail(Single(count), score), 4);

    /// <summary>The smallest score with two-sided p at most 0.10 and 0.05 and that p: from the same tables for n ≤ 10, counted beyond.</summary>
    public static TheoryData<int, double, int, double> PublishedCriticalScores => new()
    {
        { 4, .10, 6, .083 }, { 5, .10, 8, .083 }, { 6, .10, 11, .056 }, { 7, .10, 13, .069 }, { 8, .10, 16, .061 },
        { 9, .10, 18, .075 }, { 10, .10, 21, .073 }, { 11, .10, 23, .087 }, { 12, .10, 26, .086 },
        { 5, .05, 10, .017 }, { 6, .05, 13, .017 }, { 7, .05, 15, .030 }, { 8, .05, 18, .031 },
        { 9, .05, 20, .045 }, { 10, .05, 23, .047 }, { 11, .05, 27, .041 }, { 12, .05, 30, .045 },
    };

    [Theory, MemberData(nameof(PublishedCriticalScores))]
    public void Smallest_AtATail_IsThePublishedScore(int count, double twoSided, int score, double p)
    {
        Assert.Equal(score, KendallScores.Smallest(count, twoSided / 2));
        Assert.Equal(p, 2 * KendallScores.UpperTail(Single(count), score), 3);
    }

    [Fact]
    public void Smallest_WithFourValuesAtFivePerCent_DoesNotExist() => Assert.Null(KendallScores.Smallest(4, 0.025));

    /// <summary>Every order of every small multiset, counted one by one: an independent way to the same distribution.</summary>
    public static TheoryData<int[]> Multisets => new()
    {
        new[] { 1, 1 }, new[] { 2, 1 }, new[] { 3 }, new[] { 2, 2 }, new[] { 1, 2, 1 }, new[] { 1, 1, 3 },
        new[] { 2, 2, 2 }, new[] { 1, 3, 1, 2 }, new[] { 4, 3 }, new[] { 1, 1, 1, 1, 1, 1, 1 },
    };

    [Theory, MemberData(nameof(Multisets))]
    public void UpperTail_WithTies_EqualsACountOfAllOrders(int[] groups)
    {
        var values = groups.SelectMany((size, rank) => Enumerable.Repeat((double)rank, size)).ToArray();
        var scores = Orders(values, values.Length).Select(o => MannKendall.Of(o).Score).ToList();

        Assert.All(Enumerable.Range(-25, 51), score =>
            Assert.Equal(scores.Count(s => s >= score) / (double)scores.Count, KendallScores.UpperTail(groups, score), 12));
    }

    [Fact]
    public void UpperTail_OfThirtyValues_IsStillCounted()
    {
        Assert.Equal(1, KendallScores.UpperTail(Single(30), -435));
        Assert.Equal(0.5, KendallScores.UpperTail(Single(30), 1), 12);
        Assert.Equal(1, KendallScores.UpperTail(Single(30), 435) * 2.6525285981219103e32, 12);
        Assert.Equal(0, KendallScores.UpperTail(Single(30), 436));
    }

    [Fact]
    public void UpperTail_OutsideItsRange_IsRefused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => KendallScores.UpperTail(Single(31), 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => KendallScores.UpperTail([2, 0], 0));
    }

    private static int[] Single(int count) => [.. Enumerable.Repeat(1, count)];

    private static IEnumerable<double[]> Orders(double[] values, int length)
    {
        if (length <= 1)
        {
            yield return [.. values];
            yield break;
        }

        for (var i = 0; i < length; i++)
        {
            (values[i], values[length - 1]) = (values[length - 1], values[i]);
            foreach (var order in Orders(values, length - 1))
            {
                yield return order;
            }

            (values[i], values[length - 1]) = (values[length - 1], values[i]);
        }
    }
}
