using UnitVent.Charting.Results;
using UnitVent.Store.Reading;

namespace UnitVent.Store.Tests.Reading;

public sealed class UnavailableTests
{
    /// <summary>The database goes away and comes back under the program: it says so, writes nothing, and recovers by itself.</summary>
    [Fact]
    public async Task DroppedConnections_AreARefusal_AndTheNextCallWorks()
    {
        var store = new TestStore();
        await store.InitializeAsync();
        var episode = await store.AdmitAsync("1");
        var gas = TestStore.New(store.Gas());

        var (name, elsewhere) = (Database(store), store.Owner.Replace(Database(store), "postgres", StringComparison.Ordinal));
        await Sql.TellAsync(elsewhere, $"alter database {name} allow_connections false");
        await Sql.TellAsync(store.Runtime.Replace(name, "postgres", StringComparison.Ordinal), $"select pg_terminate_backend(pid) from pg_stat_activity where datname = '{name}' and usename = current_user");
        var refused = await store.RecordAsync(episode, gas);
        var board = await store.Get<UnitBoards>().GetAsync(store.Charge, "ICU", TestStore.Cancel);

        Assert.Equal((Refusal.Unavailable, "store.unavailable"), (refused.Refusal, refused.Errors.Single().Code));
        Assert.Equal(Refusal.Unavailable, board.Refusal);

        await Sql.TellAsync(elsewhere, $"alter database {name} allow_connections true");
        Assert.False(TestStore.Value(await store.RecordAsync(episode, gas)).AlreadyStood);
        await store.DisposeAsync();
    }

    private static string Database(TestStore store) => new Npgsql.NpgsqlConnectionStringBuilder(store.Runtime).Database!;
}
