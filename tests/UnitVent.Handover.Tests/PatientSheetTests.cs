using System.Text.RegularExpressions;
using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Rules;

namespace UnitVent.Handover.Tests;

public sealed class PatientSheetTests
{
    private static readonly SheetInput Flagged = ExampleChart.Full with
    {
        OpenFlags = [ExampleChart.OpenFlag(
            Severity.Caution,
            "P/F 190 → 158 in 12 h",
            new Acknowledgement(ExampleChart.Ago(1), "C. Charge", "Gas at 16:00", ExampleChart.Ago(-1), null, null))],
    };

    [Theory, InlineData(Paper.A4), InlineData(Paper.Letter)]
    public void FullChart_StaysInsideItsMarginsOverlapsNowhereAndTakesTwoSidesAtMost(Paper paper)
    {
        var sheet = Print(Flagged, paper);

        SheetAssert.IsInsideMargins(sheet);
        SheetAssert.HasNoOverlaps(sheet);
        SheetAssert.HasNoSmallText(sheet);
        Assert.InRange(sheet.Pages.Count, 1, 2);
    }

    [Fact]
    public void FullChart_FitsOneSideOfA4WithAtMost80Kilobytes()
    {
        var bytes = PatientSheet.Render(Flagged, Paper.A4);

        Assert.Single(PrintedSheet.Read(bytes).Pages);
        Assert.InRange(bytes.Length, 1, 80 * 1024);
    }

    [Fact]
    public void EveryPage_CarriesTwoIdentifiersBedCautionsAndTheDemonstrationMark()
    {
        var note = new Note { At = ExampleChart.Ago(1), Text = string.Join(' ', Enumerable.Repeat("note", 1500)) };
        var crowded = ExampleChart.Input(ExampleChart.Window([.. ExampleChart.Entries(), note]));

        var sheet = Print(crowded);

        Assert.True(sheet.Pages.Count > 1);
        Assert.All(sheet.Pages, (page, i) =>
        {
            Assert.Contains("Bed 4 · Żółć-Example, Anna", page.Text);
            Assert.Contains("MRN 000123 · born 3 Mar 1961, 65 years · female", page.Text);
            Assert.Contains("From charting, not monitoring. Observations only, not orders; local protocol and the responsible clinician decide.", page.Text);
            Assert.Contains("Printed Mon 30 Nov 14:05 by R. Therapist · data as of Mon 30 Nov 14:05 · valid until next check", page.Text);
            Assert.Contains($"Page {i + 1} of {sheet.Pages.Count}", page.Text);
            Assert.Contains("DEMONSTRATION", page.TurnedText);
        });
    }

    [Fact]
    public void Gases_AreTheLastFourArterialOnesEachWithFiO2PressureAndPosition()
    {
        var lines = Print(ExampleChart.Full).Pages[0].Lines;
        var newest = ExampleChart.Full.Now.Gases[^1].Values;
        var pf = newest[ValueNames.PfRatio].Value!.Value.ToString("F0", null);
        var mean = newest[ValueNames.MeanAirwayPressureComputed].Value!.Value.ToString("0.#", null);

        Assert.Contains($"12:05 7.35 48 79 1.8 0.5 {pf} {mean} not prone", lines);
        Assert.Contains("Sun 29 Nov 12:05 7.31 54 84 1.8 0.55 153 25.3 prone", lines);
        Assert.Equal(4, lines.Count(line => line.Contains("prone", StringComparison.Ordinal) && line.Contains("7.", StringComparison.Ordinal)));
        Assert.DoesNotContain(lines, line => line.Contains("7.28 61", StringComparison.Ordinal));
    }

    [Fact]
    public void Gas_WithoutOxygenFraction_SaysWhyThereIsNoRatio()
    {
        var gas = new BloodGas
        {
            DrawnAt = ExampleChart.Ago(1),
            Specimen = Specimen.Arterial,
            TensionUnit = TensionUnit.KPa,
            PH = 7.30m,
            PCO2 = 6.4m,
            PO2 = 10.1m,
        };

        var sheet = Print(ExampleChart.Input(ExampleChart.Window([gas])));

        Assert.Contains("kPa", sheet.Text);
        Assert.Contains("13:05 7.30 6.4 10.1 – – – – not prone", sheet.Pages[0].Lines);
        Assert.Contains("P/F at 13:05: Needs FiO2.", sheet.Text);
    }

    [Fact]
    public void Settings_StandBesideThoseOf24HoursAgo()
    {
        var lines = Print(ExampleChart.Full).Pages[0].Lines;

        Assert.Contains("Now APRV 0.5 26 0 5.5 0.55 Time On, 100 %", lines);
        Assert.Contains("24 h ago same 0.55 28 same 5.2 same same same", lines);
        Assert.Contains("Settings in force since 07:05, R. Therapist · last confirmed 12:35", lines);
    }

    [Fact]
    public void Settings_UnconfirmedForTwelveHours_SaySo()
    {
        var old = ExampleChart.Entries().OfType<SettingChange>().First();

        Assert.Contains("NOT CONFIRMED FOR 2 d 2 h", Print(ExampleChart.Input(ExampleChart.Window([old]))).Text);
    }

    [Fact]
    public void DifficultAirway_StandsFirstUnderAirway()
    {
        var text = Print(ExampleChart.Full).Text;

        Assert.Contains("DIFFICULT AIRWAY. Two attempts, video", text);
        Assert.True(text.IndexOf("DIFFICULT", StringComparison.Ordinal) < text.IndexOf("Oral tube, 7.5 mm, at 22 cm", StringComparison.Ordinal));
        Assert.Contains("Not recorded as difficult.", Print(ExampleChart.Empty).Text);
    }

    [Fact]
    public void OpenCards_CarryAgeOwnerAndPlan()
    {
        var text = Print(Flagged).Text;

        Assert.Contains("Open cards Look this hour · as of 14:05", text);
        Assert.Contains("P/F 190 → 158 in 12 h · 12:05 2 h C. Charge: Gas at 16:00,", text);
        Assert.Contains("15:05", text);
    }

    [Fact]
    public void Numbers_AreThoseOfThePicture()
    {
        var (text, now) = (Print(ExampleChart.Full).Text, ExampleChart.Full.Now);

        Assert.Contains($"PBW {now[ValueNames.PredictedBodyWeightKg].Value:0.#} kg", text);
        Assert.Contains($"{now[ValueNames.ReleaseVolumePerKg].Value:0.#} mL/kg", text);
        Assert.Contains($"{now[ValueNames.EndReleaseFlowPercent].Value:0} %", text);
        Assert.Contains($"Time constant, estimate {now[ValueNames.ExpiratoryTimeConstantS].Value:0.##} s", text);
        Assert.Contains($"Own share of ventilation {now[ValueNames.SpontaneousSharePercent].Value:0} %", text);
    }

    [Fact]
    public void Workings_WhereThePageHasRoom_AreThoseOfTheScreen()
    {
        var roomy = ExampleChart.Input(ExampleChart.Window([.. ExampleChart.Entries().Where(e => e is SettingChange or VentilatorCheck)]));

        var text = Regex.Replace(Print(roomy).Text, @"\s+", " ");

        Assert.Contains("How the numbers were made", text);
        Assert.Contains(roomy.Now[ValueNames.ExpiratoryTimeConstantS].Working!, text);
    }

    [Fact]
    public void Targets_FollowUpsAndNotes_AreThere()
    {
        var text = Print(ExampleChart.Full).Text;

        Assert.Contains("SpO2 90 to 95 % · PaCO2 40 to 60 mmHg", text);
        Assert.Contains("pH not", text);
        Assert.Contains("7.20", text);
        Assert.Contains("13:05, overdue physician Chest film looked at", text);
        Assert.Contains("If saturation stays below 88 %", text);
        Assert.Contains("Read back by the one who takes over", text);
    }

    [Fact]
    public void EmptyChart_SaysWhatIsMissingPartByPart()
    {
        var text = Print(ExampleChart.Empty).Text;

        Assert.All(
            [
                "not set this shift", "No settings charted.", "No arterial gas charted.", "No airway check charted.",
                "No targets set.", "None open.", "No note written.", "Compliance, estimate not known. Needs",
            ],
            sentence => Assert.Contains(sentence, text));
    }

    [Fact]
    public void ConventionalMode_ShowsItsOwnSettingsAndMechanics()
    {
        var settings = new SettingChange
        {
            ChangedAt = ExampleChart.Ago(3),
            Mode = VentilationMode.VolumeControl,
            TidalVolumeMl = 380,
            SetRatePerMin = 20,
            PeepCmH2O = 10,
            FiO2 = 0.4m,
        };

        var text = Print(ExampleChart.Input(ExampleChart.Window([settings]))).Text;

        Assert.Contains("Now Volume control", text);
        Assert.Contains("Driving pressure", text);
        Assert.DoesNotContain("End-release flow", text);
        Assert.Contains("24 h ago none charted", text);
    }

    [Fact]
    public void SeveralPatients_StandOnPagesOfTheirOwnWithTheirOwnNumbers()
    {
        var sheet = PrintedSheet.Read(PatientSheet.Render([ExampleChart.Empty, ExampleChart.Empty], Paper.A4));

        Assert.Equal(2, sheet.Pages.Count);
        Assert.All(sheet.Pages, page => Assert.Contains("Page 1 of 1", page.Text));
    }

    [Fact]
    public void NoPatient_IsRefused() => Assert.Throws<ArgumentOutOfRangeException>(() => PatientSheet.Render([], Paper.A4));

    [Fact]
    public void Title_NamesTheBedAndNotThePatient() => Assert.Equal("Handover, bed 4", Print(ExampleChart.Empty).Document.Information.Title);

    [Fact]
    public void Times_AroundAClockChange_AreThoseOfTheUnit()
    {
        // 25 October 2026, Europe/Vienna: 01:30 UTC is 02:30 for the second time.
        var now = Instant.FromUtc(2026, 10, 25, 1, 30);
        var input = new SheetInput(PatientPicture.At(ExampleChart.Window([]), now), now, "R. Therapist");

        Assert.Contains("Printed Sun 25 Oct 02:30 by", Print(input).Text);
    }

    private static PrintedSheet Print(SheetInput input, Paper paper = Paper.A4) => PrintedSheet.Read(PatientSheet.Render(input, paper));
}
