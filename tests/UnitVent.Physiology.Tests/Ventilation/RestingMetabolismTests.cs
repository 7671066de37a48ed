using System.Runtime.CompilerServices;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class RestingMetabolismTests
{
    /// <summary>Worked from Harris JA, Benedict FG. Proc Natl Acad Sci USA 1918;4:370-373 and Weir JB. J Physiol 1949;109:1-9
    /// (constants from memory): kg, cm, years, kcal/day, mL/min.</summary>
    public static TheoryData<LungSizeSex, double, double, double, double, double> PublishedPeople => new()
    {
        { LungSizeSex.Male, 80, 175, 60, 1637, 188.4 },
        { LungSizeSex.Female, 65, 163, 50, 1344, 154.8 },
    };

    [Theory, MemberData(nameof(PublishedPeople))]
    public void Prediction_OfPublishedPerson_IsAsPublished(LungSizeSex sex, double kg, double cm, double years, double kcal, double millilitres)
    {
        var actual = RestingMetabolism.HarrisBenedictKcalPerDay(sex, Kg(kg), Cm(cm), years);

        Assert.Equal(kcal, actual, 0.51);
        Assert.Equal(millilitres, RestingMetabolism.CarbonDioxideMlPerMin(actual), 0.051);
    }

    [Theory]
    [InlineData(20, 18, true)]
    [InlineData(400, 120, true)]
    [InlineData(19.9, 18, false)]
    [InlineData(400.1, 18, false)]
    [InlineData(20, 17.9, false)]
    [InlineData(20, 120.1, false)]
    [InlineData(20, double.NaN, false)]
    public void HarrisBenedict_AroundItsLimits_RefusesOutside(double kg, double years, bool expected)
        => Assert.Equal(expected, Record.Exception(() => RestingMetabolism.HarrisBenedictKcalPerDay(LungSizeSex.Male, Kg(kg), Cm(170), years)) is null);

    [Theory]
    [InlineData(0, true)]
    [InlineData(10000, true)]
    [InlineData(-0.1, false)]
    [InlineData(10000.1, false)]
    [InlineData(double.NaN, false)]
    public void CarbonDioxide_AroundItsLimits_RefusesOutside(double kcal, bool expected)
        => Assert.Equal(expected, Record.Exception(() => RestingMetabolism.CarbonDioxideMlPerMin(kcal)) is null);

    [Fact]
    public void HarrisBenedict_WithoutAnInput_Refuses()
    {
        Expect.Refused(() => RestingMetabolism.HarrisBenedictKcalPerDay(LungSizeSex.Male, default, Cm(170), 50));
        Expect.Refused(() => RestingMetabolism.HarrisBenedictKcalPerDay(LungSizeSex.Male, Kg(70), default, 50));
    }

    [Fact]
    public void HarrisBenedict_OfASexTheFormulaDoesNotKnow_Throws()
        => Assert.Throws<SwitchExpressionException>(() => RestingMetabolism.HarrisBenedictKcalPerDay((LungSizeSex)9, Kg(70), Cm(170), 50));
}
