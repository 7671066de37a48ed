using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Store.Episodes;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Recording;

namespace UnitVent.Store.Tests.Recording;

/// <summary>What the recorder refuses with a sentence, where a database would answer with an error.</summary>
public sealed class RefusedRecordingTests(TestStore store) : IClassFixture<TestStore>
{
    private ChartRecorder Recorder => store.Get<ChartRecorder>();

    [Fact]
    public async Task Pass_WithNothingIn_OrOneIdTwice_IsRefused()
    {
        var episode = await store.AdmitAsync("1");
        var check = TestStore.New(store.Check());

        Assert.Equal("missing", (await store.RecordAsync(episode)).Errors.Single().Code);
        Assert.Equal("id.used", (await store.RecordAsync(episode, check, TestStore.New(store.Gas()) with { Id = check.Id })).Errors.Single().Code);
        Assert.Equal(0, await Sql.AskAsync<long>(store.Runtime, $"select count(*) from entry where id = '{check.Id}'", store.UnitId));
    }

    [Fact]
    public async Task Id_OfAnotherUnitsEntry_IsAConflict_AndShowsNothingOfIt()
    {
        var elsewhere = store.Stranger();
        var admission = new Charting.Episodes.Admission(Guid.CreateVersion7(), "A", new() { Mrn = "O1", FamilyName = "Other" }, store.Now - Duration.FromHours(1));
        TestStore.Value(await store.Get<EpisodeDesk>().AdmitAsync(elsewhere, "OTHER", admission, TestStore.Cancel));
        var theirs = TestStore.New(new Note { At = store.Now, Text = "theirs" });
        TestStore.Value(await Recorder.RecordAsync(elsewhere, admission.Id, [theirs], TestStore.Cancel));
        var episode = await store.AdmitAsync("2");

        var result = await store.RecordAsync(episode, theirs);

        Assert.Equal("id.used", result.Errors.Single().Code);
    }

    [Fact]
    public async Task Entry_SentAgainAsACorrectionOfAnother_IsAConflict()
    {
        var episode = await store.AdmitAsync("3");
        var (first, second) = (TestStore.New(store.Gas(40)), TestStore.New(store.Gas(20)));
        await store.RecordAsync(episode, first, second);

        var result = await store.RecordAsync(episode, second with { Corrects = first.Id, CorrectionReason = "r" });

        Assert.Equal("id.used", result.Errors.Single().Code);
    }

    [Fact]
    public async Task Correction_OfOneEntryTwiceInAPass_IsRefusedByItsPlace()
    {
        var episode = await store.AdmitAsync("4");
        var wrong = TestStore.New(store.Gas());
        await store.RecordAsync(episode, wrong);
        var right = TestStore.New(store.Gas(pO2: 80)) with { Corrects = wrong.Id, CorrectionReason = "r" };

        var result = await store.RecordAsync(episode, right, right with { Id = Guid.CreateVersion7() });

        Assert.Equal("entries[1].corrects", result.Errors.Single().Field);
    }

    [Fact]
    public async Task Correction_OfAnotherPersonsEntry_TakesAChargeTherapistOrAPhysician()
    {
        var episode = await store.AdmitAsync("5");
        var wrong = TestStore.New(store.Gas());
        await store.RecordAsync(episode, wrong);
        var right = TestStore.New(store.Gas(pO2: 80)) with { Corrects = wrong.Id, CorrectionReason = "r" };

        Assert.Equal("denied", (await Recorder.RecordAsync(store.With(UnitRole.Therapist), episode, [right], TestStore.Cancel)).Errors.Single().Code);
        Assert.True((await Recorder.RecordAsync(store.With(UnitRole.Physician), episode, [right], TestStore.Cancel)).Succeeded);
    }

    [Fact]
    public async Task StrikeOut_Again_IsOneStrike_AndItsIdServesNoOtherEntry()
    {
        var episode = await store.AdmitAsync("6");
        var (one, other, id) = (TestStore.New(store.Gas(40)), TestStore.New(store.Gas(20)), Guid.CreateVersion7());
        await store.RecordAsync(episode, one, other);

        TestStore.Value(await Recorder.StrikeOutAsync(store.Charge, episode, one.Id, id, "r", TestStore.Cancel));

        Assert.True((await Recorder.StrikeOutAsync(store.Charge, episode, one.Id, id, "r", TestStore.Cancel)).Succeeded);
        Assert.Equal("entry.struck", (await Recorder.StrikeOutAsync(store.Charge, episode, one.Id, Guid.CreateVersion7(), "r", TestStore.Cancel)).Errors.Single().Code);
        Assert.Equal("id.used", (await Recorder.StrikeOutAsync(store.Charge, episode, other.Id, id, "r", TestStore.Cancel)).Errors.Single().Code);
        Assert.Equal(Refusal.NotFound, (await Recorder.StrikeOutAsync(store.Charge, episode, Guid.NewGuid(), Guid.CreateVersion7(), "r", TestStore.Cancel)).Refusal);
    }

    [Fact]
    public async Task FollowUp_GivenToAnotherRole_IsTheirs_FromThenOn()
    {
        var episode = await store.AdmitAsync("7");
        var followUp = TestStore.New(new FollowUp { What = "gas", DueAt = store.Now + Duration.FromHours(3), ForRole = "nurse" });
        await store.RecordAsync(episode, followUp);
        var charted = store.Now;
        store.Clock.Now += Duration.FromMinutes(10);

        Assert.Equal("forRole", (await GiveAsync(followUp.Id, null)).Errors.Single().Field);
        Assert.True((await GiveAsync(followUp.Id, "therapist")).Succeeded);

        Assert.Equal("therapist", await ForAsync(episode, null));
        Assert.Equal("nurse", await ForAsync(episode, charted));
    }

    private Task<Result<FollowUpStep>> GiveAsync(Guid followUp, string? role) =>
        Recorder.FollowUpStepAsync(store.Charge, followUp, Guid.CreateVersion7(), FollowUpStep.Reassigned, null, role, TestStore.Cancel);

    private async Task<string?> ForAsync(Guid episode, Instant? at) =>
        TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, at, TestStore.Cancel)).Picture.FollowUps.Single().Body.ForRole;
}
