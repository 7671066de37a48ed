using MathNet.Numerics;

namespace UnitVent.Charting.Trends;

/// <summary>How Kendall's score is distributed when the order of the values means nothing: the exact null distribution, ties included.</summary>
/// <remarks>
/// <para>The number of orders of n values with I inversions is the coefficient of qᴵ in ∏(1 − qⁱ), i = 1…n, over ∏(1 − qʲ), j = 1…t of each group of t
/// equal values: the q-factorial without ties, the q-multinomial with them. The score is the number of unequal pairs less 2 I.</para>
/// <para>Source: Kendall MG. Biometrika 1938;30:81-93 (without ties); the q-multinomial counts inversions of a multiset (MacMahon PA. Proc London
/// Math Soc 1917;s2-15:314-321) [from memory].</para>
/// <para>Counted in whole numbers of 128 bits, which hold 30! with room to spare; beyond 30 values the normal law is as good.</para>
/// </remarks>
public static class KendallScores
{
    /// <summary>The most values for which the distribution is counted.</summary>
    public const int MostValues = 30;

    /// <summary>The probability that the score is at least as large as one.</summary>
    /// <param name="groups">How many values are equal, one number a group: five values without ties are 1, 1, 1, 1, 1. At most 30 values.</param>
    /// <param name="score">The score; any whole number.</param>
    /// <returns>A probability in [0, 1]; 0 beyond the largest score.</returns>
    /// <exception cref="ArgumentOutOfRangeException">A group is empty, or there are more than 30 values.</exception>
    public static double UpperTail(IReadOnlyList<int> groups, int score)
    {
        ArgumentNullException.ThrowIfNull(groups);
        foreach (var size in groups)
        {
            ArgumentOutOfRangeException.ThrowIfLessThan(size, 1, nameof(groups));
        }

        var count = groups.Sum();
        ArgumentOutOfRangeException.ThrowIfGreaterThan(count, MostValues, nameof(groups));
        var pairs = Pairs(count) - groups.Sum(Pairs);
        var mostInversions = (int)Math.Floor((pairs - score) / 2.0);
        return mostInversions < 0 ? 0
            : mostInversions >= pairs ? 1
            : Orders(count, groups, mostInversions).Sum(orders => (double)orders) / AllOrders(count, groups);
    }

    /// <summary>The smallest score whose upper tail is no larger than a probability; null when even that of the largest score is larger.</summary>
    /// <param name="count">How many values there are, none of them equal, 0…30.</param>
    /// <param name="tail">The probability, in (0, 0.5].</param>
    /// <exception cref="ArgumentOutOfRangeException">There are more than 30 values, or the probability is outside its range.</exception>
    public static int? Smallest(int count, double tail)
    {
        ArgumentOutOfRangeException.ThrowIfGreaterThan(count, MostValues);
        ArgumentOutOfRangeException.ThrowIfNegativeOrZero(tail);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(tail, 0.5);
        int[] groups = [.. Enumerable.Repeat(1, count)];
        var within = tail * AllOrders(count, groups);
        int? smallest = null;
        var upTo = 0.0;
        foreach (var (inversions, orders) in Orders(count, groups, Pairs(count) / 2).Index())
        {
            upTo += (double)orders;
            if (upTo > within)
            {
                break;
            }

            smallest = Pairs(count) - 2 * inversions;
        }

        return smallest;
    }

    private static int Pairs(int count) => count * (count - 1) / 2;

    private static double AllOrders(int count, IReadOnlyList<int> groups) =>
        groups.Aggregate(SpecialFunctions.Factorial(count), (total, size) => total / SpecialFunctions.Factorial(size));

    /// <summary>How many orders have no inversion, one, two, … up to so many. Every intermediate is right modulo 2¹²⁸, and so is the end.</summary>
    private static UInt128[] Orders(int count, IReadOnlyList<int> groups, int mostInversions)
    {
        var orders = new UInt128[mostInversions + 1];
        orders[0] = 1;
        for (var i = 1; i <= count; i++)
        {
            MultiplyByOneLessPower(orders, i);
        }

        foreach (var size in groups)
        {
            for (var j = 1; j <= size; j++)
            {
                DivideByOneLessPower(orders, j);
            }
        }

        return orders;
    }

    private static void MultiplyByOneLessPower(UInt128[] orders, int power)
    {
        for (var i = orders.Length - 1; i >= power; i--)
        {
            orders[i] = unchecked(orders[i] - orders[i - power]);
        }
    }

    private static void DivideByOneLessPower(UInt128[] orders, int power)
    {
        for (var i = power; i < orders.Length; i++)
        {
            orders[i] = unchecked(orders[i] + orders[i - power]);
        }
    }
}
