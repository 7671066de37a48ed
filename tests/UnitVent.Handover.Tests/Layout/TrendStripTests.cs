using System.Text;
using NodaTime;
using UnitVent.Handover.Layout.Blocks;
using UnitVent.Handover.Layout.Fonts;
using UnitVent.Handover.Layout.Paging;

namespace UnitVent.Handover.Tests.Layout;

public sealed class TrendStripTests
{
    [Fact]
    public void Strip_PrintsNamesTicksAndLastValues()
    {
        var text = Example.Print(Example.Strip(At(0, 190), At(22, 158))).Text;

        Assert.Contains("P/F, mmHg", text);
        Assert.Contains("Mean pressure, cmH2O", text);
        Assert.Contains("158", text);
        Assert.Contains("06:00", text);
    }

    [Fact]
    public void Strip_WithoutValues_SaysNoLastValue() => Assert.DoesNotContain("158", Example.Print(Example.Strip()).Text);

    [Theory, InlineData(false, 1), InlineData(true, 0)]
    public void Points_WithAGapBetween_AreNotJoined(bool gap, int sloping)
    {
        var points = gap ? new[] { At(0, 190), At(11, null), At(22, 158) } : [At(0, 190), At(22, 158)];

        var sheet = Example.Print(Example.Strip(points));

        var lines = sheet.Pages[0].Page.Paths.Select(path => path.GetBoundingRectangle()).Where(box => box is { Width: > 50, Height: > 5 and < 100 });
        Assert.Equal(sloping, lines.Count());
    }

    [Fact]
    public void Strip_HasItsAlternativeText()
    {
        var pdf = SheetWriter.Write(Example.Document(Example.Strip(At(0, 190))), SystemFonts.Installed);

        Assert.Contains("P/F falls from 190 to 158 in 22 hours.", Encoding.Latin1.GetString(pdf));
    }

    [Theory]
    [InlineData(158, 190, 140, 200)]
    [InlineData(25, 25, 24, 28)]
    [InlineData(0, 0, 0, 0.1)]
    public void Scale_HoldsEveryValueBetweenRoundNumbers(double low, double high, double bottom, double top)
    {
        var scale = LaneScale.Around([low, high]);

        Assert.Equal(bottom, scale.Bottom, 1e-9);
        Assert.Equal(top, scale.Top, 1e-9);
    }

    private static TrendPoint At(int hour, double? value) => new(Example.Morning + Duration.FromHours(hour), value);
}
