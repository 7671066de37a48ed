using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;

namespace UnitVent.Charting.Tests.Pictures;

public sealed class PictureValueTests
{
    /// <summary>
    /// Worked by hand for 28/5 cmH2O, 4.5/0.5 s, FiO2 0.5, PaO2 75, pH 7.34, PaCO2 48, release 380 mL, flows 60 → 36 L/min, total 6.6 L/min, male 175 cm:
    /// the closed forms are those of the equations named in the last column.
    /// </summary>
    public static TheoryData<string, double, string> HandWorkedValues => new()
    {
        { ValueNames.PredictedBodyWeightKg, 50 + 0.91 * (175 - 152.4), "A1, N Engl J Med 2000;342:1301" },
        { ValueNames.MeanAirwayPressureComputed, (28 * 4.5 + 5 * 0.5) / 5.0, "A6, time-weighted mean: 25.7" },
        { ValueNames.CycleTimeS, 5.0, "A9" },
        { ValueNames.ReleaseRatePerMin, 12, "A9" },
        { ValueNames.TimeRatio, 9, "A9" },
        { ValueNames.ShareAtPHighPercent, 90, "A9" },
        { ValueNames.ReleaseMinuteVolumeLMin, 0.380 * 12, "A10" },
        { ValueNames.SpontaneousMinuteVolumeDerivedLMin, 6.6 - 0.380 * 12, "A10" },
        { ValueNames.SpontaneousSharePercent, 100 * (6.6 - 0.380 * 12) / 6.6, "A10" },
        { ValueNames.EndReleaseFlowPercent, 60, "A11" },
        { ValueNames.ExpiratoryTimeConstantS, 0.978807, "A12: 0.5 ÷ ln(1 ÷ 0.6)" },
        { ValueNames.TLowFor75S, 0.281588, "A12" },
        { ValueNames.EndReleaseAlveolarPressureCmH2O, 5 + 23 * 0.6, "A13" },
        { ValueNames.EmptiedPercent, 40, "A13" },
        { ValueNames.AlveolarSwingCmH2O, 23 * 0.4, "A13" },
        { ValueNames.EffectiveCompliance, 380 / (23 * 0.4), "A13" },
        { ValueNames.PfRatio, 150, "A3, JAMA 2012;307:2526" },
        { ValueNames.OxygenationIndex, 100 * 0.5 * 25.7 / 75, "A5, Chest 2017;152:1151" },
        { ValueNames.ReleaseVolumePerKg, 380 / 70.566, "A2" },
        { ValueNames.BicarbonateComputedMmolL, 25.3155, "A22: 0.0307 × 48 × 10^(7.34 − 6.105)" },
    };

    [Theory, MemberData(nameof(HandWorkedValues))]
    public void Picture_OfACarefulRound_EqualsTheHandWorkedValue(string name, double expected, string source)
    {
        var value = Chart.Round().Picture()[name];

        Assert.True(value.State is ValueState.Ok, $"{name}: {value.Because} ({source})");
        Assert.Equal(expected, value.Value!.Value, Math.Abs(expected) * 2e-5);
    }

    /// <summary>Computed from the equations' printed forms for pressure control: 30/10, Ti 1.0, rate 20 → 16.67 (Crit Care Med 1992;20:1461).</summary>
    [Fact]
    public void MeanPressure_InPressureControl_IsThatOfASquareWave()
    {
        var picture = new Chart().With(Chart.PressureControl()).Picture();

        Assert.Equal(16.6667, picture[ValueNames.MeanAirwayPressureComputed].Value!.Value, 4);
    }

    [Fact]
    public void Picture_OfAnEmptyChart_SaysWhatEachValueNeeds()
    {
        var picture = new Chart().Picture();

        Assert.All(picture.Values.Values.Where(v => v.Name is not (ValueNames.PredictedBodyWeightKg or ValueNames.VentilatorDays)), v =>
        {
            Assert.Null(v.Value);
            Assert.Equal(ValueState.Missing, v.State);
            Assert.StartsWith("Needs ", v.Because);
        });
    }

    /// <summary>A day and a half after the last entry only body size, elapsed time and what follows from nothing but them can be had.</summary>
    [Fact]
    public void Picture_OfAChartNobodyTouchedSince_GivesNoOldNumberAsNew()
    {
        var picture = Chart.Round().Picture(Chart.Now + Duration.FromHours(36));

        Assert.All(picture.Values.Values.Where(v => v.Name is not (ValueNames.PredictedBodyWeightKg or ValueNames.VentilatorDays)), v =>
        {
            Assert.Null(v.Value);
            Assert.Contains(v.State, new[] { ValueState.Stale, ValueState.Missing, ValueState.Mode });
            Assert.False(string.IsNullOrEmpty(v.Because));
        });
    }

    public static TheoryData<string, ValueState, string> Contradictions => new()
    {
        { ValueNames.EndReleaseFlowPercent, ValueState.Domain, "end flow is not below the peak" },
        { ValueNames.ExpiratoryTimeConstantS, ValueState.Domain, "end flow is not below the peak" },
        { ValueNames.SpontaneousMinuteVolumeDerivedLMin, ValueState.Domain, "exceeds the total minute volume" },
        { ValueNames.SpontaneousSharePercent, ValueState.Domain, "exceeds the total" },
        { ValueNames.AlveolarArterialGradientMmHg, ValueState.Domain, "exceeds what the alveoli can hold" },
        { ValueNames.SfRatio, ValueState.Domain, "not informative above 97 %" },
        { ValueNames.ImputedPfRatio, ValueState.Domain, "not informative above 97 %" },
        { ValueNames.OxygenSaturationIndex, ValueState.Domain, "not informative above 97 %" },
    };

    [Theory, MemberData(nameof(Contradictions))]
    public void Value_OfReadingsThatContradictEachOther_SaysWhichDoNotFit(string name, ValueState state, string sentence)
    {
        var check = Chart.Check(peak: 40, end: 45, spO2: 99) with { SpontaneousMinuteVolumeLMin = null, TotalMinuteVolumeLMin = 3 };
        var value = new Chart().With(Chart.Aprv(), Chart.Gas(pO2: 500), check).Picture()[name];

        Assert.Equal(state, value.State);
        Assert.Null(value.Value);
        Assert.Contains(sentence, value.Because);
    }

    public static TheoryData<string, ValueState, string> StatesOfPressureControl => new()
    {
        { ValueNames.EndReleaseFlowPercent, ValueState.Mode, "only APRV has releases" },
        { ValueNames.CycleTimeS, ValueState.Mode, "only APRV has releases" },
        { ValueNames.StaticCompliance, ValueState.Missing, "no plateau was charted" },
    };

    [Theory, MemberData(nameof(StatesOfPressureControl))]
    public void Value_InPressureControl_SaysWhyItIsNotThere(string name, ValueState expected, string reason)
    {
        var value = new Chart().With(Chart.PressureControl()).Picture()[name];

        Assert.True(expected == value.State, reason);
        Assert.NotNull(value.Because);
    }

    [Fact]
    public void StaticCompliance_InAprv_DoesNotBelongToTheMode() => Assert.Equal(ValueState.Mode, Chart.Round().Picture()[ValueNames.StaticCompliance].State);

    [Fact]
    public void MechanicalPower_InAprv_IsNotComputed() =>
        Assert.Equal("No agreed way to compute mechanical power in APRV.", Chart.Round().Picture()[ValueNames.MechanicalPowerJMin].Because);

    [Theory]
    [InlineData(719, ValueState.Ok, "just inside 12 h")]
    [InlineData(721, ValueState.Stale, "just past 12 h")]
    public void PfRatio_AtTheAgeLimitOfAGas_GoesStale(double gasMinutesAgo, ValueState expected, string reason)
    {
        var value = new Chart().With(Chart.Aprv(900), Chart.Gas(gasMinutesAgo)).Picture()[ValueNames.PfRatio];

        Assert.True(expected == value.State, reason);
        Assert.Equal(expected == ValueState.Ok, value.Value is not null);
    }

    [Fact]
    public void PfRatio_WhenWeaning_StaysForADay()
    {
        var chart = new Chart().With(Chart.Aprv(2000) with { Phase = CoursePhase.Weaning }, Chart.Gas(1400));

        Assert.Equal(ValueState.Ok, chart.Picture()[ValueNames.PfRatio].State);
    }

    [Theory]
    [InlineData(359, ValueState.Ok)]
    [InlineData(361, ValueState.Stale)]
    public void EndReleaseFlow_At15CheckIntervals_GoesStale(double minutesAgo, ValueState expected) =>
        Assert.Equal(expected, new Chart().With(Chart.Aprv(), Chart.Check(minutesAgo)).Picture()[ValueNames.EndReleaseFlowPercent].State);

    [Theory]
    [InlineData(9, ValueState.Pair, "the oxygen of the new settings has not settled")]
    [InlineData(11, ValueState.Ok, "settled")]
    public void PfRatio_SoonAfterAChange_BelongsToNeitherSetting(double minutesAfterChange, ValueState expected, string reason)
    {
        var chart = new Chart().With(Chart.Aprv(600), Chart.Aprv(100, fiO2: 0.6m), Chart.Gas(100 - minutesAfterChange, fiO2: null));

        Assert.True(expected == chart.Picture()[ValueNames.PfRatio].State, reason);
    }

    [Fact]
    public void VenousGas_NeverBecomesThePatientsPf()
    {
        var picture = new Chart().With(Chart.Aprv(), Chart.Gas() with { Specimen = Specimen.Venous }).Picture();

        Assert.Equal("Needs an arterial gas.", picture[ValueNames.PfRatio].Because);
    }

    [Fact]
    public void Kilopascals_GiveTheSamePf()
    {
        // 10.5 kPa at FiO2 0.50: 157.5 mmHg (10.5 × 760 ÷ 101.325 ÷ 0.5).
        var gas = Chart.Gas() with { TensionUnit = TensionUnit.KPa, PO2 = 10.5m, PCO2 = 6.4m };

        Assert.Equal(157.51, new Chart().With(Chart.Aprv(), gas).Picture()[ValueNames.PfRatio].Value!.Value, 2);
    }

    [Fact]
    public void ZeroEndFlow_IsAReading_AndHasNoTimeConstant()
    {
        var picture = new Chart().With(Chart.Aprv(), Chart.Check(end: 0)).Picture();

        Assert.Equal(0, picture[ValueNames.EndReleaseFlowPercent].Value);
        Assert.Equal(ValueState.Domain, picture[ValueNames.ExpiratoryTimeConstantS].State);
        Assert.Contains("flow reached zero", picture[ValueNames.ExpiratoryTimeConstantS].Because);
    }

    [Fact]
    public void AirLeak_KeepsTheNumber_AndSaysItIsNotValid()
    {
        var value = Chart.Round().InContext(Circumstance.AirLeak).Picture()[ValueNames.EndReleaseFlowPercent];

        Assert.Equal(ValueState.Validity, value.State);
        Assert.Equal(60, value.Value!.Value, 9);
        Assert.Contains("air leak", value.Because);
    }

    [Fact]
    public void ReleaseBeyondTheTotal_IsRefusedInWords()
    {
        var check = Chart.Check(release: 600) with { TotalMinuteVolumeLMin = 5 };

        Assert.Contains("exceeds the total", new Chart().With(Chart.Aprv(), check).Picture()[ValueNames.SpontaneousMinuteVolumeLMin].Because);
    }

    [Fact]
    public void MeasuredOwnVolume_WinsOverTheDerivedOne()
    {
        var picture = new Chart().With(Chart.Aprv(), Chart.Check() with { SpontaneousMinuteVolumeLMin = 1.5m }).Picture();

        Assert.Equal(1.5, picture[ValueNames.SpontaneousMinuteVolumeLMin].Value);
        Assert.Equal(ValueKind.Measured, picture[ValueNames.SpontaneousMinuteVolumeLMin].Kind);
        Assert.Equal(2.04, picture[ValueNames.SpontaneousMinuteVolumeDerivedLMin].Value!.Value, 6);
    }

    [Fact]
    public void MissingHeight_IsSaidByEverythingPerKg()
    {
        var chart = Chart.Round();
        chart.Patient = chart.Patient with { HeightCm = null };

        Assert.Equal("Needs height.", chart.Picture()[ValueNames.ReleaseVolumePerKg].Because);
    }

    [Fact]
    public void PastPicture_LeavesOutWhatCameLater()
    {
        var chart = new Chart().With(Chart.Aprv(), Chart.Gas(300, pO2: 100), Chart.Gas(30, pO2: 60));

        Assert.Equal(200, chart.Picture(Chart.Ago(60))[ValueNames.PfRatio].Value!.Value, 9);
        Assert.Equal(120, chart.Picture()[ValueNames.PfRatio].Value!.Value, 9);
    }

    [Fact]
    public void EveryInput_OfAValue_NamesItsEntryAndTime()
    {
        var pf = Chart.Round().Picture()[ValueNames.PfRatio];

        Assert.Equal(["pO2", "fiO2"], pf.Inputs.Select(i => i.Name));
        Assert.All(pf.Inputs, i => Assert.True(i.Entry is not null && i.At == Chart.Ago(30)));
    }

    [Fact]
    public void AsOf_IsTheReadingsTime_AndTheSettingsOnlyWhenNothingWasRead()
    {
        var picture = Chart.Round().Picture();

        Assert.Equal(Chart.Ago(25), picture[ValueNames.SpontaneousSharePercent].AsOf);
        Assert.Equal(Chart.Ago(600), picture[ValueNames.CycleTimeS].AsOf);
    }

    [Fact]
    public void NextChange_OfAFreshRound_IsTheNextCheck() =>
        Assert.Equal(Chart.Ago(25) + Duration.FromHours(4) + Duration.FromSeconds(1), new Chart().With(Chart.Aprv(700), Chart.Gas(), Chart.Check()).Picture().NextChangeAt);
}
