using static UnitVent.Physiology.Tests.Given;

namespace UnitVent.Physiology.Tests;

public sealed class MeanPressureAgreementTests
{
    /// <summary>Common practice: the larger of 2 cmH2O and 10 %. Measured, computed, difference, percent, within.</summary>
    public static TheoryData<double, double, double, double, bool, string> PublishedPairs => new()
    {
        { 24.0, 25.2, -1.2, -4.8, true, "inside both" },
        { 22.0, 25.2, -3.2, -12.7, false, "outside both, below" },
        { 27.9, 25.2, 2.7, 10.7, false, "outside both, above" },
        { 12.0, 10.0, 2.0, 20.0, true, "2 cmH2O exactly" },
        { 12.1, 10.0, 2.1, 21.0, false, "just above 2 cmH2O" },
        { 44.0, 40.0, 4.0, 10.0, true, "10 % exactly" },
        { 44.1, 40.0, 4.1, 10.25, false, "just above 10 %" },
    };

    [Theory, MemberData(nameof(PublishedPairs))]
    public void Agreement_OfPublishedPair_IsAsPublished(
        double measured, double computed, double difference, double percent, bool within, string reason)
    {
        Expect.Near(difference, MeanPressureAgreement.DifferenceCmH2O(CmH2O(measured), CmH2O(computed)), 1e-9, reason);
        Expect.Near(percent, MeanPressureAgreement.DifferencePercent(CmH2O(measured), CmH2O(computed)), 0.051, reason);
        Assert.True(within == MeanPressureAgreement.IsWithinTolerance(CmH2O(measured), CmH2O(computed)), reason);
    }

    [Fact]
    public void DifferencePercent_OfNoPressure_Refuses()
    {
        Expect.Refused(() => MeanPressureAgreement.DifferencePercent(CmH2O(10), CmH2O(0)));
        Expect.Refused(() => MeanPressureAgreement.DifferencePercent(CmH2O(10), CmH2O(-1)));
    }
}
