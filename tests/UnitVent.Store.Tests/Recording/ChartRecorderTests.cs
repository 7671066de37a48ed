using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Flags;
using UnitVent.Charting.Pictures;
using UnitVent.Charting.Results;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Recording;

namespace UnitVent.Store.Tests.Recording;

public sealed class ChartRecorderTests(TestStore store) : IClassFixture<TestStore>
{
    [Fact]
    public async Task Record_TheSameIdTwice_IsOneEntry()
    {
        var episode = await store.AdmitAsync("1");
        var gas = TestStore.New(store.Gas());

        var first = TestStore.Value(await store.RecordAsync(episode, gas));
        var second = TestStore.Value(await store.RecordAsync(episode, gas));

        Assert.Equal((false, true), (first.AlreadyStood, second.AlreadyStood));
        Assert.Equal(gas.Body, second.Entries.Single().Body);
        Assert.Equal(1, await CountAsync(gas.Id));
    }

    [Fact]
    public async Task Record_TheSameIdWithAnotherBody_IsAConflict()
    {
        var episode = await store.AdmitAsync("2");
        var gas = TestStore.New(store.Gas());
        await store.RecordAsync(episode, gas);

        var result = await store.RecordAsync(episode, gas with { Body = store.Gas(pO2: 76) });

        Assert.Equal(Refusal.Conflict, result.Refusal);
        Assert.Equal(1, await CountAsync(gas.Id));
    }

    [Fact]
    public async Task Record_TwentyTimesAtOnce_IsOneEntryAndTwentyEqualAnswers()
    {
        var episode = await store.AdmitAsync("3");
        var gas = TestStore.New(store.Gas());

        var answers = await Task.WhenAll(Enumerable.Range(0, 20).Select(_ => store.RecordAsync(episode, gas)));

        Assert.All(answers, a => Assert.Equal(gas.Body, TestStore.Value(a).Entries.Single().Body));
        Assert.Single(answers, a => !a.Value.AlreadyStood);
        Assert.Equal(1, await CountAsync(gas.Id));
    }

    [Fact]
    public async Task Pass_WithOneBadEntry_RecordsNothing()
    {
        var episode = await store.AdmitAsync("4");
        var (good, bad) = (TestStore.New(store.Check()), TestStore.New(store.Gas() with { PH = 9 }));

        var result = await store.RecordAsync(episode, good, bad);

        Assert.Equal("entries[1].pH", Assert.Single(result.Errors).Field);
        Assert.Equal(0, await CountAsync(good.Id));
        Assert.Null(await Sql.AskAsync<Guid?>(store.Runtime, $"select subject from audit_event where subject = '{good.Id}'", store.UnitId));
    }

    [Fact]
    public async Task Record_KeepsWhatWasTyped_WithItsTrailingZeros()
    {
        var episode = await store.AdmitAsync("5");
        var gas = TestStore.New(store.Gas() with { PH = 7.40m, PCO2 = 40, BicarbonateMmolL = 24.20m });
        TestStore.Value(await store.RecordAsync(episode, gas));

        Assert.Equal("7.40", await Sql.AskAsync<string>(store.Runtime, $"select body ->> 'pH' from entry where id = '{gas.Id}'", store.UnitId));
        Assert.Equal("24.20", await Sql.AskAsync<string>(store.Runtime, $"select body ->> 'bicarbonateMmolL' from entry where id = '{gas.Id}'", store.UnitId));
    }

    [Fact]
    public async Task Record_ALongRelease_RaisesItsFlagInTheSameTransaction()
    {
        var episode = await store.AdmitAsync("6");

        var receipt = TestStore.Value(await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Check(end: 40))));

        Assert.Contains(receipt.Steps, s => s is { Kind: FlagStepKind.Raised, Finding.Rule: "R01" });
        Assert.Contains(await FlagsAsync(episode), f => f.Finding.Rule == "R01");
    }

    [Fact]
    public async Task StrikeOut_TakesTheEntryOutOfEverything_AndKeepsItInTheChart()
    {
        var episode = await store.AdmitAsync("7");
        var check = TestStore.New(store.Check(end: 40));
        await store.RecordAsync(episode, TestStore.New(store.Aprv()), check);

        TestStore.Value(await store.Get<ChartRecorder>().StrikeOutAsync(store.Charge, episode, check.Id, Guid.CreateVersion7(), "wrong patient", TestStore.Cancel));

        var chart = TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, null, TestStore.Cancel));
        Assert.Null(chart.Picture.Check);
        Assert.DoesNotContain(chart.Flags, f => f.Finding.Rule == "R01");
        var page = TestStore.Value(await store.Get<ChartReader>().EntriesAsync(store.Charge, episode, new(), TestStore.Cancel));
        Assert.Equal("wrong patient", page.Items.Single(e => e.Id == check.Id).Struck!.Reason);
    }

    [Fact]
    public async Task StrikeOut_WithoutAReason_OrOfAnotherPersonsEntryByANurse_IsRefused()
    {
        var episode = await store.AdmitAsync("8");
        var note = TestStore.New(new Note { At = store.Now, Text = "n" });
        await store.RecordAsync(episode, note);
        var recorder = store.Get<ChartRecorder>();

        Assert.Equal(Refusal.Value, (await recorder.StrikeOutAsync(store.Charge, episode, note.Id, Guid.CreateVersion7(), " ", TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.Denied, (await recorder.StrikeOutAsync(store.With(UnitRole.Nurse), episode, note.Id, Guid.CreateVersion7(), "r", TestStore.Cancel)).Refusal);
    }

    [Fact]
    public async Task Correction_ReplacesTheEntry_AndTheReplacedOneStaysReadable()
    {
        var episode = await store.AdmitAsync("9");
        var wrong = TestStore.New(store.Gas(pO2: 50));
        await store.RecordAsync(episode, TestStore.New(store.Aprv()), wrong);

        var right = TestStore.New(store.Gas(pO2: 80)) with { Corrects = wrong.Id, CorrectionReason = "misread" };
        var receipt = TestStore.Value(await store.RecordAsync(episode, right));

        Assert.Equal(160, receipt.After[ValueNames.PfRatio].Value!.Value, 6);
        Assert.Contains(receipt.Steps, s => s is { Kind: FlagStepKind.ClosedByCorrection, Finding.Rule: "R25" });
        var page = TestStore.Value(await store.Get<ChartReader>().EntriesAsync(store.Charge, episode, new(), TestStore.Cancel));
        Assert.Equal(right.Id, page.Items.Single(e => e.Id == wrong.Id).ReplacedBy);
        Assert.Equal("corrects.unknown", (await store.RecordAsync(episode, right with { Id = Guid.CreateVersion7() })).Errors.Single().Code);
    }

    [Fact]
    public async Task BackdatedSetting_ChangesWhatIsDerivedAfterIt_AndNothingElse()
    {
        var episode = await store.AdmitAsync("10");
        await store.RecordAsync(episode, TestStore.New(store.Aprv(110)), TestStore.New(store.Gas(90) with { FiO2 = null }), TestStore.New(store.Gas(30, 80) with { FiO2 = null }));

        var receipt = TestStore.Value(await store.RecordAsync(episode, TestStore.New(store.Aprv(60) with { FiO2 = 0.4m })));

        Assert.Equal([150, 160], receipt.Before.Gases.Select(g => Math.Round(g.Values[ValueNames.PfRatio].Value!.Value)));
        Assert.Equal([150, 200], receipt.After.Gases.Select(g => Math.Round(g.Values[ValueNames.PfRatio].Value!.Value)));
    }

    [Fact]
    public async Task Time_AMinuteAhead_IsTakenAsNow()
    {
        var episode = await store.AdmitAsync("11");
        var note = TestStore.New(new Note { At = store.Now + Duration.FromMinutes(1), Text = "n" });

        Assert.Equal(store.Now, TestStore.Value(await store.RecordAsync(episode, note)).Entries.Single().EffectiveAt);
        Assert.True(TestStore.Value(await store.RecordAsync(episode, note)).AlreadyStood);
    }

    [Fact]
    public async Task FollowUp_IsOpenUntilDone()
    {
        var episode = await store.AdmitAsync("12");
        var followUp = TestStore.New(new FollowUp { What = "gas", DueAt = store.Now + Duration.FromHours(1), ForRole = "nurse" });
        Assert.Single(TestStore.Value(await store.RecordAsync(episode, followUp)).After.FollowUps);

        var (step, recorder) = (Guid.CreateVersion7(), store.Get<ChartRecorder>());
        TestStore.Value(await recorder.FollowUpStepAsync(store.Charge, followUp.Id, step, FollowUpStep.Done, null, null, TestStore.Cancel));

        Assert.Empty(TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, null, TestStore.Cancel)).Picture.FollowUps);
        Assert.True((await recorder.FollowUpStepAsync(store.Charge, followUp.Id, step, FollowUpStep.Done, null, null, TestStore.Cancel)).Succeeded);
        Assert.Equal(Refusal.Conflict, (await recorder.FollowUpStepAsync(store.Charge, followUp.Id, Guid.CreateVersion7(), FollowUpStep.Cancelled, null, null, TestStore.Cancel)).Refusal);
    }

    public static TheoryData<UnitRole, EntryKind, bool> WhoRecordsWhat => new()
    {
        { UnitRole.Viewer, EntryKind.Note, false },
        { UnitRole.Nurse, EntryKind.Note, true },
        { UnitRole.Nurse, EntryKind.Phase, true },
        { UnitRole.Nurse, EntryKind.Method, false },
        { UnitRole.Therapist, EntryKind.Method, true },
        { UnitRole.Therapist, EntryKind.Context, false },
        { UnitRole.ChargeTherapist, EntryKind.Context, true },
        { UnitRole.ChargeTherapist, EntryKind.Target, false },
        { UnitRole.Physician, EntryKind.Target, true },
    };

    [Theory, MemberData(nameof(WhoRecordsWhat))]
    public async Task Record_ByARole_IsAllowedOrDenied(UnitRole role, EntryKind kind, bool allowed)
    {
        var episode = await store.AdmitAsync("30");
        Entry body = kind switch
        {
            EntryKind.Phase => new PhaseChoice { Phase = CoursePhase.Weaning, From = store.Now },
            EntryKind.Method => new MethodChoice { Method = SettingMethod.FlowGuided, From = store.Now },
            EntryKind.Context => new ContextChange { Flag = Circumstance.Ards, From = store.Now },
            EntryKind.Target => new TargetSet { From = store.Now, Reason = "r" },
            _ => new Note { At = store.Now, Text = "n" },
        };

        var result = await store.Get<ChartRecorder>().RecordAsync(store.With(role), episode, [TestStore.New(body)], TestStore.Cancel);

        Assert.Equal(allowed ? null : Refusal.Denied, result.Refusal);
        await store.Get<Store.Episodes.EpisodeDesk>().EndAsync(store.Charge, episode, Guid.CreateVersion7(), store.Now, Charting.Episodes.Outcome.Liberated, TestStore.Cancel);
    }

    [Fact]
    public async Task OtherUnitsEpisode_AnswersAsIfAbsent()
    {
        var episode = await store.AdmitAsync("13");

        var result = await store.Get<ChartRecorder>().RecordAsync(store.Stranger(), episode, [TestStore.New(store.Gas())], TestStore.Cancel);

        Assert.Equal(Refusal.NotFound, result.Refusal);
        Assert.Equal(Refusal.NotFound, (await store.Get<ChartReader>().PatientAsync(store.Stranger(), episode, null, TestStore.Cancel)).Refusal);
    }

    private async Task<IReadOnlyList<Flag>> FlagsAsync(Guid episode) => TestStore.Value(await store.Get<ChartReader>().FlagsAsync(store.Charge, episode, false, TestStore.Cancel));

    private Task<long> CountAsync(Guid id) => Sql.AskAsync<long>(store.Runtime, $"select count(*) from entry where id = '{id}'", store.UnitId);
}
