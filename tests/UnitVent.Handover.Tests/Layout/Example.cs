using NodaTime;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Layout.Fonts;
using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Tests.Layout;

/// <summary>Small documents for the tests of the layout.</summary>
internal static class Example
{
    public static readonly Instant Morning = Instant.FromUtc(2026, 11, 30, 6, 0);

    public static PageFrame Frame { get; } =
        new("Bed 4 · Anna Example", "MRN 12345 · born 3 March 1961", "Unit North\nHandover", ["From charting, not monitoring.", "Printed 06:00"]);

    public static SheetDocument Document(params Block[] blocks) => new("Handover, bed 4", Paper.A4, Morning, [new SheetSection("Bed 4", Frame, blocks)]);

    public static PrintedSheet Print(params Block[] blocks) => Print(Document(blocks));

    public static PrintedSheet Print(SheetDocument document) => PrintedSheet.Read(SheetWriter.Write(document, SystemFonts.Installed));

    public static Table LongTable(int rows) => new(
        [new("Bed", Align.Right), new("Band"), new("Why", Share: 1)],
        [.. Enumerable.Range(1, rows).Select(i => Row.Of(
            $"{i}", new Cell("Look now", Mark: Mark.FilledSquare), $"reason{i} {string.Join(' ', Enumerable.Repeat($"again{i}", 30))} end{i}"))]);

    public static TrendStrip Strip(params TrendPoint[] points) => new(
        "P/F falls from 190 to 158 in 22 hours.",
        new Interval(Morning, Morning + Duration.FromHours(24)),
        [new TimeTick(Morning, "06:00"), new TimeTick(Morning + Duration.FromHours(24), "06:00")],
        [Morning + Duration.FromHours(3)],
        [new TrendLane("P/F, mmHg", LaneStyle.Line, points, "158"),
         new TrendLane("Mean pressure, cmH2O", LaneStyle.Step, [new(Morning, 22), new(Morning + Duration.FromHours(3), 25)], "25")]);
}
