using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class OxygenContentTests
{
    /// <summary>Common practice, constants 1.34 and 0.0031 from memory: Hb g/dL, SaO2 %, PaO2 mmHg, content mL/dL.</summary>
    public static TheoryData<double, double, double, double> PublishedContents => new()
    {
        { 15, 97.5, 100, 19.91 },
        { 10, 90, 60, 12.25 },
        { 8, 95, 80, 10.43 },
    };

    [Theory, MemberData(nameof(PublishedContents))]
    public void ArterialMlPerDl_OnPublishedInputs_ReturnsPublishedContent(double hb, double percent, double paO2, double expected)
        => Assert.Equal(expected, OxygenContent.ArterialMlPerDl(GPerDl(hb), SatPercent(percent), MmHg(paO2)), 0.0051);
}
