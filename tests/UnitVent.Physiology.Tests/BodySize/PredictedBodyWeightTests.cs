using System.Runtime.CompilerServices;
using static UnitVent.Physiology.LungSizeSex;
using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class PredictedBodyWeightTests
{
    /// <summary>Worked from the formula of the ARDS Network, N Engl J Med 2000;342:1301-1308.</summary>
    public static TheoryData<LungSizeSex, double, double, string> PublishedWeights => new()
    {
        { Male, 152.4, 50.00, "60 inches: the constant alone" },
        { Female, 152.4, 45.50, "60 inches: the constant alone" },
        { Male, 175, 70.57, "usual height" },
        { Female, 163, 55.15, "usual height" },
        { Male, 190, 84.22, "tall" },
        { Female, 150, 43.32, "below the reference height" },
        { Male, 177.8, 73.11, "70 inches" },
        { Female, 165.1, 57.06, "65 inches" },
        { Male, 177.8, 73.0, "inch form, 50 + 2.3 × 10" },
        { Female, 165.1, 57.0, "inch form, 45.5 + 2.3 × 5" },
    };

    [Theory, MemberData(nameof(PublishedWeights))]
    public void Compute_AtPublishedHeight_ReturnsPublishedWeight(LungSizeSex sex, double cm, double kilograms, string reason)
    {
        var tolerance = reason.StartsWith("inch form", StringComparison.Ordinal) ? 0.12 : 0.0055;

        Expect.Near(kilograms, PredictedBodyWeight.Compute(sex, Cm(cm)).Kilograms, tolerance, reason);
    }

    [Fact]
    public void Compute_AtTheHeightLimits_StaysAPossibleWeight()
    {
        Assert.Equal(16.016, PredictedBodyWeight.Compute(Female, Cm(120)).Kilograms, 1e-9);
        Assert.Equal(120.616, PredictedBodyWeight.Compute(Male, Cm(230)).Kilograms, 1e-9);
    }

    [Fact]
    public void Compute_WithoutHeight_Refuses() => Expect.RefusedSaying("Parameter 'height'", () => PredictedBodyWeight.Compute(Male, default));

    [Fact]
    public void Compute_ForAValueThatIsNoSex_Throws()
        => Assert.Throws<SwitchExpressionException>(() => PredictedBodyWeight.Compute((LungSizeSex)2, Cm(170)));
}
