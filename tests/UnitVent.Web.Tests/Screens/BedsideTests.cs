using Bunit;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Web.Bedside;
using UnitVent.Web.Charting;

namespace UnitVent.Web.Tests.Screens;

public sealed class BedsideTests : BunitContext
{
    [Fact]
    public void Value_WhenOpened_ShowsEquationInputsAndTheirTimes()
    {
        var groups = Render<NowGroups>(p => p.Add(n => n.Picture, ScreenChart.Picture(ScreenChart.Aprv(300), ScreenChart.Gas(90, 71))).Add(n => n.Now, ScreenChart.Now));

        var working = groups.Find("[data-testid=value-pfRatio]").TextContent;

        Assert.Contains("142", working, StringComparison.Ordinal);
        Assert.Contains("equation A3", working, StringComparison.Ordinal);
        Assert.Contains("PaO2 71", working, StringComparison.Ordinal);
        Assert.Contains("12:35", working, StringComparison.Ordinal);
    }

    [Fact]
    public void Value_ThatCannotBeHad_SaysWhy()
    {
        var groups = Render<NowGroups>(p => p.Add(n => n.Picture, ScreenChart.Picture(ScreenChart.Aprv(300))).Add(n => n.Now, ScreenChart.Now));

        Assert.Contains("arterial gas", groups.Find("[data-testid=value-pfRatio] .because").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public void Phase_ThatTheChartLooksLike_IsConfirmedByAPerson()
    {
        Entry? confirmed = null;
        var panel = Render<InForcePanel>(p => p
            .Add(n => n.Picture, ScreenChart.Picture(ScreenChart.Aprv(725)))
            .Add(n => n.Now, ScreenChart.Now)
            .Add(n => n.MaySetPhase, true)
            .Add(n => n.Confirmed, entry => confirmed = entry));

        Assert.Contains("looks like maintaining: 12 h in this mode", panel.Find("[data-testid=phase-proposal]").TextContent, StringComparison.Ordinal);
        panel.Find("[data-testid=phase-proposal] button").Click();

        Assert.Equal(new PhaseChoice { Phase = CoursePhase.Maintaining, From = ScreenChart.Now, Reason = "12 h in this mode" }, confirmed);
    }

    [Fact]
    public void Words_ForEveryValueOfThePicture_AreThere()
    {
        var inHeader = new[] { ValueNames.PredictedBodyWeightKg, ValueNames.VentilatorDays };

        Assert.All(ScreenChart.Picture().Values.Keys.Except(inHeader), name => Assert.NotNull(ValueWords.Of(name)));
    }

    [Fact]
    public void Entry_InWords_NamesEveryMemberAsTyped() => Assert.Equal(
        "Arterial, pH 7.40, pCO2 45 mmHg, pO2 71 mmHg",
        EntryWords.Of(ScreenChart.Gas(30, 71), ScreenChart.Now, ScreenChart.Berlin));

    [Fact]
    public void Choices_OfEveryKind_HaveWords()
    {
        var choices = Enum.GetValues<EntryKind>().SelectMany(k => UnitVent.Charting.Fields.EntryFields.Of(EntryTypes.Of(k))).SelectMany(f => f.Choices);

        Assert.All(choices, c => Assert.Matches("^[A-Z].*|kPa|mmHg$", Words.Of(c)));
    }
}
