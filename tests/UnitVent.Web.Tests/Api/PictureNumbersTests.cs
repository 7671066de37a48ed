using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

/// <summary>The numbers that leave by the interface, against formulas written out here from their printed form, to a millionth.</summary>
[Collection(AppCollection.Name)]
public sealed class PictureNumbersTests(RunningApp app)
{
    private const double Millionth = 1e-6;

    /// <summary>Female, 165 cm; 28/5 cmH2O, 4.5/0.5 s; gas 7.34, 48, 75 mmHg at FiO2 0.5; flows 60 → 36 L/min, release 380 mL, total 6.6 L/min.</summary>
    public static TheoryData<string, double, string> Independent
    {
        get
        {
            var weight = 45.5 + 0.91 * (165 - 152.4);
            var (r, span, rate) = (36.0 / 60, 28.0 - 5, 60 / (4.5 + 0.5));
            var tau = 0.5 / Math.Log(1 / r);
            var mean = (28 * 4.5 + 5 * 0.5) / (4.5 + 0.5);
            var bicarbonate = 0.0307 * 48 * Math.Pow(10, 7.34 - 6.105);
            var compliance = 380 / (span * (1 - r));
            return new()
            {
                { "predictedBodyWeightKg", weight, "N Engl J Med 2000;342:1301" },
                { "releaseVolumePerKg", 380 / weight, "standard identity" },
                { "pfRatio", 75 / 0.5, "JAMA 2012;307:2526" },
                { "sfRatio", 94 / 0.5, "Chest 2007;132:410" },
                { "imputedPfRatio", (94 / 0.5 - 64) / 0.84, "Chest 2007;132:410" },
                { "oxygenationIndex", 100 * 0.5 * mean / 75, "Chest 2017;152:1151" },
                { "meanAirwayPressureComputed", mean, "time-weighted mean" },
                { "cycleTimeS", 5, "standard identity" },
                { "releaseRatePerMin", rate, "standard identity" },
                { "timeRatio", 9, "standard identity" },
                { "shareAtPHighPercent", 90, "standard identity" },
                { "releaseMinuteVolumeLMin", 0.380 * rate, "standard identity" },
                { "spontaneousMinuteVolumeLMin", 6.6 - 0.380 * rate, "standard identity" },
                { "spontaneousSharePercent", 100 * (6.6 - 0.380 * rate) / 6.6, "standard identity" },
                { "endReleaseFlowPercent", 100 * r, "Crit Care Med 2005;33:S228" },
                { "expiratoryTimeConstantS", tau, "single exponential" },
                { "tLowFor75S", -tau * Math.Log(0.75), "single exponential" },
                { "tLowFor50S", -tau * Math.Log(0.50), "single exponential" },
                { "tLowFor25S", -tau * Math.Log(0.25), "single exponential" },
                { "endReleaseAlveolarPressureCmH2O", 5 + span * r, "Respir Res 2022;23:101" },
                { "emptiedPercent", 100 * (1 - r), "Respir Res 2022;23:101" },
                { "alveolarSwingCmH2O", span * (1 - r), "Respir Res 2022;23:101" },
                { "effectiveCompliance", compliance, "Respir Res 2022;23:101" },
                { "effectiveResistance", tau / (compliance / 1000), "standard identity" },
                { "peakFlowModelLMin", 0.380 / (tau * (1 - r)) * 60, "single exponential" },
                { "bicarbonateComputedMmolL", bicarbonate, "CLSI C46 constants" },
                { "gasConsistencyDeltaPH", 6.105 + Math.Log10(25.5 / (0.0307 * 48)) - 7.34, "CLSI C46 constants" },
                { "standardBaseExcessMmolL", bicarbonate - 24.8 + 16.2 * (7.34 - 7.40), "CLSI C46" },
                { "ventilatoryRatio", 6600 * 48 / (weight * 100 * 37.5), "Am J Respir Crit Care Med 2019;199:333" },
            };
        }
    }

    [Fact]
    public async Task Picture_OverTheInterface_EqualsTheIndependentCalculation()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        await caller.PostAsync(episode + "/setting-changes", caller.Aprv());
        await caller.PostAsync(episode + "/blood-gases", caller.Gas());
        await caller.PostAsync(episode + "/ventilator-checks", caller.Check());
        var values = (await caller.GetAsync(episode + "/picture")).Json.GetProperty("values");

        Assert.All(Independent, row =>
        {
            var (name, expected, source) = row.Data;
            var actual = values.GetProperty(name).GetProperty("value").GetDouble();
            Assert.True(Math.Abs(actual - expected) <= Millionth * Math.Abs(expected), $"{name} ({source}): {actual} is not {expected}.");
        });
    }
}
