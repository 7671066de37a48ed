namespace UnitVent.Physiology.Tests;

public sealed class UnitLimitsTests
{
    private static readonly Dictionary<string, Func<double, double>> Factories = new()
    {
        ["airway pressure"] = x => AirwayPressure.FromCmH2O(x).CmH2O,
        ["airway pressure in hPa"] = x => AirwayPressure.FromHectopascals(x).CmH2O * 0.980665,
        ["partial pressure"] = x => PartialPressure.FromMmHg(x).MmHg,
        ["partial pressure in kPa"] = x => PartialPressure.FromKilopascals(x).Kilopascals,
        ["breath time"] = x => BreathTime.FromSeconds(x).Seconds,
        ["gas volume"] = x => GasVolume.FromMillilitres(x).Millilitres,
        ["gas flow"] = x => GasFlow.FromLitresPerMinute(x).LitresPerMinute,
        ["minute ventilation"] = x => MinuteVentilation.FromLitresPerMinute(x).LitresPerMinute,
        ["breath rate"] = x => BreathRate.FromPerMinute(x).PerMinute,
        ["body mass"] = x => BodyMass.FromKilograms(x).Kilograms,
        ["body height"] = x => BodyHeight.FromCentimetres(x).Centimetres,
        ["oxygen fraction"] = x => OxygenFraction.FromFraction(x).Fraction,
        ["saturation"] = x => Saturation.FromPercent(x).Percent,
        ["compliance"] = x => Compliance.FromMlPerCmH2O(x).MlPerCmH2O,
        ["resistance"] = x => Resistance.FromCmH2OSecondsPerLitre(x).CmH2OSecondsPerLitre,
        ["haemoglobin"] = x => HaemoglobinConcentration.FromGramsPerDecilitre(x).GramsPerDecilitre,
        ["bicarbonate"] = x => Bicarbonate.FromMmolPerLitre(x).MmolPerLitre,
        ["pH"] = x => BloodPH.FromPH(x).Value,
        ["barometric pressure"] = x => BarometricPressure.FromMmHg(x).MmHg,
    };

    /// <summary>The documented range of each type: lowest and highest accepted, then the nearest values refused.</summary>
    public static TheoryData<string, double, double, double, double> Limits => new()
    {
        { "airway pressure", -20, 150, -20.01, 150.01 },
        { "airway pressure in hPa", -19.6133, 147.09975, -19.62, 147.11 },
        { "partial pressure", 0, 1000, -0.01, 1000.01 },
        { "partial pressure in kPa", 0, 133.322, -0.01, 133.323 },
        { "breath time", 0, 60, -0.001, 60.001 },
        { "gas volume", 0, 5000, -0.1, 5000.1 },
        { "gas flow", 0, 300, -0.01, 300.01 },
        { "minute ventilation", 0, 60, -0.01, 60.01 },
        { "breath rate", 0, 150, -0.01, 150.01 },
        { "body mass", 0.001, 700, 0, 700.01 },
        { "body height", 120, 230, 119.9, 230.1 },
        { "oxygen fraction", 0.18, 1, 0.179, 1.001 },
        { "saturation", 0, 100, -0.01, 100.01 },
        { "compliance", 0.001, 500, 0, 500.01 },
        { "resistance", 0, 20000, -0.01, 20000.01 },
        { "haemoglobin", 0, 30, -0.01, 30.01 },
        { "bicarbonate", 0, 100, -0.01, 100.01 },
        { "pH", 6, 8.5, 5.999, 8.501 },
        { "barometric pressure", 200, 900, 199.99, 900.01 },
    };

    public static TheoryData<string> Units => [.. Factories.Keys];

    [Theory, MemberData(nameof(Limits))]
    public void Factory_AtEachLimit_AcceptsInsideAndRefusesOutside(string unit, double lowest, double highest, double below, double above)
    {
        var create = Factories[unit];

        Assert.Equal(lowest, create(lowest), 1e-9);
        Assert.Equal(highest, create(highest), 1e-9);
        Expect.Refused(() => create(below));
        Expect.Refused(() => create(above));
    }

    [Theory, MemberData(nameof(Units))]
    public void Factory_OnNaNOrInfinity_Refuses(string unit)
    {
        foreach (var value in new[] { double.NaN, double.PositiveInfinity, double.NegativeInfinity })
        {
            Expect.Refused(() => Factories[unit](value));
        }
    }

    [Fact]
    public void EveryUnitType_HasItsLimitsTested()
    {
        var factories = typeof(AirwayPressure).Assembly.GetExportedTypes()
            .Where(type => type.IsValueType && !type.IsEnum && type != typeof(SpontaneousShare))
            .SelectMany(type => type.GetMethods().Where(method => method.IsStatic && method.Name.StartsWith("From", StringComparison.Ordinal)))
            .Where(method => !method.Name.EndsWith("Altitude", StringComparison.Ordinal));

        Assert.Equal(Factories.Count, factories.Count());
        Assert.Equal(Factories.Keys.Order(), Limits.Select(row => row.Data.Item1).Order());
    }

    [Fact]
    public void Refusal_SaysWhichArgumentAndWhichRange()
    {
        var refusal = Assert.Throws<ArgumentOutOfRangeException>(() => BreathTime.FromSeconds(60.5));

        Assert.Equal("seconds", refusal.ParamName);
        Assert.StartsWith("60.5 is outside [0, 60].", refusal.Message, StringComparison.Ordinal);
    }
}
