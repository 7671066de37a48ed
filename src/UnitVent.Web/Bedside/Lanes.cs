using NodaTime;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Timelines;

namespace UnitVent.Web.Bedside;

/// <summary>The lanes of the timeline as plain data for the drawing module. Times are those of the unit's clocks.</summary>
public static class Lanes
{
    private static readonly Duration Gap = Duration.FromHours(12);

    /// <summary>The series of the lanes, by name, in the order of the table's columns.</summary>
    public static IReadOnlyList<string> Series { get; } =
    [
        "pHighCmH2O", "pLowCmH2O", "peepCmH2O", ValueNames.MeanAirwayPressureComputed, ValueNames.MeanAirwayPressureMeasured, ValueNames.PfRatio, ValueNames.EndReleaseFlowPercent,
    ];

    public static object Of(Timeline timeline, DateTimeZone zone)
    {
        var drawn = new Drawing(timeline, zone);
        return new
        {
            from = drawn.X(timeline.From),
            to = drawn.X(timeline.To),
            marks = timeline.Marks.Select(m => new { at = drawn.X(m.At), text = m.Text }),
            lanes = new object[]
            {
                new
                {
                    title = "Pressures, cmH2O", hue = "pressure", low = 0, high = (int?)null, levels = Array.Empty<int>(),
                    lines = new[]
                    {
                        drawn.Line("pHighCmH2O", "P high", "solid"), drawn.Line("pLowCmH2O", "P low", "solid"), drawn.Line("peepCmH2O", "PEEP", "solid"),
                        drawn.Line(ValueNames.MeanAirwayPressureComputed, "mean, computed", "dashed"),
                        drawn.Line(ValueNames.MeanAirwayPressureMeasured, "mean, measured", "solid", alone: true, marker: "emptyDiamond"),
                    },
                },
                new { title = "P/F, mmHg", hue = "oxygen", low = 0, high = (int?)null, levels = Array.Empty<int>(), lines = new[] { drawn.Line(ValueNames.PfRatio, "P/F", "solid", marker: "circle") } },
                new
                {
                    title = "End-release flow, % of peak", hue = "flow", low = 0, high = (int?)100, levels = new[] { 25, 50, 75 },
                    lines = new[] { drawn.Line(ValueNames.EndReleaseFlowPercent, "end of release, %", "solid", marker: "emptyCircle") },
                },
            },
        };
    }

    private sealed class Drawing(Timeline timeline, DateTimeZone zone)
    {
        /// <summary>Milliseconds of the unit's own clock, as if it were UTC.</summary>
        public long X(Instant at) => at.ToUnixTimeMilliseconds() + zone.GetUtcOffset(at).Milliseconds;

        public object Line(string name, string label, string dash, bool alone = false, string marker = "circle")
        {
            var series = timeline.Series.FirstOrDefault(s => s.Name == name);
            return new { name = label, dash, alone, marker, stepped = series?.Stepped == true, points = series is null ? [] : Points(series).ToArray() };
        }

        private IEnumerable<object?[]> Points(TimelineSeries series)
        {
            for (var i = 0; i < series.Points.Count; i++)
            {
                var point = series.Points[i];
                if (!series.Stepped && i > 0 && point.At - series.Points[i - 1].At > Gap)
                {
                    yield return [X(point.At) - 1, null];
                }

                yield return [X(point.At), Rounded(point.Value)];
            }

            if (series is { Stepped: true, Points: [.., var last] })
            {
                yield return [X(timeline.To), Rounded(last.Value)];
            }
        }

        private static double? Rounded(double? value) => value is { } known ? Math.Round(known, 1) : null;
    }
}
