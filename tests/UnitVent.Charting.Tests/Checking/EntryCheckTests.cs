using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;

namespace UnitVent.Charting.Tests.Checking;

public sealed class EntryCheckTests
{
    public static TheoryData<string, Entry, string?, string> Verdicts => new()
    {
        { "", Chart.Gas(), null, "a plain gas stands" },
        { "pO2", Chart.Gas() with { PO2 = null }, "missing", "an arterial gas needs pO2" },
        { "", Chart.Gas() with { Specimen = Specimen.Venous, PO2 = null }, null, "a venous gas does not" },
        { "specimen", Chart.Gas() with { Specimen = null }, "missing", "there is no default" },
        { "drawnAt", Chart.Gas(-3), "time.future", "3 min ahead" },
        { "", Chart.Gas(-1), null, "1 min ahead is taken as now" },
        { "drawnAt", Chart.Gas(125), "ask.drawnAt", "more than 2 h back" },
        { "", Chart.Gas(119), null, "within 2 h" },
        { "tensionUnit", Chart.Gas(pO2: 11, pCO2: 20), "ask.tensionUnit", "PaO2 under 25 mmHg looks like kPa" },
        { "fiO2", Chart.Gas(fiO2: 0.60m), "ask.fiO2", "0.10 from the setting in force" },
        { "", Chart.Gas(fiO2: 0.55m), null, "within 0.05" },
        { "bicarbonateMmolL", Chart.Gas(bicarbonate: 16), "ask.gasConsistency", "does not fit" },
        { "", Chart.Gas(bicarbonate: 16) with { BicarbonateKind = BicarbonateKind.Standard }, null, "standard bicarbonate does not enter the equation" },
        { "pLowCmH2O", Chart.Aprv(5, high: 20, low: 20), "limit.order", "P low must be below P high" },
        { "tLowS", Chart.Aprv(5, tHigh: 0.5m, tLow: 4.5m), "ask.timesSwapped", "swapped" },
        { "peepCmH2O", Chart.Aprv(5) with { PeepCmH2O = 5 }, "mode", "PEEP is no member of APRV" },
        { "tHighS", Chart.Aprv(5) with { THighS = null }, "missing", "T high is needed" },
        { "modeText", new SettingChange { ChangedAt = Chart.Ago(5), Mode = VentilationMode.Other, FiO2 = 0.4m }, "missing", "another mode is named in words" },
        { "endReleaseFlowLMin", Chart.Check(peak: 50, end: 50), "limit.order", "end must be below peak" },
        { "releaseVolumeMl", Chart.Check(release: 720), "ask.releaseVolumeMl", "more than 10 mL/kg" },
        { "spontaneousMinuteVolumeLMin", Chart.Check() with { SpontaneousMinuteVolumeLMin = 7 }, "ask.volumesSwapped", "own exceeds total" },
        { "rass", new BreathingCheck { ObservedAt = Chart.Ago(5), Rass = -2, RassNotAssessable = true }, "contradiction", "one of the two" },
        { "until", new ContextChange { Flag = Circumstance.Ards, From = Chart.Ago(5), Until = Chart.Ago(6) }, "time.order", "ends before it begins" },
        { "spO2HighPercent", new TargetSet { From = Chart.Ago(5), Reason = "r", SpO2LowPercent = 95, SpO2HighPercent = 90 }, "limit.order", "edges swapped" },
        { "reason", new TargetSet { From = Chart.Ago(5), SpO2LowPercent = 90 }, "missing", "a target needs its reason" },
        { "result", new BedsideEvent { At = Chart.Ago(5), What = EventKind.Suction, Result = TrialResult.Passed }, "contradiction", "only a trial has a result" },
        { "text", new Note { At = Chart.Ago(5), Text = " " }, "missing", "an empty note" },
        { "text", new Note { At = Chart.Ago(5), Text = new string('x', 4001) }, "limit.length", "longer than is kept" },
    };

    [Theory, MemberData(nameof(Verdicts))]
    public void Verdict_OnAnEntry_NamesFieldAndCode(string field, Entry body, string? code, string reason)
    {
        var window = new Chart().With(Chart.Aprv()).Window();

        var errors = EntryCheck.Verdict(new NewEntry(Chart.Id(99), body), window, Chart.Now);

        Assert.True(errors.Select(e => (e.Field, e.Code)).SequenceEqual(code is null ? [] : [(field, code)]), $"{reason}: {string.Join(", ", errors)}");
    }

    [Fact]
    public void Question_AnsweredWithYes_IsNotAskedAgain()
    {
        var entry = new NewEntry(Chart.Id(99), Chart.Gas(125)) { Confirmed = ["ask.drawnAt"] };

        Assert.Empty(EntryCheck.Verdict(entry, new Chart().With(Chart.Aprv()).Window(), Chart.Now));
    }

    [Fact]
    public void Refusal_CannotBeConfirmedAway()
    {
        var entry = new NewEntry(Chart.Id(99), Chart.Gas() with { PH = 9 }) { Confirmed = ["limit", "ask.pH"] };

        Assert.Equal("limit", Assert.Single(EntryCheck.Verdict(entry, new Chart().With(Chart.Aprv()).Window(), Chart.Now)).Code);
    }

    [Fact]
    public void Correction_WithoutAReason_IsRefused()
    {
        var entry = new NewEntry(Chart.Id(99), Chart.Gas()) { Corrects = Chart.Id(1) };

        Assert.Contains(EntryCheck.Verdict(entry, new Chart().With(Chart.Aprv()).Window(), Chart.Now), e => e.Field == "correctionReason");
    }

    [Theory]
    [InlineData(5, true, "5 min after a change: before or after?")]
    [InlineData(11, false, "11 min after")]
    public void Gas_SoonAfterAChange_IsAskedAbout(double minutesAfter, bool asked, string reason)
    {
        var window = new Chart().With(Chart.Aprv(600), Chart.Aprv(60)).Window();

        var errors = EntryCheck.Verdict(new NewEntry(Chart.Id(99), Chart.Gas(60 - minutesAfter)), window, Chart.Now);

        Assert.True(asked == errors.Any(e => e.Code == "ask.relativeToChange"), reason);
    }

    [Fact]
    public void Entry_AfterTheEnd_IsRefused()
    {
        var window = new Chart().With(Chart.Aprv()).Window();
        var ended = new Charting.Windows.ChartWindow(window.Episode with { EndedAt = Chart.Ago(60) }, window.Unit, window.Standing);

        Assert.Equal("time.after-end", Assert.Single(EntryCheck.Verdict(new NewEntry(Chart.Id(99), Chart.Gas(30)), ended, Chart.Now)).Code);
        Assert.Empty(EntryCheck.Verdict(new NewEntry(Chart.Id(99), Chart.Gas(90)), ended, Chart.Now));
    }
}
