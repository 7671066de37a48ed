using UnitVent.Store.Auditing;

namespace UnitVent.Store.Tests.Auditing;

public sealed class AuditTrailTests(TestStore store) : IClassFixture<TestStore>
{
    [Fact]
    public async Task Chain_OfParallelWriters_IsOneChain()
    {
        await Task.WhenAll(Enumerable.Range(0, 40).Select(i => store.Get<AuditTrail>().AppendAsync(store.OtherUnitId, "Tester", "sign-in", null, $"{i}", TestStore.Cancel)));

        Assert.Equal(40, await Sql.AskAsync<long>(store.Runtime, "select max(number) from audit_event", store.OtherUnitId));
        Assert.Null(TestStore.Value(await store.Get<AuditTrail>().VerifyAsync(store.OtherUnitId, TestStore.Cancel)));
    }

    public static TheoryData<string, long, string> Tampering => new()
    {
        { "update audit_event set who = 'Nobody' where number = 3", 3, "a changed row" },
        { "delete from audit_event where number = 4", 5, "a removed row" },
        { "delete from audit_event where number = 8", 8, "a removed tail" },
        { "update audit_event set number = 100 where number = 6", 7, "a row put elsewhere" },
        { "update audit_event set who = 'Nobody', hash = sha256(previous_hash || convert_to(audit_text(unit_id, number, at, 'Nobody', what, subject, detail), 'UTF8')) where number = 8", 8, "a last row hashed anew" },
    };

    [Theory, MemberData(nameof(Tampering))]
    public async Task Tampering_ByTheOwnerWithTheTriggersOff_IsFound(string statement, long firstBad, string reason)
    {
        var unit = Guid.NewGuid();
        for (var i = 0; i < 8; i++)
        {
            await store.Get<AuditTrail>().AppendAsync(unit, "Tester", "sign-in", Guid.NewGuid(), "", TestStore.Cancel);
        }

        await Sql.TellAsync(store.Owner, $"alter table audit_event disable trigger user; {statement}; alter table audit_event enable trigger user", unit);

        Assert.True(firstBad == TestStore.Value(await store.Get<AuditTrail>().VerifyAsync(unit, TestStore.Cancel)), reason);
    }

    [Fact]
    public async Task EveryWrite_LeavesItsTrace_AndNoValue()
    {
        var episode = await store.AdmitAsync("1");
        var gas = TestStore.New(store.Gas());
        await store.RecordAsync(episode, gas);

        var events = TestStore.Value(await store.Get<AuditTrail>().NewestAsync(store.UnitId, 10, TestStore.Cancel));

        Assert.Equal(["record", "admit"], events.Select(e => e.What));
        Assert.Equal((gas.Id, "BloodGas"), (events[0].Subject, events[0].Detail));
    }
}
