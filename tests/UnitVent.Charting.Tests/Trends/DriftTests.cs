using CsCheck;
using NodaTime;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class DriftTests
{
    /// <summary>Four values need |S| = 6, five 8 (Kendall's table); P/F must move by 15 % of its start (2.77 × 5.1 %, Chest 1983;84:14).</summary>
    public static TheoryData<double[], double[], DriftVerdict, string> BoundaryPairs => new()
    {
        { [0, 4, 8], [200, 180, 160], DriftVerdict.NotEnoughData, "three points" },
        { [0, 4, 8, 12], [200, 180, 160, 140], DriftVerdict.Drifting, "four points, all falling" },
        { [0, 1, 2, 3.99], [200, 180, 160, 140], DriftVerdict.NotEnoughData, "36 s short of four hours" },
        { [0, 1, 2, 4], [200, 180, 160, 140], DriftVerdict.Drifting, "four hours" },
        { [0, 4, 8, 12], [200, 180, 185, 140], DriftVerdict.Jump, "four points, one out of order: S = −4; the last is 24 % under the median before" },
        { [0, 4, 8, 12, 16], [200, 180, 185, 160, 140], DriftVerdict.Drifting, "five points, one out of order: S = −8" },
        { [0, 4, 8, 12, 16], [200, 180, 185, 190, 140], DriftVerdict.Jump, "five points, three out of order: S = −4; the last is 24 % under the median of 12 h" },
        { [0, 4, 8, 12], [210, 200, 190, 180], DriftVerdict.Drifting, "a fall of 30 is 15 % of the starting median 200" },
        { [0, 4, 8, 12], [210, 200.1, 190.2, 180.3], DriftVerdict.SteadySmallChange, "a fall of 29.7 is less" },
        { [0, 4, 8, 12], [180, 180, 180, 180], DriftVerdict.None, "nothing moves" },
        { [0, 4, 8, 12], [180, 200, 180, 144.1], DriftVerdict.None, "a last value just under a fifth lower" },
        { [0, 4, 8, 12], [180, 200, 180, 144], DriftVerdict.Jump, "a last value a fifth lower" },
        { [], [], DriftVerdict.NotEnoughData, "no points" },
    };

    [Theory, MemberData(nameof(BoundaryPairs))]
    public void Verdict_AtABoundary(double[] hours, double[] values, DriftVerdict expected, string reason) =>
        Assert.True(expected == Of(DriftVariables.PfRatio, hours, values).Verdict, reason);

    /// <summary>The changes that matter from a starting value on, over a series and in a step; sources as each variable names them.</summary>
    public static TheoryData<string, double, double, double> MinimumChanges => new()
    {
        { "pfRatio", 200, 30, 40 }, { "oxygenationIndex", 10, 2, 2.5 },
        { "paCO2MmHg", 60, 6, 5.6 }, { "paCO2MmHg", 40, 4, 5.6 }, { "paCO2MmHg", 30, 4, 5.6 },
        { "pH", 7.3, .04, .05 }, { "bicarbonateComputedMmolL", 24, 2.6, 2.6 }, { "standardBaseExcessMmolL", -5, 2.2, 2.2 },
        { "spO2Percent", 94, 3, 4 }, { "meanAirwayPressureCmH2O", 25, 2, 2 },
        { "releaseVolumePerKg", 6, .9, .9 }, { "releaseVolumePerKg", 8, 1, 1 },
        { "effectiveCompliance", 40, 6, 8 }, { "expiratoryTimeConstantS", 1, .2, .25 }, { "endReleaseFlowPercent", 60, 10, 10 },
        { "spontaneousSharePercent", 30, 15, 20 }, { "ventilatoryRatio", 2, .4, .5 },
    };

    [Theory, MemberData(nameof(MinimumChanges))]
    public void MinimumChange_FromAStart(string name, double start, double trend, double step)
    {
        var variable = new Chart().Picture().Drifts[name].Variable;

        Assert.Equal(trend, variable.TrendMinimum.From(start), 12);
        Assert.Equal(step, variable.StepMinimum.From(start), 12);
    }

    /// <summary>Which way is worse, quantity by quantity.</summary>
    public static TheoryData<string, double[], DriftDirection, DriftCourse> Courses => new()
    {
        { "pfRatio", [200, 180, 160, 140], DriftDirection.Down, DriftCourse.Worse },
        { "pfRatio", [140, 160, 180, 200], DriftDirection.Up, DriftCourse.Better },
        { "oxygenationIndex", [10, 12, 14, 16], DriftDirection.Up, DriftCourse.Worse },
        { "paCO2MmHg", [40, 44, 48, 52], DriftDirection.Up, DriftCourse.Worse },
        { "pH", [7.40, 7.36, 7.32, 7.28], DriftDirection.Down, DriftCourse.Worse },
        { "pH", [7.20, 7.24, 7.28, 7.32], DriftDirection.Up, DriftCourse.Better },
        { "pH", [7.42, 7.46, 7.50, 7.54], DriftDirection.Up, DriftCourse.Worse },
        { "pH", [7.30, 7.34, 7.38, 7.44], DriftDirection.Up, DriftCourse.Better },
        { "standardBaseExcessMmolL", [-2, -4, -6, -8], DriftDirection.Down, DriftCourse.Either },
        { "spO2Percent", [96, 94, 92, 90], DriftDirection.Down, DriftCourse.Worse },
        { "spO2Percent", [94, 94, 95, 94], DriftDirection.Level, DriftCourse.Level },
        { "ventilatoryRatio", [1, 1.2, 1.4, 1.6], DriftDirection.Up, DriftCourse.Worse },
    };

    [Theory, MemberData(nameof(Courses))]
    public void Course_FollowsTheSenseOfTheQuantity(string name, double[] values, DriftDirection direction, DriftCourse course)
    {
        var drift = Of(new Chart().Picture().Drifts[name].Variable, [0, 4, 8, 12], values);

        Assert.Equal((direction, course), (drift.Direction, drift.Course));
    }

    [Fact]
    public void Drift_CarriesItsNumbers()
    {
        var drift = Of(DriftVariables.PfRatio, [0, 4, 7.5, 12, 16, 22], [212, 205, 198, 186, 180, 166]);

        Assert.Equal((6, Duration.FromHours(22), 212, 166, 205), (drift.Count, drift.Span, drift.Points[0].Value, drift.Points[^1].Value, drift.StartMedian));
        Assert.Equal(-2.0909, drift.Line!.SlopePerHour, 4);
        Assert.Equal(-2.0909 * 22, drift.Change!.Value, 2);
        Assert.Equal((-15, DriftConfidence.Moderate, false), (drift.Trend!.Score, drift.Confidence, drift.Line.IsRange));
    }

    [Fact]
    public void Drift_WithoutEnoughData_HasCountAndNoNumbers()
    {
        var drift = Of(DriftVariables.PfRatio, [0, 4, 8], [200, 180, 160]);

        Assert.Equal((3, Duration.FromHours(8)), (drift.Count, drift.Span));
        Assert.Equal<object?>([null, null, null, null, null], [drift.Line, drift.Trend, drift.Change, drift.StartMedian, drift.Confidence]);
        Assert.Equal((DriftDirection.Level, DriftCourse.Level), (drift.Direction, drift.Course));
    }

    [Theory]
    [InlineData(4, DriftConfidence.Early)]
    [InlineData(5, DriftConfidence.Early)]
    [InlineData(6, DriftConfidence.Moderate)]
    [InlineData(8, DriftConfidence.Moderate)]
    [InlineData(9, DriftConfidence.Firm)]
    public void Confidence_GrowsWithThePoints(int count, DriftConfidence expected)
    {
        double[] hours = [.. Enumerable.Range(0, count).Select(i => 4.0 * i)];

        Assert.Equal(expected, Of(DriftVariables.PfRatio, hours, hours).Confidence);
    }

    [Fact]
    public void Repeats_WithinHalfAnHour_GiveWayToTheLatest()
    {
        var drift = Of(DriftVariables.PfRatio, [10, 8, 0, 0.4, 0.8, 4, 4.5, 8], [150, 170, 200, 1, 190, 180, 175, 160]);

        Assert.Equal([200, 190, 180, 175, 160, 150], drift.Points.Select(p => p.Value));
    }

    public static TheoryData<string, double, double[], bool, string> Returns => new()
    {
        { "pfRatio", 200, [200, 170, 184, 185], false, "one of the two is more than 7.5 % below" },
        { "pfRatio", 200, [200, 170, 185, 185], true, "both are within 7.5 %" },
        { "pfRatio", 200, [200, 170, 230, 240], true, "better than the start is inside" },
        { "pfRatio", 200, [200], false, "one value does not clear" },
        { "paCO2MmHg", 40, [40, 50, 42, 42], true, "half of 4 mmHg above" },
        { "paCO2MmHg", 40, [40, 50, 42, 42.1], false, "more than half" },
        { "pH", 7.40, [7.40, 7.30, 7.38, 7.42], true, "0.02 to either side" },
        { "pH", 7.40, [7.40, 7.30, 7.38, 7.43], false, "0.03 to the other side" },
        { "standardBaseExcessMmolL", 0, [0, -4, -1.1, 1.1], true, "half of 2.2 to either side" },
        { "standardBaseExcessMmolL", 0, [0, -4, -1.1, 1.2], false, "beyond it" },
    };

    [Theory, MemberData(nameof(Returns))]
    public void BackInside_TakesTheLastTwo(string name, double start, double[] values, bool expected, string reason)
    {
        var drift = Of(new Chart().Picture().Drifts[name].Variable, [.. values.Select((_, i) => 4.0 * i)], values);

        Assert.True(expected == drift.IsBackInside(start), reason);
    }

    [Fact]
    public void Verdict_ShiftedInTime_IsTheSame() => Gen.Select(Gen.Int[30, 400].Array[3, 12], Gen.Int[40, 400].Array[12], Gen.Int[-9999, 9999]).Sample((steps, values, minutes) =>
    {
        var hours = steps.Aggregate(new List<double> { 0 }, (list, step) => [.. list, list[^1] + step / 60.0]);
        var drift = Of(DriftVariables.PfRatio, [.. hours], [.. values.Take(hours.Count).Select(v => (double)v)]);
        var moved = Drift.Of(drift.Points.Select(p => p with { At = p.At + Duration.FromMinutes(minutes) }), DriftVariables.PfRatio);

        Assert.Equal((drift.Verdict, drift.Course, drift.Trend), (moved.Verdict, moved.Course, moved.Trend));
        Assert.True(drift.Verdict != DriftVerdict.Drifting || Math.Abs(drift.Change!.Value) >= 0.15 * drift.StartMedian - 1e-9);
        Assert.True(drift.Verdict is DriftVerdict.NotEnoughData || drift.Trend!.P <= Drift.Level == drift.Verdict is not (DriftVerdict.None or DriftVerdict.Jump));
    });

    internal static Drift Of(DriftVariable variable, double[] hours, double[] values) =>
        Drift.Of(hours.Zip(values, (hour, value) => new SeriesPoint(Chart.Now + Duration.FromMinutes(60 * hour), value)), variable);
}
