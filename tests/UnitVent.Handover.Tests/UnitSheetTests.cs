using UnitVent.Charting.Bands;

namespace UnitVent.Handover.Tests;

public sealed class UnitSheetTests
{
    private const string Why = "P/F 190 → 158 in 12 h at equal mean pressure 25; end of release 60 → 51 % of peak";

    [Fact]
    public void Patients_StandInWalkingOrder()
    {
        var text = Print(["4", "9", "10"]).Text;

        var places = new[] { "10 Żółć", "9 Żółć", "4 Żółć" }.Select(bed => text.IndexOf($"\n{bed}", StringComparison.Ordinal)).ToList();
        Assert.DoesNotContain(-1, places);
        Assert.Equal(places.Order(), places);
    }

    [Theory]
    [InlineData(Band.LookNow, "Look now")]
    [InlineData(Band.LookThisHour, "Look this hour")]
    [InlineData(Band.NotKnown, "Not known since 12:05")]
    [InlineData(Band.NothingRaised, "Nothing raised")]
    public void Band_IsSaidInWordsWithItsReason(Band band, string words)
    {
        var sheet = Print([ExampleChart.InBed("4", band, Why, ExampleChart.Ago(2))]);

        Assert.Contains(words, sheet.Text);
        Assert.Contains("P/F 190 → 158", sheet.Text);
    }

    [Theory, InlineData(true, "Not known since"), InlineData(false, "Nothing raised")]
    public void Band_ThatItsOwnSentenceNames_IsNotSaidTwice(bool emptyChart, string words)
    {
        var now = (emptyChart ? ExampleChart.Empty : ExampleChart.Full).Now;

        var sheet = Print([new UnitSheetPatient(now, Standing.Of([], now))]);

        Assert.Equal(2, sheet.Text.Split(words, StringSplitOptions.None).Length);
        Assert.DoesNotContain(words.ToLowerInvariant(), sheet.Text);
    }

    [Theory, InlineData(Paper.A4), InlineData(Paper.Letter)]
    public void FortyPatients_AreCompleteOnWholeRowsInsideTheMargins(Paper paper)
    {
        var sheet = Print([.. Enumerable.Range(1, 40).Select(i => ExampleChart.InBed($"B{i}", (Band)(i % 4), $"begin{i} {Why} end{i}"))], paper);

        SheetAssert.IsInsideMargins(sheet);
        SheetAssert.HasNoOverlaps(sheet);
        Assert.All(Enumerable.Range(1, 40), i => Assert.Single(
            sheet.Pages,
            page => page.Text.Contains($"begin{i} ", StringComparison.Ordinal) && page.Text.Contains($"end{i}", StringComparison.Ordinal)));
        Assert.All(sheet.Pages, page => Assert.Contains("Bed Patient", page.Text));
    }

    [Fact]
    public void UnitWithoutPatients_SaysSo() => Assert.Contains("No ventilated patients.", Print(Array.Empty<UnitSheetPatient>()).Text);

    private static PrintedSheet Print(string[] beds) => Print([.. beds.Select(bed => ExampleChart.InBed(bed, Band.LookNow, Why))]);

    private static PrintedSheet Print(UnitSheetPatient[] patients, Paper paper = Paper.A4) =>
        PrintedSheet.Read(UnitSheet.Render(new UnitSheetInput(ExampleChart.Unit, patients, ExampleChart.Now, "R. Therapist"), paper));
}
