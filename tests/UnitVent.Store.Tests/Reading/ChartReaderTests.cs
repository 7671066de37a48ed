using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Store.Reading;

namespace UnitVent.Store.Tests.Reading;

public sealed class ChartReaderTests(TestStore store) : IClassFixture<TestStore>
{
    private ChartReader Reader => store.Get<ChartReader>();

    [Fact]
    public async Task PictureOfThePast_KnowsOnlyWhatWasEffectiveByThen()
    {
        var episode = await store.AdmitAsync("1");
        TestStore.Value(await store.RecordAsync(episode, TestStore.New(store.Aprv(110)), TestStore.New(store.Gas(90)), TestStore.New(store.Gas(30, 60))));

        var then = TestStore.Value(await Reader.PatientAsync(store.Charge, episode, store.Now - Duration.FromMinutes(60), TestStore.Cancel));
        var now = TestStore.Value(await Reader.PatientAsync(store.Charge, episode, null, TestStore.Cancel));

        Assert.Equal((150, 120), (Math.Round(then.Picture[ValueNames.PfRatio].Value!.Value), Math.Round(now.Picture[ValueNames.PfRatio].Value!.Value)));
        Assert.All(then.Flags, f => Assert.Null(f.InHand));
        Assert.Equal("time.future", (await Reader.PatientAsync(store.Charge, episode, store.Now + Duration.FromHours(1), TestStore.Cancel)).Errors.Single().Code);
    }

    [Fact]
    public async Task Entries_InPages_AreEachOnceAndNewestFirst_AlsoWhereTimesAreEqual()
    {
        var episode = await store.AdmitAsync("2");
        for (var i = 0; i < 3; i++)
        {
            await store.RecordAsync(episode, [.. Enumerable.Range(0, 4).Select(n => TestStore.New(new Note { At = store.Now - Duration.FromMinutes(i), Text = $"{n}" }))]);
        }

        var (seen, after) = (new List<ChartEntry>(), (string?)null);
        do
        {
            var page = TestStore.Value(await Reader.EntriesAsync(store.Charge, episode, new(Kind: EntryKind.Note, After: after, Limit: 5), TestStore.Cancel));
            seen.AddRange(page.Items);
            after = page.Next;
        }
        while (after is not null);

        Assert.Equal(12, seen.DistinctBy(e => e.Id).Count());
        Assert.Equal(seen.OrderByDescending(e => e.EffectiveAt).ThenByDescending(e => e.Sequence), seen);
        Assert.Equal(Refusal.Shape, (await Reader.EntriesAsync(store.Charge, episode, new(After: "nonsense"), TestStore.Cancel)).Refusal);
    }

    [Fact]
    public async Task Entries_OfARange_AreThoseOfTheRange()
    {
        var episode = await store.AdmitAsync("3");
        await store.RecordAsync(episode, TestStore.New(store.Check(50)), TestStore.New(store.Check(30)), TestStore.New(store.Check(10)));

        var page = TestStore.Value(await Reader.EntriesAsync(
            store.Charge, episode, new(store.Now - Duration.FromMinutes(40), store.Now - Duration.FromMinutes(20), EntryKind.VentilatorCheck), TestStore.Cancel));

        Assert.Equal(store.Now - Duration.FromMinutes(30), Assert.Single(page.Items).EffectiveAt);
    }

    [Fact]
    public async Task Timeline_HoldsTheRange_AndTheSettingsInForceAtItsStart()
    {
        var episode = await store.AdmitAsync("4");
        TestStore.Value(await store.RecordAsync(episode, TestStore.New(store.Aprv(110)), TestStore.New(store.Aprv(50, 26)), TestStore.New(store.Gas(30))));

        var timeline = TestStore.Value(await Reader.TimelineAsync(store.Charge, episode, store.Now - Duration.FromHours(1), store.Now, TestStore.Cancel));

        Assert.Equal([28, 26], timeline.Series.Single(s => s.Name == "pHighCmH2O").Points.Select(p => p.Value));
        Assert.Single(timeline.Series.Single(s => s.Name == "pfRatio").Points);
        Assert.Equal("to", (await Reader.TimelineAsync(store.Charge, episode, store.Now, store.Now, TestStore.Cancel)).Errors.Single().Field);
    }

    [Fact]
    public async Task Stranger_ReadsNothing()
    {
        var episode = await store.AdmitAsync("5");
        var stranger = store.Stranger();

        Assert.Equal(Refusal.NotFound, (await Reader.EntriesAsync(stranger, episode, new(), TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await Reader.FlagsAsync(stranger, episode, true, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await Reader.TimelineAsync(stranger, episode, store.Now - Duration.FromHours(1), store.Now, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await Reader.PrintedAsync(stranger, episode, TestStore.Cancel)).Refusal);
        Assert.DoesNotContain(TestStore.Value(await Reader.UnitsAsync(stranger, TestStore.Cancel)), u => u.Id == store.UnitId);
    }
}
