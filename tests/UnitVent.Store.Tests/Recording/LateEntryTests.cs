using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Store.Episodes;
using UnitVent.Store.Reading;

namespace UnitVent.Store.Tests.Recording;

public sealed class LateEntryTests(TestStore store) : IClassFixture<TestStore>
{
    [Fact]
    public async Task StateOfThreeDaysAgo_CountsInTheReceiptAsItDoesInTheChart()
    {
        var episode = await store.AdmitAsync("1");
        var prone = TestStore.New(new BedsideEvent { At = store.Now - Duration.FromHours(72), What = EventKind.Prone });

        var receipt = TestStore.Value(await store.RecordAsync(episode, prone));

        Assert.True(receipt.After.Prone);
        Assert.True(TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, null, TestStore.Cancel)).Picture.Prone);
    }

    [Fact]
    public async Task OnlyReading_OfThreeDaysAgo_IsTheLatest_UntilANewerComes()
    {
        var episode = await store.AdmitAsync("2");
        var old = TestStore.New(store.Check(72 * 60)) with { Confirmed = ["ask.observedAt", "ask.beforeAirway"] };

        Assert.Equal(old.Id, TestStore.Value(await store.RecordAsync(episode, old)).After.Check!.Value.Id);
        var newer = TestStore.New(store.Check(5));
        Assert.Equal(newer.Id, TestStore.Value(await store.RecordAsync(episode, newer)).After.Check!.Value.Id);
    }

    [Fact]
    public async Task EndedEpisode_TakesLateEntriesForADay_AndNoneAfter()
    {
        var episode = await store.AdmitAsync("3");
        TestStore.Value(await store.Get<EpisodeDesk>().EndAsync(store.Charge, episode, Guid.CreateVersion7(), store.Now, Outcome.Liberated, TestStore.Cancel));
        var (start, note) = (store.Now, TestStore.New(new Note { At = store.Now - Duration.FromMinutes(5), Text = "n" }));
        try
        {
            store.Clock.Now = start + Duration.FromHours(24);
            Assert.True((await store.RecordAsync(episode, note)).Succeeded);
            store.Clock.Now += Duration.FromSeconds(1);
            Assert.True((await store.RecordAsync(episode, note)).Succeeded, "it stands already");
            Assert.Equal("episode.ended", (await store.RecordAsync(episode, note with { Id = Guid.CreateVersion7() })).Errors.Single().Code);
        }
        finally
        {
            store.Clock.Now = start;
        }
    }
}
