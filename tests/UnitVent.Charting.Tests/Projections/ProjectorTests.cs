using UnitVent.Charting.Entries;
using UnitVent.Charting.Projections;
using UnitVent.Charting.Results;

namespace UnitVent.Charting.Tests.Projections;

public sealed class ProjectorTests
{
    /// <summary>The one-compartment example: 28/0 cmH2O, 4.5/0.5 s, 60 % of peak, 420 mL, PaCO2 50, own 2.0 L/min at 10/min.</summary>
    private static Chart Example(Func<VentilatorCheck, VentilatorCheck>? check = null, Func<BloodGas, BloodGas>? gas = null) => new Chart().With(
        Chart.Aprv(low: 0),
        (gas ?? (g => g))(Chart.Gas(pCO2: 50)),
        (check ?? (c => c))(Chart.Check(peak: 64, end: 38.4m, release: 420) with { SpontaneousMinuteVolumeLMin = 2.0m, SpontaneousRatePerMin = 10, TotalMinuteVolumeLMin = 7.0m }));

    public static TheoryData<decimal, decimal, double, double, double> ChangesOfPressureAndTime => new()
    {
        { 28, 4.5m, 25.2, 12, 420 },
        { 28, 5.5m, 25.6667, 10, 420 },
        { 26, 4.5m, 23.4, 12, 390 },
        { 26, 5.5m, 23.8333, 10, 390 },
    };

    /// <summary>Mean pressure, rate and volume of the one-compartment model (J Appl Physiol 1993;74:922-933), computed by hand.</summary>
    [Theory, MemberData(nameof(ChangesOfPressureAndTime))]
    public void Projection_OfAChange_IsThatOfTheModel(decimal high, decimal tHigh, double mean, double rate, double volume)
    {
        var projection = Projected(Example(), new() { PHighCmH2O = high, THighS = tHigh });

        Assert.Empty(projection.Refusals);
        Assert.Equal(mean, projection.Then.MeanAirwayPressureCmH2O, 3);
        Assert.Equal(rate, projection.Then.ReleaseRatePerMin, 6);
        Assert.Equal(volume, projection.Then.ReleaseVolumeMl!.Value, 6);
    }

    /// <summary>PaCO2 × VA ÷ VA′ with a dead space of 2.2 mL/kg × 70.566 kg, worked by hand for P high 26.</summary>
    [Fact]
    public void PaCO2_FollowsAlveolarVentilation_WithItsBand()
    {
        var deadSpace = 2.2 * (50 + (0.91 * (175 - 152.4)));
        double Ventilation(double volume, double dead) => (12 * (volume - dead) / 1000) + Math.Max(0, 2.0 - (10 * dead / 1000));

        var paCO2 = Projected(Example(), new() { PHighCmH2O = 26 }).PaCO2!;

        Assert.Equal(50 * Ventilation(420, deadSpace) / Ventilation(390, deadSpace), paCO2.ExpectedMmHg, 6);
        Assert.Equal(50 * Ventilation(420, 0.7 * deadSpace) / Ventilation(390, 0.7 * deadSpace), paCO2.LowestMmHg, 6);
        Assert.Equal(50 * Ventilation(420, 1.3 * deadSpace) / Ventilation(390, 1.3 * deadSpace), paCO2.HighestMmHg, 6);
        Assert.Contains("rise", paCO2.Says);
    }

    [Fact]
    public void NoChange_ChangesNothing_AndClaimsNoDirection()
    {
        var projection = Projected(Example(), new());

        Assert.Equal(50, projection.PaCO2!.ExpectedMmHg, 9);
        Assert.Equal(projection.Now.ReleaseVolumeMl!.Value, projection.Then.ReleaseVolumeMl!.Value, 9);
        Assert.Contains("no direction", projection.PaCO2.Says);
    }

    public static TheoryData<string, string> Patients => new()
    {
        { "air leak", "air leak" },
        { "obstructive", "obstructive" },
        { "ecmo", "ECMO" },
        { "no gas", "Needs an arterial gas." },
        { "venous gas", "Needs an arterial gas." },
        { "old gas", "6 h is the limit" },
        { "gas before the change settled", "had settled" },
        { "settings changed since", "changed since the gas" },
        { "single release", "single release" },
        { "effort", "effort" },
        { "no check", "Needs a ventilator check" },
        { "own breaths rule", "own breaths carry" },
        { "own share changing", "own share is changing" },
        { "turned", "turned since" },
        { "sedation", "Sedation was changed" },
        { "relaxant", "relaxant was started" },
        { "no height", "Needs height" },
        { "no own rate", "Needs own rate" },
        { "no volume", "Needs release volume" },
    };

    [Theory, MemberData(nameof(Patients))]
    public void Projection_ThatThePatientForbids_SaysWhy_AndStillTellsPressuresAndRate(string patient, string sentence)
    {
        var projection = Projected(Forbidden(patient), new() { PHighCmH2O = 26 });

        Assert.Contains(projection.Refusals, r => r.Contains(sentence, StringComparison.Ordinal));
        Assert.Null(projection.PaCO2);
        Assert.Null(projection.Then.ReleaseVolumeMl);
        Assert.Equal(23.4, projection.Then.MeanAirwayPressureCmH2O, 6);
    }

    [Theory]
    [InlineData(0.5, 19, "by more than 30 %")]
    [InlineData(0.8, 28, "by more than 50 %")]
    public void Projection_ThatTheNumbersForbid_SaysWhy(double tLow, double pHigh, string sentence) =>
        Assert.Contains(Projected(Example(), new() { PHighCmH2O = (decimal)pHigh, TLowS = (decimal)tLow }).Refusals, r => r.Contains(sentence, StringComparison.Ordinal));

    [Fact]
    public void Projection_OutsideThePatientsWindow_SaysWhichThatIs()
    {
        var chart = Example().With(new TargetSet { From = Chart.Ago(500), EndReleaseFlowPercent = 75 });

        Assert.Equal(["The release would end at 60 % of peak, outside this patient's 70–90 %."], Projected(chart, new()).Refusals);
    }

    [Fact]
    public void SettingsOutsideTheirLimits_AreRefusedByField()
    {
        var answer = Projector.Of(Example().Picture(), new() { PHighCmH2O = 60, PLowCmH2O = -1, StepCmH2O = 9 });

        Assert.Equal(Refusal.Value, answer.Refusal);
        Assert.Equal(["stepCmH2O", "pHighCmH2O", "pLowCmH2O"], answer.Errors.Select(e => e.Field));
    }

    [Fact]
    public void AnotherMode_HasNoProjection() =>
        Assert.Contains("only APRV has releases", Projector.Of(new Chart().With(Chart.PressureControl()).Picture(), new()).Errors.Single().Message);

    /// <summary>T low (mean − P low) ÷ (P high − mean): mean 25.2 at 27 → 7.0 s, at 26 → 15.75 s, which is fewer than 5 releases a minute.</summary>
    [Theory]
    [InlineData(27, 7.0)]
    [InlineData(26, null)]
    [InlineData(25, null)]
    public void HeldMean_IsTheTHighThatKeepsIt_OrSaysThatNoneDoes(int high, double? expected)
    {
        var held = Projected(Example(), new() { PHighCmH2O = high }).HeldMean;

        Assert.Equal(25.2, held.MeanAirwayPressureCmH2O, 6);
        Assert.Equal(expected, held.THighS is { } s ? Math.Round(s, 6) : null);
        Assert.NotEmpty(held.Says);
    }

    /// <summary>2 cmH2O and 1 s a stage from 28/4.5 (Crit Care Med 2005;33(3 Suppl):S228-S240, from memory; numbers computed).</summary>
    [Fact]
    public void StepDown_ListsItsStages()
    {
        var stages = Projected(Example(), new()).StepDown;

        Assert.Equal((28, 4.5, 25.2), (stages[0].PHighCmH2O, stages[0].THighS, Math.Round(stages[0].MeanAirwayPressureCmH2O, 2)));
        Assert.Equal((26, 5.5, 23.83), (stages[1].PHighCmH2O, stages[1].THighS, Math.Round(stages[1].MeanAirwayPressureCmH2O, 2)));
        Assert.Equal((14, 11.5, 13.42), (stages[^1].PHighCmH2O, stages[^1].THighS, Math.Round(stages[^1].MeanAirwayPressureCmH2O, 2)));
    }

    private static Projection Projected(Chart chart, ProposedSettings proposed)
    {
        var answer = Projector.Of(chart.Picture(), proposed);
        Assert.True(answer.Succeeded, string.Join(" ", answer.Errors));
        return answer.Value;
    }

    private static Chart Forbidden(string patient) => patient switch
    {
        "air leak" => Example().InContext(Circumstance.AirLeak),
        "obstructive" => Example().InContext(Circumstance.Obstructive),
        "ecmo" => Example().InContext(Circumstance.EcmoVv),
        "no gas" => new Chart().With(Chart.Aprv(low: 0), Chart.Check()),
        "venous gas" => Example(gas: g => g with { Specimen = Specimen.Venous }),
        "old gas" => Example(c => c with { ObservedAt = Chart.Ago(365) }, g => g with { DrawnAt = Chart.Ago(361) }),
        "gas before the change settled" => Example().With(Chart.Aprv(80, high: 32, low: 0), Chart.Aprv(70, low: 0)),
        "settings changed since" => Example().With(Chart.Aprv(10, low: 0)),
        "single release" => Example(c => c with { FlowReadings = 1 }),
        "effort" => Example(c => c with { EffortDuringRelease = true }),
        "no check" => Example(c => c with { ObservedAt = Chart.Ago(120) }),
        "own breaths rule" => Example(c => c with { SpontaneousMinuteVolumeLMin = 4 }),
        "own share changing" => Example().With(Chart.Check(200) with { SpontaneousMinuteVolumeLMin = 4 }),
        "turned" => Example().With(new BedsideEvent { At = Chart.Ago(10), What = EventKind.Prone }),
        "sedation" => Example().With(new BedsideEvent { At = Chart.Ago(10), What = EventKind.SedationChanged }),
        "relaxant" => Example().With(new BedsideEvent { At = Chart.Ago(10), What = EventKind.RelaxantStart }),
        "no height" => WithoutHeight(Example()),
        "no own rate" => Example(c => c with { SpontaneousRatePerMin = null }),
        "no volume" => Example(c => c with { ReleaseVolumeMl = null }),
        _ => throw new ArgumentOutOfRangeException(nameof(patient)),
    };

    private static Chart WithoutHeight(Chart chart)
    {
        chart.Patient = chart.Patient with { HeightCm = null };
        return chart;
    }
}
