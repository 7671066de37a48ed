using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Timelines;

namespace UnitVent.Charting.Tests.Timelines;

public sealed class TimelineTests
{
    [Fact]
    public void Settings_CarryTheValueInForceBeforeTheRange()
    {
        var line = Series(new Chart().With(Chart.Aprv(900), Chart.Aprv(100, high: 26)), "pHighCmH2O");

        Assert.Equal([28, 26], line.Points.Select(p => p.Value!.Value));
        Assert.True(line.Stepped);
    }

    [Fact]
    public void Gas_WithoutItsPf_IsAGapNotAZero()
    {
        var line = Series(new Chart().With(Chart.Gas(100, fiO2: null), Chart.Gas(50)), ValueNames.PfRatio);

        Assert.Equal([null, 150], line.Points.Select(p => p.Value));
    }

    [Fact]
    public void Marks_SayWhatChanged()
    {
        var chart = new Chart().With(Chart.Aprv(900), Chart.Aprv(100, high: 26, tHigh: 5.5m), new BedsideEvent { At = Chart.Ago(50), What = EventKind.BreathingTrialStart });

        var marks = Timeline.Of(chart.Window(), Chart.Ago(600), Chart.Now).Marks;

        Assert.Equal(["P high 28 → 26 cmH2O, T high 4.5 → 5.5 s", "breathing trial start"], marks.Select(m => m.Text));
    }

    private static TimelineSeries Series(Chart chart, string name) =>
        Timeline.Of(chart.Window(), Chart.Ago(600), Chart.Now).Series.Single(s => s.Name == name);
}
