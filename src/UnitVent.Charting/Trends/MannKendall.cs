using MathNet.Numerics.Distributions;

namespace UnitVent.Charting.Trends;

/// <summary>Whether values rise or fall in the order in which they came: Kendall's score against time, and how likely it is by chance.</summary>
/// <remarks>
/// <para>S = Σ sign(yⱼ − yᵢ) over all pairs j &gt; i. Up to 30 values the two-sided probability is exact, ties included (<see cref="KendallScores"/>);
/// beyond, it is that of the normal law with z = (|S| − 1) ÷ √Var and Var = [n(n − 1)(2n + 5) − Σ t(t − 1)(2t + 5)] ÷ 18, t the sizes of the groups of equal values.</para>
/// <para>Source: Mann HB. Econometrica 1945;13:245-259. Kendall MG. Biometrika 1938;30:81-93. The variance with ties: Kendall MG. Rank Correlation Methods, 1948 [all from memory].</para>
/// </remarks>
/// <param name="Score">S, in [−n(n − 1) ÷ 2, n(n − 1) ÷ 2]; above zero when the values rise.</param>
/// <param name="Variance">The variance of S under chance, zero or more.</param>
/// <param name="P">The two-sided probability of a score at least as far from zero by chance, in [0, 1].</param>
public sealed record MannKendall(int Score, double Variance, double P)
{
    /// <summary>The test of values in order of time. Fewer than two values, or equal ones, say nothing: S = 0, p = 1.</summary>
    /// <param name="values">The values, oldest first, at times of their own.</param>
    /// <exception cref="ArgumentOutOfRangeException">A value is not finite.</exception>
    public static MannKendall Of(ReadOnlySpan<double> values)
    {
        Finite.Ensure(values);
        var groups = Groups(values);
        var (score, variance) = (ScoreOf(values), VarianceOf(values.Length, groups));
        var p = score == 0 ? 1
            : values.Length <= KendallScores.MostValues ? 2 * KendallScores.UpperTail(groups, Math.Abs(score))
            : 2 * Normal.CDF(0, 1, (1 - Math.Abs(score)) / Math.Sqrt(variance));
        return new(score, variance, Math.Min(1, p));
    }

    private static int ScoreOf(ReadOnlySpan<double> values)
    {
        var score = 0;
        for (var i = 0; i < values.Length; i++)
        {
            foreach (var later in values[(i + 1)..])
            {
                score += later.CompareTo(values[i]);
            }
        }

        return score;
    }

    private static double VarianceOf(int count, List<int> groups)
    {
        return (Term(count) - groups.Sum(Term)) / 18;

        static double Term(int n) => (double)n * (n - 1) * (2 * n + 5);
    }

    private static List<int> Groups(ReadOnlySpan<double> values)
    {
        var sorted = values.ToArray();
        Array.Sort(sorted);
        List<int> groups = [];
        for (var i = 0; i < sorted.Length; i++)
        {
            if (i > 0 && sorted[i] == sorted[i - 1])
            {
                groups[^1]++;
            }
            else
            {
                groups.Add(1);
            }
        }

        return groups;
    }
}
