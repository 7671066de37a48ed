using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Episodes;
using UnitVent.Store.Episodes;

namespace UnitVent.Store.Tests.Episodes;

/// <summary>What the life of an episode cannot be, said with a sentence.</summary>
public sealed class EpisodeConflictTests(TestStore store) : IClassFixture<TestStore>
{
    private EpisodeDesk Desk => store.Get<EpisodeDesk>();

    [Fact]
    public async Task Admission_SentTenTimesAtOnce_IsOneEpisodeAndTenEqualAnswers()
    {
        var admission = Admission("1", "A1") with { ContextFlags = [Circumstance.Ards], Method = SettingMethod.FlowGuided };

        var answers = await Task.WhenAll(Enumerable.Range(0, 10).Select(_ => Desk.AdmitAsync(store.Charge, "ICU", admission, TestStore.Cancel)));

        Assert.All(answers, a => Assert.Equal(admission.Id, TestStore.Value(a).EpisodeId));
        Assert.Single(answers, a => !a.Value.AlreadyStood);
        Assert.Equal(3, await Sql.AskAsync<long>(store.Runtime, $"select count(*) from entry where episode_id = '{admission.Id}'", store.UnitId)); // context, phase, method
    }

    [Fact]
    public async Task Id_SentAgainWithSomethingElse_IsAConflict()
    {
        var (admission, id) = (Admission("2", "A2"), Guid.CreateVersion7());
        TestStore.Value(await Desk.AdmitAsync(store.Charge, "ICU", admission, TestStore.Cancel));
        TestStore.Value(await Desk.MoveAsync(store.Charge, admission.Id, id, "3", TestStore.Cancel));

        Assert.Equal("id.used", (await Desk.AdmitAsync(store.Charge, "ICU", admission with { Bed = "4" }, TestStore.Cancel)).Errors.Single().Code);
        Assert.Equal("id.used", (await Desk.MoveAsync(store.Charge, admission.Id, id, "4", TestStore.Cancel)).Errors.Single().Code);
        Assert.Equal("id.used", (await Desk.EndAsync(store.Charge, admission.Id, id, store.Now, Outcome.Died, TestStore.Cancel)).Errors.Single().Code);
    }

    [Fact]
    public async Task Reopen_OfAPatientWhoIsBackInAnotherBed_IsRefused()
    {
        var first = await store.AdmitAsync("5", "A5");
        await EndAsync(first);
        await store.AdmitAsync("6", "A5");

        Assert.Equal("patient.admitted", (await Desk.ReopenAsync(store.Charge, first, Guid.CreateVersion7(), "r", TestStore.Cancel)).Errors.Single().Code);
    }

    [Fact]
    public async Task Reopen_IntoATakenBed_OrAfterTwoDays_IsRefused()
    {
        var first = await store.AdmitAsync("7");
        await EndAsync(first);
        var second = await store.AdmitAsync("7");
        Assert.Equal("bed.taken", (await Desk.ReopenAsync(store.Charge, first, Guid.CreateVersion7(), "r", TestStore.Cancel)).Errors.Single().Code);

        await EndAsync(second);
        var start = store.Now;
        store.Clock.Now = start + Duration.FromHours(48) + Duration.FromSeconds(1);
        Assert.Equal("episode.not-reopened", (await Desk.ReopenAsync(store.Charge, first, Guid.CreateVersion7(), "r", TestStore.Cancel)).Errors.Single().Code);
        store.Clock.Now = start;
    }

    [Fact]
    public async Task Patient_CorrectedToAnotherOnesMrn_IsRefused()
    {
        var episode = await store.AdmitAsync("8", "A8");
        await store.AdmitAsync("9", "A9");

        var result = await Desk.CorrectPatientAsync(store.Charge, episode, Guid.CreateVersion7(), Facts("A9"), "mixed up", TestStore.Cancel);

        Assert.Equal("patient.admitted", result.Errors.Single().Code);
    }

    [Theory]
    [InlineData("10", 1, "in the future")]
    [InlineData("11", -6, "before the airway was secured")]
    public async Task End_AtATimeThatCannotBe_IsRefused(string bed, int hours, string reason)
    {
        var admission = Admission(bed, "A" + bed);
        TestStore.Value(await Desk.AdmitAsync(store.Charge, "ICU", admission, TestStore.Cancel));

        var result = await Desk.EndAsync(store.Charge, admission.Id, Guid.CreateVersion7(), store.Now + Duration.FromHours(hours), Outcome.Died, TestStore.Cancel);

        Assert.True(result.Errors.Single() is { Field: "endedAt", Code: "time.order" }, reason);
    }

    private async Task EndAsync(Guid episode) =>
        TestStore.Value(await Desk.EndAsync(store.Charge, episode, Guid.CreateVersion7(), store.Now, Outcome.Liberated, TestStore.Cancel));

    private Admission Admission(string bed, string mrn) => new(Guid.CreateVersion7(), bed, Facts(mrn), store.Now - Duration.FromHours(5));

    private static PatientFacts Facts(string mrn) => new() { Mrn = mrn, FamilyName = "Granit" };
}
