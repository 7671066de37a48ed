using NodaTime;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Rules;

namespace UnitVent.Simulation.Tests.Demo;

/// <summary>Where the patients stand on the board when everything is recorded as the demo records it.</summary>
public sealed class BoardTests
{
    /// <summary>R21 and R53 are what bed 3 is for; its row gains them with those rules.</summary>
    public static TheoryData<string, Band, string, string> Intended => new()
    {
        { "1", Band.LookThisHour, "R01", "released long" },
        { "2", Band.LookThisHour, "R24 R58", "oxygenation worse at equal mean pressure" },
        { "3", Band.LookThisHour, "R21 R53", "own breaths fall away" },
        { "7", Band.LookThisHour, "R14", "gas does not fit itself" },
        { "8", Band.NotKnown, "", "typed late" },
        { "4", Band.NothingRaised, "", "weaning well" },
        { "5", Band.NothingRaised, "", "pressure control" },
        { "6", Band.NothingRaised, "", "pressure support" },
        { "10", Band.NothingRaised, "", "quiet" },
        { "11", Band.NothingRaised, "", "quiet, flow-guided" },
        { "12", Band.NothingRaised, "", "quiet, tracheostomy" },
        { "14", Band.NothingRaised, "", "quiet, volume control" },
        { "15", Band.NothingRaised, "", "quiet, targets of its own" },
        { "17", Band.NothingRaised, "", "quiet, height estimated" },
    };

    [Theory, MemberData(nameof(Intended))]
    public void Board_AtFirstLoad_ShowsTheIntendedCautionAndNoOther(string bed, Band band, string cautions, string reason)
    {
        var chart = ReplayedChart.Of(Demonstration.Bed(bed), Demonstration.FirstLoad);

        Assert.True(band == chart.Standing().Band, $"{reason}: {chart.Standing()}");
        Assert.Equal(cautions, string.Join(" ", chart.Open.Where(f => f.Finding.Severity >= Severity.Caution).Select(f => f.Finding.Rule)));
    }

    /// <summary>The seed is one with which nothing is raised by chance at these ages.</summary>
    [Theory]
    [InlineData(5)]
    [InlineData(9)]
    [InlineData(30)]
    public void Board_DaysLater_StillShowsNothingAtQuietBeds(int days)
    {
        var until = Demonstration.Origin + Duration.FromDays(days);
        var unit = Demonstration.At(until);

        Assert.All(
            ["4", "5", "6", "10", "11", "12", "14", "15", "17"],
            (string bed) =>
            {
                var standing = ReplayedChart.Of(Demonstration.Bed(bed, unit), until).Standing();
                Assert.True(standing.Band == Band.NothingRaised, $"{bed}: {standing.Why}");
            });
    }

    [Fact]
    public void Board_AtAnyHourAfterFirstLoad_DoesNotKnowTheBedThatIsTypedLate() => Assert.All(Enumerable.Range(0, 24), hour =>
    {
        var until = Demonstration.FirstLoad + Duration.FromMinutes(61 * hour);

        Assert.Equal(Band.NotKnown, ReplayedChart.Of(Demonstration.Bed("8", Demonstration.At(until)), until).Standing().Band);
    });
}
