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

    private static Standing Of(Chart chart)
    {
        var picture = chart.Picture();
        return Standing.Of(Raised(picture), picture);
    }

    private static List<Flag> Raised(Charting.Pictures.PatientPicture picture) =>
        [.. FlagLedger.Next([], picture, Guid.NewGuid).Select(s => FlagLedger.Apply(null, s, Guid.Empty, picture.AsOf))];
}
