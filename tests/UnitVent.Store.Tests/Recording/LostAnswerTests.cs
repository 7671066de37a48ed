using Microsoft.Extensions.DependencyInjection;
using UnitVent.Charting.Results;
using UnitVent.Store.Recording;

namespace UnitVent.Store.Tests.Recording;

/// <summary>The answer to a commit is lost on the way: nobody is told that nothing was saved when it was.</summary>
public sealed class LostAnswerTests(TestStore store) : IClassFixture<TestStore>
{
    [Fact]
    public async Task Record_WhoseCommitTookButWasNotAnswered_FindsItsEntry()
    {
        var episode = await store.AdmitAsync("1");
        await using var line = new LossyLine(store.Runtime);
        await using var services = TestStore.Build(line.ConnectionString, store.Clock);
        var gas = TestStore.New(store.Gas());

        line.LoseNextCommitAnswer();
        var receipt = TestStore.Value(await services.GetRequiredService<ChartRecorder>().RecordAsync(store.Charge, episode, [gas], TestStore.Cancel));

        Assert.Equal(1, line.Lost);
        Assert.True(receipt.AlreadyStood);
        Assert.Equal(1, await CountAsync(gas.Id));
    }

    [Fact]
    public async Task Record_WhoseOutcomeCannotBeLearnt_SaysSo_AndTheSameIdSettlesItLater()
    {
        var episode = await store.AdmitAsync("2");
        var line = new LossyLine(store.Runtime);
        await using var services = TestStore.Build(line.ConnectionString, store.Clock);
        var gas = TestStore.New(store.Gas());

        line.LoseNextCommitAnswer(andGoDown: true);
        var result = await services.GetRequiredService<ChartRecorder>().RecordAsync(store.Charge, episode, [gas], TestStore.Cancel);
        await line.DisposeAsync();

        Assert.Equal((Refusal.Unavailable, "store.unknown"), (result.Refusal, result.Errors.Single().Code));
        Assert.True(TestStore.Value(await store.RecordAsync(episode, gas)).AlreadyStood);
    }

    private Task<long> CountAsync(Guid id) => Sql.AskAsync<long>(store.Runtime, $"select count(*) from entry where id = '{id}'", store.UnitId);
}
