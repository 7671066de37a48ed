using UnitVent.Charting.Bands;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Rules;

namespace UnitVent.Charting.Tests.Bands;

public sealed class StandingTests
{
    public static TheoryData<Entry[], Band, string> Charts => new()
    {
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(peak: 100, end: 60)], Band.NothingRaised, "a careful round" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(release: 600, peak: 100, end: 60)], Band.NothingRaised, "an advisory alone" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(peak: 100, end: 40)], Band.LookThisHour, "a caution" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(spO2: 85)], Band.LookNow, "an urgent card" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(400)], Band.NotKnown, "readings past their limit" },
        { [Chart.Aprv(), Chart.Gas(), Chart.Check(500)], Band.LookThisHour, "overdue by the second limit" },
        { [Chart.Aprv(), Chart.Gas(760), Chart.Check(peak: 100, end: 40)], Band.LookThisHour, "not known, but a caution is open" },
    };

    [Theory, MemberData(nameof(Charts))]
    public void Standing_OfAChart_IsInItsBand(Entry[] chart, Band expected, string reason)
    {
        var standing = Of(new Chart().With(chart));

        Assert.True(expected == standing.Band, $"{reason}: {standing}");
    }

    [Fact]
    public void InHand_StaysInItsBand()
    {
        var picture = new Chart().With(Chart.Aprv(), Chart.Gas(), Chart.Check(spO2: 85)).Picture();
        var hand = new Acknowledgement(Chart.Ago(1), "Nurse", null, Chart.Now + NodaTime.Duration.FromHours(1), null, null);

        var standing = Standing.Of([.. Raised(picture).Select(f => f with { InHand = hand })], picture);

        Assert.Equal(Band.LookNow, standing.Band);
        Assert.True(standing.Leading!.InHand);
    }

    [Fact]
    public void LongRelease_WhileOxygenFalls_StandsOnTheCollapseCard()
    {
        var standing = Of(new Chart().With(Chart.Aprv(), Chart.Gas(400, 100), Chart.Gas(40, 75), Chart.Check(peak: 100, end: 40)));

        var card = Assert.Single(standing.Cards);
        Assert.Equal(Family.Collapse, card.Family);
        Assert.Equal(["R01", "R24"], card.Flags.Select(f => f.Finding.Rule).Order());
    }

    /// <summary>A finding of one rule joins the card of another family only while that is open: rules that explain one another.</summary>
    public static TheoryData<string, Family, string, Family, Family> Joins => new()
    {
        { "R01", Family.Timing, "R24", Family.Collapse, Family.Collapse },
        { "R02", Family.Timing, "R59", Family.Airway, Family.Airway },
        { "R53", Family.Drive, "R21", Family.CarbonDioxide, Family.CarbonDioxide },
        { "R07", Family.Timing, "R24", Family.Collapse, Family.Timing },
        { "R02", Family.Timing, "R24", Family.Collapse, Family.Timing },
        { "R53", Family.Drive, "R25", Family.Oxygen, Family.Drive },
    };

    [Theory, MemberData(nameof(Joins))]
    public void Finding_StandsWithWhatItExplains(string rule, Family own, string other, Family otherFamily, Family expected)
    {
        var standing = Standing.Of([FlagOf(rule, own, 1), FlagOf(other, otherFamily, 2)], Chart.Round().Picture());

        Assert.Equal(expected, standing.Cards.Single(c => c.Flags.Any(f => f.Finding.Rule == rule)).Family);
        Assert.Equal(own, Assert.Single(Standing.Of([FlagOf(rule, own, 1)], Chart.Round().Picture()).Cards).Family);
    }

    [Fact]
    public void SuddenChange_TakesInWhatTheSameCheckShows_AndNothingElse()
    {
        var standing = Standing.Of(
            [FlagOf("R56", Family.Sudden, 1), FlagOf("R25", Family.Oxygen, 1), FlagOf("R47", Family.Circulation, 1), FlagOf("R21", Family.CarbonDioxide, 2), FlagOf("R18", Family.Entry, 1)],
            Chart.Round().Picture());

        Assert.Equal([Family.Sudden, Family.CarbonDioxide, Family.Entry], standing.Cards.Select(c => c.Family).OrderBy(f => f != Family.Sudden).ThenBy(f => f));
        Assert.Equal(["R25", "R47", "R56"], standing.Cards.Single(c => c.Family == Family.Sudden).Flags.Select(f => f.Finding.Rule).Order());
    }

    [Fact]
    public void HeardOfASetting_LeavesTheCards()
    {
        var picture = new Chart().With(Chart.Aprv(high: 32), Chart.Gas(), Chart.Check()).Picture();
        var flags = Raised(picture);

        Assert.Contains(Standing.Of(flags, picture).Cards, c => c.Leading.Finding.Rule == "R06");
        Assert.DoesNotContain(Standing.Of([.. flags.Select(f => f with { InHand = Hand(60) })], picture).Cards, c => c.Leading.Finding.Rule == "R06");
    }

    [Fact]
    public void CriteriaThatMatch_StepBackWhileACautionIsOpen()
    {
        var picture = Chart.Round().Picture();
        var matches = FlagOf("R38", Family.Liberation, 1, Severity.Information);

        Assert.Single(Standing.Of([matches], picture).Cards);
        Assert.DoesNotContain(Standing.Of([matches, FlagOf("R47", Family.Circulation, 2)], picture).Cards, c => c.Family == Family.Liberation);
    }

    /// <summary>Within the hour: an hour after it was raised, or when the time in hand is over.</summary>
    [Fact]
    public void LookThisHour_IsDueAnHourAfterItWasRaised_OrWhenTheTimeInHandIsOver()
    {
        var (picture, flag) = (Chart.Round().Picture(), FlagOf("R47", Family.Circulation, 1));

        Assert.Equal(flag.Since + NodaTime.Duration.FromHours(1), Standing.Of([flag], picture).DueAt);
        Assert.Equal(Chart.Now + NodaTime.Duration.FromMinutes(90), Standing.Of([flag with { InHand = Hand(90) }], picture).DueAt);
        Assert.Null(Standing.Of([], picture).DueAt);
    }

    [Fact]
    public void Why_CarriesAgeAndFurtherCards()
    {
        var why = Of(new Chart().With(Chart.Aprv(), Chart.Gas(bicarbonate: 35), Chart.Check(peak: 100, end: 40))).Why;

        Assert.EndsWith("· 11:35 · +1 more", why);
    }

    [Fact]
    public void Why_OfALateEntry_SaysSo()
    {
        var chart = new Chart().With(Chart.Aprv(), Chart.Gas());
        var window = chart.Window();
        var late = new ChartEntry(Chart.Id(70), Guid.Empty, Chart.Ago(50), Chart.Ago(5), "Nurse", 70, Chart.Check(50, peak: 100, end: 40));

        var picture = Charting.Pictures.PatientPicture.At(window.With([late]), Chart.Now);

        Assert.Contains("late entry", Standing.Of(Raised(picture), picture).Why);
    }

    private static Flag FlagOf(string rule, Family family, long entry, Severity severity = Severity.Caution) => new(
        Guid.NewGuid(),
        Guid.Empty,
        new Finding(rule, family, severity, "says", "look", Chart.Ago(30), new Dictionary<string, double>(), [Chart.Id(entry)]),
        Chart.Ago(30));

    private static Acknowledgement Hand(double minutes) => new(Chart.Ago(1), "Nurse", null, Chart.Now + NodaTime.Duration.FromMinutes(minutes), null, null);

    private static Standing Of(Chart chart)
    {
        var picture = chart.Picture();
        return Standing.Of(Raised(picture), picture);
    }

    private static List<Flag> Raised(Charting.Pictures.PatientPicture picture) =>
        [.. FlagLedger.Next([], picture, Guid.NewGuid).Select(s => FlagLedger.Apply(null, s, Guid.Empty, picture.AsOf))];
}
