using CsCheck;

namespace UnitVent.Physiology.Tests;

/// <summary>Schoenfeld DA, Bernard GR. Crit Care Med 2002;30:1772-1777 (from memory), with a window of 48 hours unless said otherwise.</summary>
public sealed class VentilatorFreeDaysTests
{
    /// <summary>Spells as from, until, from, until … in days; day of death; free days.</summary>
    public static TheoryData<double[], double?, double, string> PublishedCourses => new()
    {
        { [0, 10], null, 18, "free from day 10, alive" },
        { [0, 6, 12, 15], null, 19, "6 days and, re-intubated, 3 days, alive" },
        { [0, 5], 20.0, 0, "dead on day 20, extubated on day 5" },
        { [0, 28], null, 0, "never free" },
        { [0, 40], null, 0, "far beyond 28 days" },
    };

    /// <summary>Around the window, day 28 and death (common practice).</summary>
    public static TheoryData<double[], double?, double, string> Edges => new()
    {
        { [0, 6, 7.99, 10], null, 18, "gap just inside the window: one spell of 10 days" },
        { [0, 6, 8, 10], null, 20, "gap of the whole window: it had counted" },
        { [0, 6, 7, 8, 9, 10], null, 18, "two gaps inside the window" },
        { [0, 27, 29, 30], null, 1, "back after day 28, the window over" },
        { [0, 27, 28.5, 30], null, 0, "back after day 28, inside the window" },
        { [0, 5, 30, 35], null, 23, "a spell that begins after day 28" },
        { [0, 0.5], null, 27.5, "half a day" },
        { [0, 5], 28.0, 0, "dead on day 28" },
        { [0, 5], 28.01, 23, "alive on day 28" },
        { [0, 5], 5.0, 0, "dead at the end of the spell" },
        { [0, 30], 30.0, 0, "dead later, never free" },
    };

    /// <summary>Spells that contradict themselves or each other.</summary>
    public static TheoryData<double[], double?, string> Impossible => new()
    {
        { [], null, "never ventilated" },
        { [0.5, 3], null, "counting does not begin with the first spell" },
        { [0, 0], null, "no length" },
        { [0, 5, 4, 6], null, "overlapping" },
        { [0, 5, 7, 6], null, "ending before it begins" },
        { [0, 5], 4.9, "dead while ventilated" },
        { [0, 5, 4, 6], 10.0, "overlapping, dead or not" },
    };

    [Theory, MemberData(nameof(PublishedCourses)), MemberData(nameof(Edges))]
    public void Compute_OfACourse_GivesItsFreeDays(double[] spells, double? death, double expected, string reason)
        => Expect.Near(expected, Compute(spells, 48, death), 1e-9, reason);

    [Theory, MemberData(nameof(Impossible))]
    public void Compute_OfAnImpossibleCourse_Refuses(double[] spells, double? death, string reason)
        => Assert.True(Record.Exception(() => Compute(spells, 48, death)) is ArgumentOutOfRangeException, reason);

    /// <summary>The windows in use, 24, 48 and 72 hours and up to 7 days, on a gap of 2 days.</summary>
    [Theory]
    [InlineData(0, 20)]
    [InlineData(24, 20)]
    [InlineData(48, 20)]
    [InlineData(72, 18)]
    [InlineData(168, 18)]
    public void Compute_WithAnotherWindow_CountsTheGapOrNot(double hours, double expected)
        => Assert.Equal(expected, Compute([0, 6, 8, 10], hours, null), 1e-9);

    [Theory]
    [InlineData(-0.1)]
    [InlineData(168.1)]
    public void Compute_WithAWindowBeyondItsLimits_Refuses(double hours) => Expect.Refused(() => Compute([0, 5], hours, null));

    [Fact]
    public void Compute_WithoutSpells_Refuses()
    {
        Assert.Throws<ArgumentNullException>(() => VentilatorFreeDays.Compute(null!, TimeSpan.FromHours(48), null));
        Expect.RefusedSaying("Parameter 'spells'", () => Compute([], 48, null));
    }

    [Fact]
    public void FreeDays_WithALongerWindow_AreNeverMore()
        => Gen.Select(Gen.Double[0.1, 10], Gen.Double[0, 5], Gen.Double[0.1, 10], Gen.Double[0, 160]).Sample((first, gap, second, hours) =>
        {
            double[] spells = [0, first, first + gap, first + gap + second];
            return Compute(spells, hours + 5, null) <= Compute(spells, hours, null) && Compute(spells, hours, null) is >= 0 and <= 28;
        });

    private static double Compute(double[] spells, double windowHours, double? death)
        => VentilatorFreeDays.Compute(
            [.. spells.Chunk(2).Select(days => new VentilatedSpell(TimeSpan.FromDays(days[0]), TimeSpan.FromDays(days[1])))],
            TimeSpan.FromHours(windowHours),
            death is { } day ? TimeSpan.FromDays(day) : null);
}
