using Bunit;
using Microsoft.AspNetCore.Components;
using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;
using UnitVent.Web.Board;

namespace UnitVent.Web.Tests.Screens;

public sealed class BoardTests : BunitContext
{
    private static readonly PatientRow Urgent = ScreenChart.Row(ScreenChart.Picture("3", ScreenChart.Aprv(300), ScreenChart.Check(20)), ScreenChart.Flag(Severity.Urgent, "SpO2 84 %"));
    private static readonly PatientRow Quiet = ScreenChart.Row(ScreenChart.Picture("1", ScreenChart.Aprv(300), ScreenChart.Gas(90, 71), ScreenChart.Check(20)));

    [Fact]
    public void Table_ByBand_LeadsWithTheReason()
    {
        var table = Draw([Urgent, Quiet], walking: false);

        Assert.Equal(["Look now 1", "Nothing raised 1"], table.FindAll(".band th").Select(h => h.TextContent.Trim()));
        Assert.StartsWith("SpO2 84 %", table.Find("[data-testid=bed-3] .why").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Table_InWalkingOrder_FollowsTheBeds() =>
        Assert.Equal(["bed-1", "bed-3"], Draw([Urgent, Quiet], walking: true).FindAll("tbody.patient").Select(b => b.GetAttribute("data-testid")));

    [Fact]
    public void Row_OnAprv_ShowsSettingsInShortFormAndWhatFollows()
    {
        var row = Draw([Quiet], walking: false).Find("[data-testid=bed-1] .numbers");

        Assert.Equal("APRV 28/5 4.5/0.5", row.QuerySelector("[data-label=Settings]")!.FirstChild!.TextContent);
        Assert.Equal("0.5", Cell(row, "FiO2"));
        Assert.Equal("25.7", Cell(row, "Mean")); // (28 × 4.5 + 5 × 0.5) ÷ 5
        Assert.Equal("142", row.QuerySelector("[data-label='P/F'] .value")!.TextContent); // 71 ÷ 0.5
        Assert.Equal("55", Cell(row, "End flow")); // 33 ÷ 60
    }

    [Fact]
    public void Row_InHand_SaysWhoWhatAndUntilWhen()
    {
        var hand = new Acknowledgement(ScreenChart.Ago(5), "T. Therapist", "suction, then gas", ScreenChart.Now + NodaTime.Duration.FromMinutes(55), null, null);
        var row = ScreenChart.Row(ScreenChart.Picture("2"), ScreenChart.Flag(Severity.Urgent, "SpO2 84 %", hand));

        Assert.Equal("in hand: T. Therapist, suction, then gas, until 15:00", Draw([row], walking: false).Find(".hand").TextContent);
        Assert.Equal(Band.LookNow, row.Band);
    }

    [Fact]
    public void Table_WithNames_NeverShowsColourAlone()
    {
        var table = Draw([Urgent, Quiet], walking: true);

        Assert.Equal(["Nothing raised.", "Look now."], table.FindAll(".line > .visually-hidden").Select(s => s.TextContent));
        Assert.Equal(2, table.FindAll(".line svg.mark").Count);
    }

    public static TheoryData<string, string> Filters => new()
    {
        { "", "1,3,4" },
        { "attention", "3,4" }, // bed 4 had no gas for two days: not known is not nothing
        { "gas-due", "3,4" },
        { "aprv", "1,3" },
        { "weaning", "4" },
        { "no-such", "1,3,4" },
    };

    [Theory, MemberData(nameof(Filters))]
    public void View_WithFilterOfTheAddress_ShowsItsPatients(string show, string beds)
    {
        var weaning = ScreenChart.Row(ScreenChart.Picture(
            "4",
            new SettingChange { ChangedAt = ScreenChart.Ago(100), Mode = VentilationMode.Cpap, PeepCmH2O = 8, FiO2 = 0.3m, Phase = CoursePhase.Weaning },
            ScreenChart.Check(10)));

        var view = new BoardView([Urgent, Quiet, weaning], BoardFilter.Named(show), true, ScreenChart.Unit.Beds);

        Assert.Equal(beds, string.Join(',', view.Groups.Single().Rows.Select(r => r.Bed)));
    }

    [Fact]
    public void Sparkline_WithTwoGases_IsNotDrawn() => Assert.Null(Sparkline.Of(ScreenChart.Picture(ScreenChart.Aprv(900), ScreenChart.Gas(300, 71), ScreenChart.Gas(60, 80))));

    [Fact]
    public void Sparkline_AcrossMoreThanTwelveHours_LeavesAGap()
    {
        var line = Sparkline.Of(ScreenChart.Picture(ScreenChart.Aprv(2000), ScreenChart.Gas(1500, 71), ScreenChart.Gas(300, 80), ScreenChart.Gas(60, 75)))!.Value.Value;

        Assert.Equal(2, line.Split("class=\"line\"")[0].Split("<path d=\"")[^1].Count(c => c == 'M'));
    }

    [Fact]
    public void Direction_OfGasesCloseTogether_IsInWords()
    {
        var columns = new BoardColumns(ScreenChart.Picture(ScreenChart.Aprv(900), ScreenChart.Gas(300, 94), ScreenChart.Gas(60, 71)), ScreenChart.Now);

        Assert.Equal("down from 188 at 09:05", columns.PfDirection);
    }

    [Fact]
    public void Moves_BetweenTwoBoards_AreSaidAloudAndNothingElse()
    {
        var worse = Quiet with { Standing = Standing.Of([ScreenChart.Flag(Severity.Urgent, "SpO2 84 %")], Quiet.Picture) };

        Assert.Equal("Bed 1: Look now.", BandMoves.Between([Urgent, Quiet], [Urgent, worse]));
        Assert.Equal("", BandMoves.Between([Urgent, Quiet], [Urgent, Quiet]));
    }

    private static string Cell(AngleSharp.Dom.IElement row, string label) => row.QuerySelector($"[data-label='{label}']")!.FirstChild!.TextContent;

    private IRenderedComponent<BoardTable> Draw(IReadOnlyList<PatientRow> rows, bool walking) => Render<BoardTable>(p => p
        .Add(t => t.View, new BoardView(rows, BoardFilter.All[0], walking, ScreenChart.Unit.Beds))
        .Add(t => t.Details, (RenderFragment<PatientRow>)(_ => _ => { })));
}
