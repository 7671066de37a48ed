using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Tests.Pictures;

/// <summary>The written equations are those that are computed: read from their text and worked out a second time.</summary>
public sealed class EquationTests
{
    private static readonly BloodGas WholeGas = Chart.Gas() with
    {
        HaemoglobinGDl = 9.8m,
        SO2Percent = 93.5m,
        SodiumMmolL = 141,
        ChlorideMmolL = 104,
        EtCO2MmHg = 39,
    };

    private static readonly VentilatorCheck WholeCheck = Chart.Check() with
    {
        MeanAirwayPressureCmH2O = 25.2m,
        TotalRatePerMin = 20,
        SpontaneousRatePerMin = 14,
        SpontaneousTidalVolumeMl = 210,
        PeakPressureCmH2O = 31,
        PlateauPressureCmH2O = 26,
        TidalVolumeMl = 430,
        Passive = true,
        HoldS = 0.6m,
    };

    private static readonly SettingChange VolumeControl = new()
    {
        ChangedAt = Chart.Ago(600),
        Mode = VentilationMode.VolumeControl,
        SetRatePerMin = 20,
        TidalVolumeMl = 430,
        PeepCmH2O = 10,
        InspiratoryTimeS = 1.1m,
        FiO2 = 0.5m,
    };

    public static TheoryData<string> Situations => [.. Charts.Keys];

    private static Dictionary<string, Chart> Charts => new()
    {
        ["APRV, everything charted"] = new Chart().With(Chart.Aprv(), WholeGas, WholeCheck),
        ["APRV, release rate measured"] = new Chart().With(Chart.Aprv(), WholeGas, WholeCheck with { ReleaseRatePerMin = 11.6m }),
        ["APRV, mean pressure computed"] = Chart.Round(),
        ["APRV, T high too short to refill"] = new Chart().With(Chart.Aprv(tHigh: 2), WholeGas, WholeCheck),
        ["pressure control"] = new Chart().With(Chart.PressureControl(), WholeGas, WholeCheck with { MeanAirwayPressureCmH2O = null }),
        ["pressure control with a rise time and auto-PEEP"] = new Chart().With(Chart.PressureControl() with { RiseTimeS = 0.2m }, WholeGas, WholeCheck with { AutoPeepCmH2O = 2 }),
        ["volume control"] = new Chart().With(VolumeControl, WholeGas, WholeCheck),
        ["volume control with a pause, a woman"] = Woman(new Chart().With(VolumeControl with { PauseTimeS = 0.2m }, WholeGas, WholeCheck)),
    };

    [Theory, MemberData(nameof(Situations))]
    public void Working_WorkedOutFromItsText_GivesTheValue(string situation)
    {
        var worked = Charts[situation].Picture().Values.Values.Where(v => v.Working is not null && v.Word is null).ToList();

        Assert.True(worked.Count > 20, situation);
        Assert.All(worked, v =>
        {
            var second = WrittenFormula.Compute(v.Equation!.WithNumbers(v.Inputs));
            Assert.True(Math.Abs(second - v.Value!.Value) <= Math.Max(0.0005, Math.Abs(v.Value.Value) * 0.0005), $"{v.Name}: {v.Working} but {v.Value}");
        });
    }

    [Fact]
    public void EveryEquation_OfAValue_IsWorkedInSomeSituation() => Assert.Empty(Equations.All
        .Where(e => ValueWords.Of(e.Result) is not null && e != Equations.MeanAlveolarPressure)
        .Except(Charts.Values.SelectMany(c => c.Picture().Values.Values).Where(v => v.Working is not null).Select(v => v.Equation!))
        .Select(e => e.Id + " " + e.Form));

    [Fact]
    public void EveryComputedValue_HasAnEquationOfTheList() =>
        Assert.All(Charts.Values.SelectMany(c => c.Picture().Values.Values).Where(v => v.Kind != ValueKind.Measured), v => Assert.Contains(v.Equation, Equations.All));

    [Fact]
    public void Working_PutsTheNumbersIn_AndRoundsTheResultAsItIsShown()
    {
        var picture = Chart.Round().Picture();

        Assert.Equal("75 ÷ 0.5 → 150 mmHg", picture[ValueNames.PfRatio].Working);
        Assert.Equal("(28 × 4.5 + 5 × 0.5) ÷ (4.5 + 0.5) → 25.7 cmH2O", picture[ValueNames.MeanAirwayPressureComputed].Working);
    }

    [Fact]
    public void Working_OfWhatCannotBeHadOrWasRead_IsNotThere()
    {
        var picture = new Chart().With(Chart.Aprv(), WholeCheck).Picture();

        Assert.Null(picture[ValueNames.PfRatio].Working);
        Assert.Null(picture[ValueNames.MeanAirwayPressureMeasured].Working);
    }

    [Fact]
    public void Equation_InWords_CallsItsInputsByTheirNames() =>
        Assert.Equal("T low ÷ ln(100 ÷ end-release flow in % of peak)", Equations.TimeConstant.InWords);

    private static Chart Woman(Chart chart)
    {
        chart.Patient = chart.Patient with { Sex = Episodes.Sex.Female };
        return chart;
    }
}
