using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class PatientDriftsTests
{
    private const double Hour = 60;

    private static readonly string[] AllInOrder =
    [
        "pfRatio", "oxygenationIndex", "paCO2MmHg", "pH", "bicarbonateComputedMmolL", "standardBaseExcessMmolL", "ventilatoryRatio",
        "spO2Percent", "meanAirwayPressureCmH2O", "releaseVolumePerKg", "effectiveCompliance", "expiratoryTimeConstantS", "endReleaseFlowPercent", "spontaneousSharePercent",
    ];

    [Fact]
    public void EmptyChart_HasNotEnoughDataOfAnything()
    {
        var drifts = new Chart().Picture().Drifts;

        Assert.Equal(AllInOrder, drifts.All.Select(d => d.Variable.Name));
        Assert.All(drifts.All, d => Assert.Equal((DriftVerdict.NotEnoughData, 0), (d.Verdict, d.Count)));
        Assert.Equal((Chart.Ago(24 * Hour), Chart.Now), (drifts.From, drifts.To));
        Assert.All(drifts.All, d => Assert.NotEmpty(d.Variable.Source));
        Assert.Throws<KeyNotFoundException>(() => drifts["unknown"]);
    }

    [Fact]
    public void FallingOxygenation_DriftsForTheWorse_AndTheRestStandsStill()
    {
        var drifts = Rounds([(20, 100), (16, 92), (12, 85), (8, 79), (4, 74)]).Picture().Drifts;
        var pf = drifts["pfRatio"];

        Assert.Equal((DriftVerdict.Drifting, DriftCourse.Worse, 5), (pf.Verdict, pf.Course, pf.Count));
        Assert.Equal((200, 148, Duration.FromHours(16)), (pf.Points[0].Value, pf.Points[^1].Value, pf.Span));
        Assert.Equal((DriftVerdict.Drifting, DriftCourse.Worse), (drifts["oxygenationIndex"].Verdict, drifts["oxygenationIndex"].Course));
        Assert.All(drifts.All.Where(d => d.Variable.Name is not ("pfRatio" or "oxygenationIndex")), d => Assert.Equal((DriftVerdict.None, 5), (d.Verdict, d.Count)));
        Assert.Empty(drifts.SettingChanges);
    }

    /// <summary>Each point of each quantity is what the picture of its own time shows.</summary>
    [Fact]
    public void Points_AreThoseOfThePictureAtTheirTime()
    {
        var chart = Rounds([(20, 100), (16, 92), (12, 85), (8, 79), (4, 74)], h => Chart.Check(h * Hour, end: 36 - (decimal)h / 4, release: 380 + 3 * (decimal)h));
        var drifts = chart.With(Chart.Aprv(10 * Hour, high: 27, tLow: 0.6m)).Picture().Drifts;

        Assert.All(drifts.All.Where(d => chart.Picture().Values.ContainsKey(d.Variable.Name)), drift =>
            Assert.All(drift.Points, p => Assert.Equal(chart.Picture(p.At)[drift.Variable.Name].Value!.Value, p.Value, 1e-8)));
        Assert.Equal(5, drifts["effectiveCompliance"].Count);
        Assert.Contains("P high 28 → 27 cmH2O, T low 0.5 → 0.6 s", Assert.Single(drifts.SettingChangesDuring(drifts["releaseVolumePerKg"])).Text);
    }

    [Fact]
    public void MeanPressure_IsTheComputedOne_WhereNoneWasMeasuredOrTheTwoDisagree()
    {
        var chart = new Chart().With(Chart.Aprv(30 * Hour), Mean(20, 25.5m), Mean(16, null), Mean(12, 12), Mean(8, 26));

        Assert.Equal([25.5, 25.7, 25.7, 26], chart.Picture().Drifts["meanAirwayPressureCmH2O"].Points.Select(p => p.Value));

        static VentilatorCheck Mean(double hours, decimal? mean) => Chart.Check(hours * Hour) with { MeanAirwayPressureCmH2O = mean };
    }

    /// <summary>What ends an epoch, and what does not: how many points of P/F and of release volume are left.</summary>
    public static TheoryData<Entry, int, int, string> EpochEnds => new()
    {
        { Event(EventKind.Prone), 2, 2, "turned prone" },
        { Event(EventKind.Supine), 2, 2, "turned back" },
        { Event(EventKind.RelaxantStart), 2, 2, "relaxant" },
        { Event(EventKind.RelaxantStop), 2, 2, "relaxant stopped" },
        { Event(EventKind.EcmoStart), 2, 2, "ECMO, as an event" },
        { Event(EventKind.DrainIn), 2, 2, "drain" },
        { new BedsideEvent { At = Chart.Ago(30 * Hour), Until = Chart.Ago(9 * Hour), What = EventKind.RelaxantStart }, 2, 2, "the end of a relaxant charted with its start" },
        { new ContextChange { From = Chart.Ago(9 * Hour), Flag = Circumstance.EcmoVv }, 2, 2, "ECMO, as a circumstance" },
        { new ContextChange { From = Chart.Ago(30 * Hour), Until = Chart.Ago(9 * Hour), Flag = Circumstance.EcmoVa }, 2, 2, "its end" },
        { Chart.PressureControl(9 * Hour), 2, 0, "another mode, which has no releases" },
        { Event(EventKind.SedationChanged), 5, 5, "sedation does not end an epoch" },
        { new ContextChange { From = Chart.Ago(9 * Hour), Flag = Circumstance.Ards }, 5, 5, "a diagnosis does not" },
        { Chart.Aprv(9 * Hour, high: 26), 5, 5, "nor does a pressure, of the same mode" },
    };

    [Theory, MemberData(nameof(EpochEnds))]
    public void Drift_DoesNotRunAcrossAnEpoch(Entry end, int gases, int releases, string reason)
    {
        var drifts = Rounds([(20, 100), (16, 92), (12, 85), (8, 79), (4, 74)]).With(end).Picture().Drifts;

        Assert.True((gases, releases) == (drifts["pfRatio"].Count, drifts["releaseVolumePerKg"].Count), reason);
    }

    /// <summary>Shortly before a gas twelve hours ago, the third of five: how many points of P/F and of PaCO2 stay.</summary>
    public static TheoryData<Entry, int, int, string> Unsettling => new()
    {
        { new BedsideEvent { At = Chart.Ago(12 * Hour + 19), What = EventKind.Suction }, 4, 4, "19 min after suction" },
        { new BedsideEvent { At = Chart.Ago(12 * Hour + 20), What = EventKind.Suction }, 5, 5, "20 min after suction" },
        { new BedsideEvent { At = Chart.Ago(12 * Hour + 5), What = EventKind.Bronchoscopy }, 4, 4, "after bronchoscopy" },
        { Chart.Aprv(12 * Hour + 59, high: 30), 4, 5, "59 min after P high was raised: CO2 settles in 30" },
        { Chart.Aprv(12 * Hour + 60, high: 30), 5, 5, "an hour after" },
        { Chart.Aprv(12 * Hour + 29, tHigh: 4.0m), 5, 4, "29 min after more releases" },
        { Chart.Aprv(12 * Hour + 30, tHigh: 4.0m), 5, 5, "30 min after more releases" },
        { Chart.Aprv(12 * Hour + 59, tHigh: 5.5m), 5, 4, "59 min after fewer releases" },
        { Chart.Aprv(12 * Hour + 60, tHigh: 5.5m), 5, 5, "an hour after fewer releases" },
        { Chart.Aprv(12 * Hour + 11, fiO2: 0.6m), 5, 5, "11 min after FiO2" },
    };

    [Theory, MemberData(nameof(Unsettling))]
    public void Gas_DrawnTooSoon_IsLeftOut(Entry disturbance, int oxygen, int carbonDioxide, string reason)
    {
        var drifts = Rounds([(20, 100), (16, 92), (12, 85), (8, 79), (4, 74)]).With(disturbance).Picture().Drifts;

        Assert.True((oxygen, carbonDioxide) == (drifts["pfRatio"].Count, drifts["paCO2MmHg"].Count), $"{reason}: {drifts["pfRatio"].Count}, {drifts["paCO2MmHg"].Count}");
    }

    /// <summary>A second change whose own settling is short does not end that of the first.</summary>
    [Fact]
    public void Gas_StillSettlingFromTheChangeBeforeTheLast_IsLeftOut()
    {
        var drifts = Rounds([(20, 100), (16, 92), (12, 85), (8, 79), (4, 74)])
            .With(Chart.Aprv(12 * Hour + 40, high: 30), Chart.Aprv(12 * Hour + 15, high: 30, fiO2: 0.55m)).Picture().Drifts;

        Assert.Equal(4, drifts["pfRatio"].Count);
    }

    [Fact]
    public void Gases_VenousStruckRepeatedOrUnfitting_AreLeftOut()
    {
        var chart = Rounds([(20, 100), (16, 92), (12, 85), (8, 79)]).With(
            Chart.Gas(14 * Hour, 40) with { Specimen = Specimen.Venous },
            Chart.Gas(8 * Hour - 20, 77),
            Chart.Gas(4 * Hour, 70, pH: 7.10m));
        var struck = chart.Add(Chart.Gas(6 * Hour, 300));
        var window = chart.Window().Without(struck.Id);
        var drifts = PatientPicture.At(window, Chart.Now).Drifts;

        Assert.Equal([200, 184, 170, 154, 140], drifts["pfRatio"].Points.Select(p => p.Value));
        Assert.Equal([7.34, 7.34, 7.34, 7.34], drifts["pH"].Points.Select(p => p.Value));
    }

    /// <summary>What voids the mechanics of one check among five, with how many points of end-release flow and of compliance stay.</summary>
    public static TheoryData<Func<VentilatorCheck, VentilatorCheck>, int, int, string> VoidChecks => new()
    {
        { c => c, 5, 5, "nothing" },
        { c => c with { EffortDuringRelease = true }, 4, 4, "effort during the release" },
        { c => c with { LeakPercent = 31 }, 4, 4, "a leak" },
        { c => c with { CurveNotReadable = true }, 4, 4, "the curve was not readable" },
        { c => c with { EndReleaseFlowLMin = 59 }, 5, 4, "98 % of peak: the flow is a reading, the estimate is outside its range" },
        { c => c with { ReleaseVolumeMl = null }, 5, 4, "no volume: no older one is put in its place" },
        { c => c with { PeakExpiratoryFlowLMin = null }, 4, 4, "no peak" },
    };

    [Theory, MemberData(nameof(VoidChecks))]
    public void Mechanics_OfAVoidCheck_AreLeftOut(Func<VentilatorCheck, VentilatorCheck> change, int flow, int compliance, string reason)
    {
        var drifts = Rounds([(20, 100), (16, 92), (12, 85), (8, 79), (4, 74)], h => h == 12 ? change(Chart.Check(h * Hour)) : Chart.Check(h * Hour)).Picture().Drifts;

        Assert.True((flow, compliance) == (drifts["endReleaseFlowPercent"].Count, drifts["effectiveCompliance"].Count), reason);
    }

    [Fact]
    public void VentilatoryRatio_TakesTheGasWithItsOwnCheck()
    {
        var chart = new Chart().With(Chart.Aprv(30 * Hour), Chart.Check(16 * Hour), Chart.Gas(16 * Hour - 10), Chart.Gas(12 * Hour), Chart.Gas(8 * Hour), Chart.Check(8 * Hour - 10));

        // 6600 mL/min × 48 mmHg ÷ (70.566 kg × 100 × 37.5), by hand; the gas of 12 h ago has no check within an hour.
        var ratio = chart.Picture().Drifts["ventilatoryRatio"];
        Assert.Equal([Chart.Ago(16 * Hour - 10), Chart.Ago(8 * Hour)], ratio.Points.Select(p => p.At));
        Assert.All(ratio.Points, p => Assert.Equal(6600 * 48 / (70.566 * 3750), p.Value, 5));
    }

    [Fact]
    public void PaCO2Falling_InAlkalaemia_IsWorse()
    {
        var normal = Falling(7.44m).Picture().Drifts["paCO2MmHg"];
        var alkalaemic = Falling(7.46m).Picture().Drifts["paCO2MmHg"];

        Assert.Equal((DriftVerdict.Drifting, DriftCourse.Better), (normal.Verdict, normal.Course));
        Assert.Equal((DriftVerdict.Drifting, DriftCourse.Worse), (alkalaemic.Verdict, alkalaemic.Course));

        static Chart Falling(decimal pH) => new Chart().With(
            [Chart.Aprv(30 * Hour), .. new[] { (20, 48), (16, 45), (12, 41), (8, 38) }.Select(g => Chart.Gas(g.Item1 * Hour, pCO2: g.Item2, pH: pH, bicarbonate: null))]);
    }

    [Fact]
    public void Window_IsTheUnits()
    {
        var chart = Rounds([(25, 110), (20, 100), (16, 92), (12, 85), (8, 79), (4, 74)]);
        Assert.Equal(5, chart.Picture().Drifts["pfRatio"].Count);

        chart.Unit = chart.Unit with { DriftWindow = Duration.FromHours(12) };
        Assert.Equal((3, Chart.Ago(12 * Hour)), (chart.Picture().Drifts["pfRatio"].Count, chart.Picture().Drifts.From));
    }

    [Fact]
    public void SettingChanges_LeaveConfirmationsOut()
    {
        var drifts = Rounds([(20, 100), (16, 92), (12, 85), (8, 79), (4, 74)])
            .With(Chart.Aprv(14 * Hour), Chart.Aprv(10 * Hour, high: 26), Chart.Aprv(2 * Hour, high: 26, fiO2: 0.6m)).Picture().Drifts;

        Assert.Equal(["P high 28 → 26 cmH2O", "FiO2 0.5 → 0.6"], drifts.SettingChanges.Select(c => c.Text));
        Assert.Equal(["P high 28 → 26 cmH2O"], drifts.SettingChangesDuring(drifts["pfRatio"]).Select(c => c.Text));
    }

    [Fact]
    public void Points_NameTheEntryBehindThem()
    {
        var picture = Rounds([(20, 100), (16, 92), (12, 85), (8, 79)]).Picture();

        Assert.Equal(picture.Gases.Select(g => (Guid?)g.Gas.Id), picture.Drifts["pfRatio"].Points.Select(p => p.Entry));
        Assert.Same(picture.Drifts, picture.Drifts);
    }

    /// <summary>APRV since 30 h, and at each time a gas with its PaO2 and a check.</summary>
    private static Chart Rounds((double HoursAgo, decimal PaO2)[] rounds, Func<double, VentilatorCheck>? check = null) => new Chart().With(
        [Chart.Aprv(30 * Hour), .. rounds.SelectMany(r => new Entry[] { Chart.Gas(r.HoursAgo * Hour, r.PaO2), check?.Invoke(r.HoursAgo) ?? Chart.Check(r.HoursAgo * Hour) })]);

    private static BedsideEvent Event(EventKind kind) => new() { At = Chart.Ago(9 * Hour), What = kind };
}
