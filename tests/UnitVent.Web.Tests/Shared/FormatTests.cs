using NodaTime;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Tests.Shared;

public sealed class FormatTests
{
    private static readonly DateTimeZone Zurich = DateTimeZoneProviders.Tzdb["Europe/Zurich"];
    private static readonly Instant Now = Instant.FromUtc(2026, 12, 1, 13, 5);

    [Theory]
    [InlineData(0.5, 2, "0.50")]
    [InlineData(-0.5, 1, "−0.5")]
    [InlineData(-0.04, 1, "0.0")]
    [InlineData(157.5, 0, "158")]
    [InlineData(-12.25, 1, "−12.3")]
    [InlineData(1234.5, 1, "1234.5")]
    public void Number_HasFixedDecimals_ALeadingZero_AndATrueMinus(double value, int decimals, string written) => Assert.Equal(written, Format.Number(value, decimals));

    [Fact]
    public void Number_ThatIsNotThere_IsADash() => Assert.Equal("–", Format.Number(null, 1));

    [Fact]
    public void Typed_KeepsTrailingZeros() => Assert.Equal(("7.40", "−2.0"), (Format.Typed(7.40m), Format.Typed(-2.0m)));

    [Theory]
    [InlineData(0, "14:05")]
    [InlineData(14 * 60, "00:05")]
    [InlineData((14 * 60) + 6, "Mon 30 Nov 23:59")]
    [InlineData(364 * 24 * 60, "Tue 2 Dec 2025 14:05")]
    public void Time_IsInTheUnitsZone_WithTheDayWhenItIsNotToday(int minutesAgo, string written) =>
        Assert.Equal(written, Format.Time(Now - Duration.FromMinutes(minutesAgo), Now, Zurich));

    [Theory]
    [InlineData(0, "just now")]
    [InlineData(59, "59 min ago")]
    [InlineData(120, "2 h ago")]
    [InlineData(130, "2 h 10 min ago")]
    [InlineData(24 * 60, "1 d ago")]
    [InlineData((51 * 60) + 20, "2 d 3 h ago")]
    public void Ago_IsInTheTwoLargestUnits(int minutes, string written) => Assert.Equal(written, Format.Ago(Now - Duration.FromMinutes(minutes), Now));
}
