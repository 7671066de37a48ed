using UnitVent.Charting.Trends;

namespace UnitVent.Charting.Tests.Trends;

public sealed class ReferenceChangeTests
{
    /// <summary>√2 × 1.96 × √(CVₐ² + CVᵢ²) by hand; 5.1 and 3.0 % are the spread of PaO2 and PaCO2 in stable patients, Chest 1983;84:14.</summary>
    public static TheoryData<double, double, double, string> HandWorkedValues => new()
    {
        { 1.5, 4.8, 13.94, "both spreads" },
        { 0, 5.1, 14.14, "PaO2" },
        { 0, 3.0, 8.32, "PaCO2" },
        { 2, 5, 14.93, "both spreads" },
        { 0, 0, 0, "nothing varies" },
    };

    [Theory, MemberData(nameof(HandWorkedValues))]
    public void Percent_ByHand(double analytical, double within, double expected, string reason) =>
        Assert.True(Math.Abs(expected - ReferenceChange.Percent(analytical, within)) < 0.005, reason);

    [Theory]
    [InlineData(-1, 5, .95)]
    [InlineData(1, double.NaN, .95)]
    [InlineData(1, 5, 1)]
    [InlineData(1, 5, 0)]
    public void Percent_OutsideItsRange_IsRefused(double analytical, double within, double confidence) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => ReferenceChange.Percent(analytical, within, confidence));
}
