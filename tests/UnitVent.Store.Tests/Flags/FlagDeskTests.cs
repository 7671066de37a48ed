using NodaTime;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Results;
using UnitVent.Charting.Rules;
using UnitVent.Store.Flags;
using UnitVent.Store.People;
using UnitVent.Store.Reading;

namespace UnitVent.Store.Tests.Flags;

public sealed class FlagDeskTests(TestStore store) : IClassFixture<TestStore>
{
    [Fact]
    public async Task Acknowledge_Again_IsOneStep_AndWithAnotherPlan_AConflict()
    {
        var (flag, id) = (await CautionAsync("1"), Guid.CreateVersion7());

        var hand = TestStore.Value(await TakeAsync(flag, id, "flow trace looked at")).InHand!;
        Assert.Equal(("flow trace looked at", store.Now + Duration.FromHours(1)), (hand.Plan, hand.Until));
        Assert.Equal(hand, TestStore.Value(await TakeAsync(flag, id, "flow trace looked at")).InHand);
        Assert.Equal("id.used", (await TakeAsync(flag, id, "something else")).Errors.Single().Code);
        Assert.Equal(1, await Sql.AskAsync<long>(store.Runtime, $"select count(*) from flag_event where flag_id = '{flag.Id}' and kind = 'Acknowledged'", store.UnitId));
    }

    [Fact]
    public async Task Acknowledge_TheSameIdForAnotherFlag_IsAConflict()
    {
        var (first, second, id) = (await CautionAsync("2"), await CautionAsync("3"), Guid.CreateVersion7());
        await TakeAsync(first, id, null);

        Assert.Equal("id.used", (await TakeAsync(second, id, null)).Errors.Single().Code);
    }

    public static TheoryData<string, double, Severity, bool> Hours => new()
    {
        { "10", 12, Severity.Caution, true },
        { "11", 12.1, Severity.Caution, false },
        { "12", 1, Severity.Urgent, true },
        { "13", 1.1, Severity.Urgent, false },
        { "14", -0.1, Severity.Caution, false },
    };

    [Theory, MemberData(nameof(Hours))]
    public async Task Acknowledge_UntilAnHour_IsBoundByTheSeverity(string bed, double hours, Severity severity, bool taken)
    {
        var flag = severity == Severity.Urgent ? await UrgentAsync(bed) : await CautionAsync(bed);

        var result = await store.Get<FlagDesk>().AcknowledgeAsync(store.Charge, flag.Id, Guid.CreateVersion7(), null, store.Now + Duration.FromHours(hours), null, null, TestStore.Cancel);

        Assert.Equal(taken ? null : "until", result.Errors.SingleOrDefault()?.Field);
    }

    [Fact]
    public async Task Acknowledge_ByTwoAtOnce_OneWins_AndTheOtherIsToldWho()
    {
        var flag = await CautionAsync("5");
        Task<Result<Flag>> Take(string name, bool over = false) =>
            store.Get<FlagDesk>().AcknowledgeAsync(store.With(UnitRole.Therapist, name), flag.Id, Guid.CreateVersion7(), null, null, null, null, TestStore.Cancel, over);

        var both = await Task.WhenAll(Take("Anna"), Take("Berta"));

        var (won, lost) = (both.Single(r => r.Succeeded).Value.InHand!.By, both.Single(r => !r.Succeeded));
        Assert.Equal((Refusal.Conflict, $"{won} took it in hand 0 min ago."), (lost.Refusal, lost.Errors.Single().Message));
        Assert.Equal("Clara", TestStore.Value(await Take("Clara", over: true)).InHand!.By);
    }

    [Fact]
    public async Task Acknowledge_ByANurse_IsDenied_AndByAStranger_NotFound()
    {
        var flag = await CautionAsync("4");

        Assert.Equal(Refusal.Denied, (await store.Get<FlagDesk>().AcknowledgeAsync(store.With(UnitRole.Nurse), flag.Id, Guid.CreateVersion7(), null, null, null, null, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await store.Get<FlagDesk>().AcknowledgeAsync(store.Stranger(), flag.Id, Guid.CreateVersion7(), null, null, null, null, TestStore.Cancel)).Refusal);
    }

    private Task<Result<Flag>> TakeAsync(Flag flag, Guid id, string? plan) =>
        store.Get<FlagDesk>().AcknowledgeAsync(store.Charge, flag.Id, id, plan, null, null, null, TestStore.Cancel);

    private async Task<Flag> CautionAsync(string bed)
    {
        var episode = await store.AdmitAsync(bed);
        await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Check(end: 40)));
        return await OnlyAsync(episode, Severity.Caution);
    }

    private async Task<Flag> UrgentAsync(string bed)
    {
        var episode = await store.AdmitAsync(bed);
        await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Gas(pO2: 50)));
        return await OnlyAsync(episode, Severity.Urgent);
    }

    private async Task<Flag> OnlyAsync(Guid episode, Severity severity) =>
        TestStore.Value(await store.Get<ChartReader>().FlagsAsync(store.Charge, episode, false, TestStore.Cancel)).Single(f => f.Finding.Severity == severity);
}
