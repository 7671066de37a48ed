using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Web.Charting;

namespace UnitVent.Web.Tests.Screens;

public sealed class ChartingSessionTests
{
    [Fact]
    public void Retry_AfterTheStoreDidNotAnswer_IsTheSameEntryAtTheSameTime()
    {
        var session = new ChartingSession(ScreenChart.Picture(), ChartingTask.Of(EntryKind.Note));
        session.Forms[0]["text"].Text = "Turned";
        var first = session.Begin(ScreenChart.Now)!.Single();
        session.Refuse(Refusal.Unavailable, [new("", "store.unavailable", "The store did not answer.")]);

        var second = session.Begin(ScreenChart.Now + Duration.FromMinutes(9))!.Single();

        Assert.Equal((first.Id, first.Body), (second.Id, second.Body));
        Assert.Equal("Turned", session.Forms[0]["text"].Text);
    }

    [Fact]
    public void Retry_AfterARefusal_TakesTheTimeOfTheNextAttempt()
    {
        var session = new ChartingSession(ScreenChart.Picture(), ChartingTask.Of(EntryKind.Note));
        session.Forms[0]["text"].Text = "Turned";
        session.Begin(ScreenChart.Now);
        session.Refuse(Refusal.Value, [new("text", "limit.length", "Too long.")]);

        var later = ScreenChart.Now + Duration.FromMinutes(9);

        Assert.Equal(later, session.Begin(later)!.Single().Body.EffectiveAt());
    }

    [Fact]
    public void Pass_WithSettingsSeenAndABreathingCheck_SendsTwoEntriesAndNoSettings()
    {
        var session = new ChartingSession(ScreenChart.Picture(ScreenChart.Aprv(300)), ChartingTask.Pass) { SettingsUnchanged = true };
        session.Forms.Single(f => f.Kind == EntryKind.BreathingCheck)["rass"].Text = "-2";
        session.Forms[0]["observedAt"].Text = "13:50";

        var entries = session.Begin(ScreenChart.Now)!;

        Assert.Equal([EntryKind.VentilatorCheck, EntryKind.BreathingCheck], entries.Select(e => e.Body.Kind));
        Assert.True(((VentilatorCheck)entries[0].Body).SettingsConfirmed);
        Assert.All(entries, e => Assert.Equal(ScreenChart.Ago(15), e.Body.EffectiveAt()));
    }

    [Fact]
    public void Pass_InWhichNobodyLookedAtTheSettings_ConfirmsNothing()
    {
        var session = new ChartingSession(ScreenChart.Picture(ScreenChart.Aprv(300)), ChartingTask.Pass);
        session.Forms[0]["peakPressureCmH2O"].Text = "30";

        Assert.Null(((VentilatorCheck)session.Begin(ScreenChart.Now)!.Single().Body).SettingsConfirmed);
    }

    [Fact]
    public void Pass_WithNothingTyped_IsNotSent()
    {
        var session = new ChartingSession(ScreenChart.Picture(ScreenChart.Aprv(300)), ChartingTask.Pass);

        Assert.Null(session.Begin(ScreenChart.Now));
        Assert.Equal(SaveState.Refused, session.State);
        Assert.Single(session.General);
    }

    [Fact]
    public void Refusal_OfOneEntryOfAPass_StandsAtItsOwnField()
    {
        var session = new ChartingSession(ScreenChart.Picture(ScreenChart.Aprv(300)), ChartingTask.Pass) { SettingsUnchanged = true };
        session.Forms.Single(f => f.Kind == EntryKind.BreathingCheck)["spO2Percent"].Text = "30";
        session.Begin(ScreenChart.Now);

        session.Refuse(Refusal.Value, [new("entries[1].spO2Percent", "limit", "SpO2 30 % is outside 40–100 %; check the entry.")]);

        var (form, field, _) = session.Problems.Single();
        Assert.Equal((EntryKind.BreathingCheck, "spO2Percent"), (form.Kind, field.Field.Name));
    }

    [Fact]
    public void NumbersThatFollow_FromATypedGas_AreThoseOfThePicture()
    {
        var session = new ChartingSession(ScreenChart.Picture(ScreenChart.Aprv(300)), ChartingTask.Of(EntryKind.BloodGas));
        var form = session.Forms[0];
        (form["specimen"].Text, form["pH"].Text, form["pCO2"].Text, form["pO2"].Text) = ("arterial", "7.35", "48", "71");

        var follows = NumbersThatFollow.Of(session.Picture, session.Readable(ScreenChart.Now), ScreenChart.Now);

        Assert.Contains("P/F 142", follows); // 71 ÷ 0.5
    }
}
