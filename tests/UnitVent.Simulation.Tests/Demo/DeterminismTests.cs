using System.Text.Json;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Simulation.Tests.Demo;

public sealed class DeterminismTests
{
    [Fact]
    public void Create_Twice_GivesTheSameIdsAndEntries() => Assert.Equal(Written(Demonstration.At(Demonstration.FirstLoad)), Written(Demonstration.Unit));

    [Theory]
    [InlineData(0)]
    [InlineData(7)]
    [InlineData(59.9)]
    [InlineData(90)]
    public void Create_UntilLaterWithinFourDays_OnlyAdds(double hours)
    {
        var earlier = Written(Demonstration.At(Demonstration.Origin + Duration.FromHours(hours)));

        var until = Demonstration.Origin + Duration.FromHours(hours);
        Assert.Equal(Written(Demonstration.Unit, (_, a) => a.RecordedAt <= until), earlier);
    }

    [Theory]
    [InlineData(100, 130)]
    [InlineData(700, 703.5)]
    [InlineData(700, 790)]
    public void Create_UntilLaterThanFourDays_AgreesWhereBothLook(double firstHours, double secondHours)
    {
        var (first, second) = (Demonstration.Origin + Duration.FromHours(firstHours), Demonstration.Origin + Duration.FromHours(secondHours));
        var from = second - Duration.FromDays(4);

        var inFirst = Written(Demonstration.At(first), (_, a) => a.RecordedAt >= from);
        var inSecond = Written(Demonstration.At(second), (_, a) => a.RecordedAt >= from && a.RecordedAt <= first);

        Assert.NotEmpty(inFirst);
        Assert.Equal(inFirst, inSecond);
    }

    [Fact]
    public void Create_AfterALongGap_ChartsFourDaysAndTheSettingsThenInForce()
    {
        var until = Demonstration.Origin + Duration.FromDays(40);

        Assert.All(Demonstration.At(until).Episodes, episode =>
        {
            var old = episode.Actions.TakeWhile(a => a.RecordedAt < until - Duration.FromDays(4)).ToList();
            Assert.Equal(EntryKind.SettingChange, Assert.Single(Assert.Single(old).Entries).Body.Kind);
        });
    }

    [Fact]
    public void Create_FromAnotherOrigin_TellsTheSameStoryAtThoseTimes()
    {
        var later = Duration.FromDays(100) + Duration.FromMinutes(3);
        var moved = DemoUnit.Create(Demonstration.SeedFolder, Demonstration.Origin + later, Demonstration.FirstLoad + later);

        Assert.Equal(
            Demonstration.Unit.Entries().Select(e => (e.Action.At, (e.Entry.Body as BloodGas)?.PO2)),
            moved.Entries().Select(e => (e.Action.At - later, (e.Entry.Body as BloodGas)?.PO2)));
    }

    [Fact]
    public void Create_UntilBeforeTheOrigin_IsRefused() =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Demonstration.At(Demonstration.Origin - Duration.FromSeconds(1)));

    [Fact]
    public void Ids_InTheWholeUnit_AreDifferentAndOfVersionSeven()
    {
        var ids = Demonstration.Unit.Entries().Select(e => e.Entry.Id).Concat(Demonstration.Unit.Episodes.Select(e => e.Admission.Id)).ToList();

        Assert.Equal(ids.Count, ids.Distinct().Count());
        Assert.All(ids, id => Assert.Equal(7, id.Version));
    }

    private static List<string> Written(SimulatedUnit unit, Func<SimulatedEpisode, SimulatedAction, bool>? which = null) =>
        [.. unit.Episodes.SelectMany(episode => episode.Actions
            .Where(a => which?.Invoke(episode, a) ?? true)
            .SelectMany(a => a.Entries.Select(e =>
                $"{episode.Admission.Id} {a.At} {a.RecordedAt} {a.By} {a.Role} {e.Id} {JsonSerializer.Serialize<object>(e.Body, ChartJson.Options)} {string.Join(',', e.Confirmed)}")))];
}
