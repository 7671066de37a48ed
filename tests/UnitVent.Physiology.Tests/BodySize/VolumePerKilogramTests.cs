using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class VolumePerKilogramTests
{
    /// <summary>Arithmetic on the unit of the ARDS Network protocol, N Engl J Med 2000;342:1301-1308.</summary>
    public static TheoryData<double, double, double> PublishedVolumes => new()
    {
        { 420, 70.57, 5.95 },
        { 420, 55.15, 7.62 },
        { 300, 50.0, 6.0 },
        { 500, 43.32, 11.54 },
    };

    [Theory, MemberData(nameof(PublishedVolumes))]
    public void Compute_OnPublishedPair_ReturnsPublishedQuotient(double millilitres, double kilograms, double expected)
        => Assert.Equal(expected, VolumePerKilogram.Compute(Ml(millilitres), Kg(kilograms)), 0.005);

    [Fact]
    public void Compute_WithoutBodyMass_Refuses() => Expect.Refused(() => VolumePerKilogram.Compute(Ml(420), default));
}
