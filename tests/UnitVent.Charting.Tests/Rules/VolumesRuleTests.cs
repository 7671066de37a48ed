using UnitVent.Charting.Entries;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Rules;

/// <summary>Limits: common practice.</summary>
public sealed class VolumesRuleTests : RuleTable
{
    public static TheoryData<Entry[], Circumstance[], string, string> R04 => new()
    {
        // Male 175 cm: 70.566 kg, so 8, 10 and 12 mL/kg are 564.5, 705.7 and 846.8 mL.
        { [Chart.Aprv(), Chart.Check(release: 564)], [], Clear, "just under 8 mL/kg" },
        { [Chart.Aprv(), Chart.Check(release: 565)], [], "Advisory", "just over 8" },
        { [Chart.Aprv(), Chart.Check(release: 705)], [], "Advisory", "just under 10" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [], "Caution", "just over 10" },
        { [Chart.Aprv(), Chart.Check(release: 847)], [], "Urgent", "just over 12" },
        { [Chart.Aprv(high: 35, low: 0), Chart.Check(peak: 100, end: 57, release: 400)], [], "Caution", "swing 15.05" },
        { [Chart.Aprv(high: 35, low: 0), Chart.Check(peak: 100, end: 58, release: 400)], [], Clear, "swing 14.7" },
        { [Chart.Aprv(), Chart.Check(release: 706) with { ReleasesAveraged = 1 }], [], "Advisory", "one release is one level lower" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [Circumstance.EcmoVv], CannotTell, "ECMO" },
        { [Chart.Aprv(), Chart.Check(release: 706)], [Circumstance.AirLeak], CannotTell, "air leak" },
        { [Chart.Aprv(), Chart.Check(release: null)], [], CannotTell, "no release volume" },
        { [Chart.Aprv(), Chart.Check(361, release: 706)], [], CannotTell, "stale" },
    };

    [Theory, MemberData(nameof(R04))]
    public void R04_ReleaseVolumeHigh(Entry[] chart, Circumstance[] context, string expected, string reason) => Holds("R04", chart, context, expected, reason);

    [Fact]
    public void EstimatedHeight_LowersReleaseVolumeByOneLevel()
    {
        var chart = new Chart().With(Chart.Aprv(), Chart.Check(release: 706));
        chart.Patient = chart.Patient with { HeightEstimated = true };

        Assert.Equal(Severity.Advisory, Found(chart, "R04").Severity);
    }
}
