using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Flags;
using UnitVent.Store.Live;
using UnitVent.Store.Reading;

namespace UnitVent.Store.Tests.Live;

public sealed class LiveTests(TestStore store) : IClassFixture<TestStore>, IAsyncLifetime
{
    private ChangeFeed Feed => store.Get<ChangeFeed>();

    public async ValueTask InitializeAsync()
    {
        await Feed.StartAsync(TestStore.Cancel);
        await UntilAsync(() => Feed.Connected);
    }

    public async ValueTask DisposeAsync() => await Feed.StopAsync(CancellationToken.None);

    [Fact]
    public async Task Change_ReachesItsUnitsSubscribers_ThoughOneOfThemThrows()
    {
        var heard = new TaskCompletionSource();
        using var throwing = Feed.Subscribe(store.UnitId, () => throw new InvalidOperationException());
        using var listening = Feed.Subscribe(store.UnitId, () => { heard.TrySetResult(); return Task.CompletedTask; });

        await store.AdmitAsync("1");

        await heard.Task.WaitAsync(TimeSpan.FromSeconds(5), TestStore.Cancel);
    }

    [Fact]
    public async Task Feed_WhoseConnectionIsCut_ComesBackByItself()
    {
        var told = 0;
        using var listening = Feed.Subscribe(store.UnitId, () => { Interlocked.Increment(ref told); return Task.CompletedTask; });

        await Sql.TellAsync(store.Owner, "select pg_terminate_backend(pid) from pg_stat_activity where application_name = 'unitvent change feed' and datname = current_database() and usename = current_user");
        await Sql.TellAsync(store.Runtime, "select pg_terminate_backend(pid) from pg_stat_activity where application_name = 'unitvent change feed' and datname = current_database()");
        await UntilAsync(() => Volatile.Read(ref told) > 0 && Feed.Connected);
        var before = Volatile.Read(ref told);
        await store.AdmitAsync("2");

        await UntilAsync(() => Volatile.Read(ref told) > before);
    }

    [Fact]
    public async Task Board_IsSharedUntilSomethingChanges_AndEqualsThePatientsPictures()
    {
        var episode = await store.AdmitAsync("3");
        await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Gas()), TestStore.New(store.Check(end: 40)));
        await Task.Delay(300, TestStore.Cancel);
        var boards = store.Get<UnitBoards>();

        var first = TestStore.Value(await boards.GetAsync(store.Charge, "ICU", TestStore.Cancel));
        Assert.Same(first, TestStore.Value(await boards.GetAsync(store.Charge, "ICU", TestStore.Cancel)));
        Assert.Equal(Refusal.NotFound, (await boards.GetAsync(store.Stranger(), "ICU", TestStore.Cancel)).Refusal);

        var row = first.Rows.Single(r => r.Picture.Window.Episode.Id == episode);
        var chart = TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, null, TestStore.Cancel));
        Assert.Equal(chart.Picture.Values.Values.Select(v => (v.Name, v.Value, v.State)), row.Picture.Values.Values.Select(v => (v.Name, v.Value, v.State)));
        Assert.Equal(chart.Standing.Why, row.Standing.Why);

        await store.RecordAsync(episode, TestStore.New(store.Check(2)));
        await UntilAsync(() => !ReferenceEquals(first, boards.GetAsync(store.Charge, "ICU", TestStore.Cancel).Result.Value));
    }

    [Fact]
    public async Task TimeAlone_RaisesWhatIsDue_AndReopensWhatWasInHand()
    {
        var episode = await store.AdmitAsync("4");
        await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Gas()), TestStore.New(store.Check(end: 40)));
        var flag = TestStore.Value(await store.Get<ChartReader>().FlagsAsync(store.Charge, episode, false, TestStore.Cancel)).Single(f => f.Finding.Rule == "R01");
        var hand = TestStore.Value(await store.Get<FlagDesk>().AcknowledgeAsync(store.Charge, flag.Id, Guid.CreateVersion7(), "T low looked at", null, null, null, TestStore.Cancel));
        Assert.Equal(store.Now + Duration.FromHours(1), hand.InHand!.Until);

        var start = store.Now;
        store.Clock.Now = start + Duration.FromHours(6);
        try
        {
            Assert.True(await store.Get<DueEvaluator>().EvaluateDueAsync(TestStore.Cancel) > 0);
            var flags = TestStore.Value(await store.Get<ChartReader>().FlagsAsync(store.Charge, episode, false, TestStore.Cancel));
            Assert.Contains(flags, f => f.Finding.Rule == "R32");
            Assert.Null(flags.Single(f => f.Finding.Rule == "R01").InHand);
            Assert.Equal(0, await store.Get<DueEvaluator>().EvaluateDueAsync(TestStore.Cancel));
        }
        finally
        {
            store.Clock.Now = start;
        }
    }

    [Fact]
    public async Task ChartThatCannotBeRead_DoesNotKeepTheOthersFromTheirEvaluation()
    {
        var (broken, sound) = (await store.AdmitAsync("5"), await store.AdmitAsync("6"));
        await store.RecordAsync(sound, TestStore.New(store.Aprv()), TestStore.New(store.Check()));
        await Sql.TellAsync(
            store.Runtime,
            $$"""
            insert into entry (unit_id, id, episode_id, kind, effective_at, recorded_at, recorded_by, confirmed, body)
            values ('{{store.UnitId}}', gen_random_uuid(), '{{broken}}', 'Note', '2026-03-10T11:00Z', now(), 'T', array[]::text[], '{"unknown": 1}');
            update episode set next_evaluation_at = '2026-03-10T00:00Z' where id = '{{broken}}'
            """,
            store.UnitId);
        var start = store.Now;
        store.Clock.Now = start + Duration.FromHours(6);
        try
        {
            await store.Get<DueEvaluator>().EvaluateDueAsync(TestStore.Cancel);
            Assert.Contains(TestStore.Value(await store.Get<ChartReader>().FlagsAsync(store.Charge, sound, false, TestStore.Cancel)), f => f.Finding.Rule == "R32");
        }
        finally
        {
            store.Clock.Now = start;
            await Sql.TellAsync(store.Runtime, $"update episode set ended_at = now() where id = '{broken}'", store.UnitId);
        }
    }

    private static async Task UntilAsync(Func<bool> condition)
    {
        for (var i = 0; i < 200 && !condition(); i++)
        {
            await Task.Delay(50, TestStore.Cancel);
        }

        Assert.True(condition());
    }
}
