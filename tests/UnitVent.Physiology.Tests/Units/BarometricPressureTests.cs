namespace UnitVent.Physiology.Tests;

public sealed class BarometricPressureTests
{
    /// <summary>ISO 2533:1975, standard atmosphere.</summary>
    public static TheoryData<double, double, string> PublishedAltitudes => new()
    {
        { 0, 760.0, "sea level" },
        { 1500, 634.2, "845.6 hPa" },
        { 2600, 553.2, "a high capital" },
        { 3000, 525.9, "701.1 hPa" },
    };

    [Theory, MemberData(nameof(PublishedAltitudes))]
    public void FromAltitude_AtPublishedHeight_HasThePublishedPressure(double metres, double mmHg, string reason)
        => Expect.Near(mmHg, BarometricPressure.FromAltitude(metres).MmHg, 0.05, reason);

    [Fact]
    public void FromAltitude_AtEachLimit_AcceptsInsideAndRefusesOutside()
    {
        Assert.InRange(BarometricPressure.FromAltitude(-500).MmHg, 760, 900);
        Assert.InRange(BarometricPressure.FromAltitude(9000).MmHg, 200, 300);
        Expect.Refused(() => BarometricPressure.FromAltitude(-500.1));
        Expect.Refused(() => BarometricPressure.FromAltitude(9000.1));
        Expect.Refused(() => BarometricPressure.FromAltitude(double.NaN));
    }
}
