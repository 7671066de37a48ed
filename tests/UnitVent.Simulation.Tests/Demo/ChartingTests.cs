using NodaTime;
using UnitVent.Charting.Checking;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Fields;

namespace UnitVent.Simulation.Tests.Demo;

/// <summary>What holds for every bed: charted as a careful staff would.</summary>
public sealed class ChartingTests
{
    public static TheoryData<double> Ages => [96.0, 30 * 24.0];

    [Fact]
    public void Unit_OfTheSeedFiles_IsInventedAndHasFourteenPatientsInItsBeds()
    {
        var unit = Demonstration.Unit;

        Assert.Equal("DEMO", unit.Code);
        Assert.Contains("invented", unit.Name, StringComparison.Ordinal);
        Assert.NotNull(DateTimeZoneProviders.Tzdb.GetZoneOrNull(unit.TimeZone));
        Assert.Equal(Enumerable.Range(1, 18).Select(i => $"{i}"), unit.Beds);
        Assert.Equal(14, unit.Episodes.Select(e => e.Admission.Bed).Intersect(unit.Beds).Count());
        Assert.Equal(14, unit.Episodes.Select(e => e.Admission.Patient.Mrn).Distinct().Count());
        Assert.All(unit.Episodes, e => Assert.Empty(AdmissionCheck.Verdict(e.Admission, e.AdmittedAt)));
    }

    [Fact]
    public void Actions_OfABed_AreInOrderOfRecordingAndNeverAheadOfTheBedside() => Assert.All(Demonstration.Unit.Episodes, episode =>
    {
        Assert.Equal(episode.Actions.OrderBy(a => a.RecordedAt), episode.Actions);
        Assert.All(episode.Actions, a => Assert.True(a.At < a.RecordedAt && a.RecordedAt <= Demonstration.FirstLoad && a.Entries.Count > 0));
    });

    [Theory, MemberData(nameof(Ages))]
    public void Entries_AtTheirRecording_PassEveryCheck(double hours) => Assert.All(Demonstration.At(Demonstration.Origin + Duration.FromHours(hours)).Episodes, episode =>
    {
        var chart = new ReplayedChart(episode);
        foreach (var action in episode.Actions)
        {
            Assert.All(action.Entries, e => Assert.Empty(EntryCheck.Verdict(e, chart.Window(), action.RecordedAt)));
            chart.Record(action);
        }
    });

    [Fact]
    public void Numbers_AsTyped_HaveNoMoreDecimalsThanTheirField() => Assert.All(Demonstration.Unit.Entries(), e =>
        Assert.All(EntryFields.Of(e.Entry.Body.GetType()).Where(f => f.Number is not null && f.ValueIn(e.Entry.Body) is decimal), f =>
        {
            var typed = (decimal)f.ValueIn(e.Entry.Body)!;
            Assert.True(typed.Scale <= f.Number!.Decimals + (f.Name == "pH" ? 1 : 0), $"{f.Name} {typed}");
        }));

    [Fact]
    public void PH_AsTyped_KeepsTheDecimalsOfItsAnalyser() => Assert.All(Demonstration.Unit.Episodes, episode =>
    {
        var decimals = episode.Of<BloodGas>().Select(g => (int)g.Body.PH!.Value.Scale).Distinct();
        Assert.InRange(Assert.Single(decimals), 2, 3);
    });

    [Fact]
    public void Gases_UnlessTypedWrongly_FitThemselves() => Assert.All(Demonstration.Unit.Episodes, episode =>
        Assert.All(episode.Of<BloodGas>(), gas =>
        {
            var wrong = episode.Admission.Bed == "7" && gas.Hour is >= 85 and < 96;
            var fit = GasConsistency.Of(gas.Body)!;
            Assert.True(wrong ? fit.BeyondRounding > GasConsistency.CautionBeyond : Math.Abs(fit.DeltaPH) <= GasConsistency.AdvisoryBeyond, $"{gas.Hour}: {fit}");
        }));

    [Theory, MemberData(nameof(Ages))]
    public void Gases_OnTheSlip_CarryTheFiO2InForce(double hours) => Assert.All(Demonstration.At(Demonstration.Origin + Duration.FromHours(hours)).Episodes, episode =>
    {
        var settings = episode.Of<SettingChange>();
        Assert.All(episode.Of<BloodGas>().Where(g => g.Hour > settings[0].Hour), g => Assert.Equal(settings.Last(s => s.Hour <= g.Hour).Body.FiO2, g.Body.FiO2));
    });

    [Fact]
    public void Checks_OfABed_AreNeverMoreThanFourHoursApart() => Assert.All(Demonstration.Unit.Episodes, episode =>
    {
        var hours = episode.Of<VentilatorCheck>().Select(c => c.Hour).Prepend(0).ToList();
        Assert.All(hours.Zip(hours.Skip(1)), pair => Assert.InRange(pair.Second - pair.First, 0, 4.1));
        Assert.True(episode.Admission.Bed == "8" || 96 - hours[^1] < 4);
    });

    [Fact]
    public void Gases_OfABed_AreHoursApartAndFollowEachSettingChange() => Assert.All(Demonstration.Unit.Episodes, episode =>
    {
        var hours = episode.Of<BloodGas>().Select(g => g.Hour).ToList();
        Assert.All(hours.Zip(hours.Skip(1)), pair => Assert.InRange(pair.Second - pair.First, 1, 9));
        Assert.All(episode.Of<SettingChange>().Where(s => s.Hour < 80), s => Assert.Contains(hours, h => h - s.Hour is > 1 and < 2));
    });

    [Fact]
    public void Chart_OfTheUnit_HasEveryKindThatStaffCharts()
    {
        var kinds = Demonstration.Unit.Entries().Select(e => e.Entry.Body.Kind).ToHashSet();

        Assert.Superset(
            new HashSet<EntryKind>
            {
                EntryKind.SettingChange, EntryKind.BloodGas, EntryKind.VentilatorCheck, EntryKind.BreathingCheck, EntryKind.AirwayCheck,
                EntryKind.Event, EntryKind.Note, EntryKind.FollowUp, EntryKind.Target,
            },
            kinds);
    }
}
