using Microsoft.EntityFrameworkCore;
using Npgsql;
using UnitVent.Store.Cluster;
using UnitVent.Store.Schema;

namespace UnitVent.Store.Tests.Schema;

public sealed class ProtectionTests(TestStore store) : IClassFixture<TestStore>
{
    public static TheoryData<string> AppendOnly => ["entry", "strike_out", "follow_up_step", "flag_event", "episode_event", "patient_fact", "audit_event", "threshold_version", "threshold_answer"];

    public static TheoryData<string> Scoped => ["patient", "patient_fact", "episode", "bed_stay", "episode_event", "entry", "strike_out", "follow_up_step", "flag", "flag_event", "audit_event", "threshold_version", "threshold_answer"];

    [Theory, MemberData(nameof(AppendOnly))]
    public async Task RuntimeRole_MayNotChangeRemoveOrTruncate(string table)
    {
        foreach (var statement in new[] { $"update {table} set unit_id = unit_id", $"delete from {table}", $"truncate {table} cascade", $"drop table {table}", $"alter table {table} disable trigger all" })
        {
            var refusal = await Assert.ThrowsAsync<PostgresException>(() => Sql.TellAsync(store.Runtime, statement, store.UnitId));
            Assert.Equal(PostgresErrorCodes.InsufficientPrivilege, refusal.SqlState);
        }
    }

    [Theory]
    [InlineData("unit")]
    [InlineData("bed")]
    [InlineData("patient")]
    [InlineData("episode")]
    [InlineData("bed_stay")]
    [InlineData("flag")]
    [InlineData("unit_lookup")]
    [InlineData("api_token")]
    [InlineData("set_up")]
    [InlineData("audit_head")]
    public async Task RuntimeRole_RemovesNothing(string table)
    {
        var refusal = await Assert.ThrowsAsync<PostgresException>(() => Sql.TellAsync(store.Runtime, $"delete from {table}", store.UnitId));

        Assert.Equal(PostgresErrorCodes.InsufficientPrivilege, refusal.SqlState);
    }

    [Theory, MemberData(nameof(AppendOnly))]
    public async Task Owner_IsRefusedByTheTriggers(string table)
    {
        var refusal = await Assert.ThrowsAsync<PostgresException>(() => Sql.TellAsync(store.Owner, $"truncate {table} cascade", store.UnitId));

        Assert.Contains("append-only", refusal.MessageText);
    }

    [Theory, MemberData(nameof(Scoped))]
    public async Task WithoutAUnit_NothingIsSeen(string table)
    {
        await FilledAsync();

        Assert.Equal(0, await Sql.AskAsync<long>(store.Runtime, $"select count(*) from {table}"));
        Assert.Equal(0, await Sql.AskAsync<long>(store.Runtime, $"select count(*) from {table}", store.OtherUnitId));
    }

    [Fact]
    public async Task AnotherUnitsRow_CannotBeWritten()
    {
        var refusal = await Assert.ThrowsAsync<PostgresException>(() => Sql.TellAsync(
            store.Runtime,
            $"insert into audit_event (unit_id, at, who, what, detail) values ('{store.OtherUnitId}', now(), 'x', 'x', '')",
            store.UnitId));

        Assert.Equal(PostgresErrorCodes.InsufficientPrivilege, refusal.SqlState);
    }

    [Fact]
    public async Task Migrate_TwiceAtOnce_AndOnceMore_IsSafe()
    {
        await Task.WhenAll(Enumerable.Range(0, 3).Select(_ => StoreMigrations.MigrateAsync(store.Owner, DatabaseRoles.Runtime, TestStore.Cancel)));

        Assert.Equal(2, await Sql.AskAsync<long>(store.Owner, "select count(*) from \"__EFMigrationsHistory\""));
    }

    [Fact]
    public async Task Model_AndMigrations_Agree()
    {
        await using var db = new DesignTimeContextFactory().CreateDbContext([]);

        Assert.False(db.Database.HasPendingModelChanges());
    }

    private async Task FilledAsync()
    {
        if (await Sql.AskAsync<long>(store.Runtime, "select count(*) from entry", store.UnitId) == 0)
        {
            var episode = await store.AdmitAsync("1");
            await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Check(end: 40)));
        }
    }
}
