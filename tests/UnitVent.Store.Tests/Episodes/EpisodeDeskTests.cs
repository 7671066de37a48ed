using NodaTime;
using UnitVent.Charting.Episodes;
using UnitVent.Charting.Pictures;
using UnitVent.Store.Episodes;
using UnitVent.Store.Reading;

namespace UnitVent.Store.Tests.Episodes;

public sealed class EpisodeDeskTests(TestStore store) : IClassFixture<TestStore>
{
    private EpisodeDesk Desk => store.Get<EpisodeDesk>();

    [Fact]
    public async Task Admit_FiftyAtOnceToOneBed_AdmitsExactlyOne()
    {
        var answers = await Task.WhenAll(Enumerable.Range(0, 50).Select(_ => Desk.AdmitAsync(store.Charge, "ICU", Admission("1"), TestStore.Cancel)));

        Assert.Single(answers, a => a.Succeeded);
        Assert.All(answers.Where(a => !a.Succeeded), a => Assert.Equal("bed.taken", a.Errors.Single().Code));
    }

    [Fact]
    public async Task Admit_TheSameIdTwice_IsOneEpisode()
    {
        var admission = Admission("2") with { ContextFlags = [Charting.Entries.Circumstance.Ards] };

        Assert.False(TestStore.Value(await Desk.AdmitAsync(store.Charge, "ICU", admission, TestStore.Cancel)).AlreadyStood);
        Assert.True(TestStore.Value(await Desk.AdmitAsync(store.Charge, "ICU", admission, TestStore.Cancel)).AlreadyStood);
        var chart = TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, admission.Id, null, TestStore.Cancel));
        Assert.True(chart.Picture.Has(Charting.Entries.Circumstance.Ards));
    }

    [Fact]
    public async Task Admit_WithWhatCannotBe_SaysEverything()
    {
        var admission = Admission("3") with { Patient = new PatientFacts { HeightCm = 400 }, AirwaySecuredAt = store.Now + Duration.FromHours(1) };

        var result = await Desk.AdmitAsync(store.Charge, "ICU", admission, TestStore.Cancel);

        Assert.Equal(["airwaySecuredAt", "patient.familyName", "patient.heightCm", "patient.mrn"], result.Errors.Select(e => e.Field).Order());
        Assert.Equal("bed.unknown", (await Desk.AdmitAsync(store.Charge, "ICU", Admission("none"), TestStore.Cancel)).Errors.Single().Code);
    }

    [Fact]
    public async Task Move_ToAFreeBed_Moves_AndToATakenOne_DoesNot()
    {
        var (moving, staying) = (await store.AdmitAsync("4"), await store.AdmitAsync("5"));
        var id = Guid.CreateVersion7();

        Assert.True((await Desk.MoveAsync(store.Charge, moving, id, "6", TestStore.Cancel)).Succeeded);
        Assert.True((await Desk.MoveAsync(store.Charge, moving, id, "6", TestStore.Cancel)).Succeeded);
        Assert.Equal("bed.taken", (await Desk.MoveAsync(store.Charge, staying, Guid.CreateVersion7(), "6", TestStore.Cancel)).Errors.Single().Code);
        Assert.Equal("6", await BedAsync(moving));
        Assert.Equal("5", await BedAsync(staying));
        Assert.NotEqual(Guid.Empty, await store.AdmitAsync("4"));
    }

    [Fact]
    public async Task End_FreesTheBed_TakesLateEntriesForADay_AndIsReopenedForTwo()
    {
        var episode = await store.AdmitAsync("7");
        await store.RecordAsync(episode, TestStore.New(store.Aprv(90)));
        TestStore.Value(await Desk.EndAsync(store.Charge, episode, Guid.CreateVersion7(), store.Now, Outcome.Liberated, TestStore.Cancel));

        Assert.True((await store.RecordAsync(episode, TestStore.New(store.Gas()))).Succeeded);
        Assert.DoesNotContain(TestStore.Value(await store.Get<UnitBoards>().GetAsync(store.Charge, "ICU", TestStore.Cancel)).Rows, r => r.Picture.Window.Episode.Id == episode);
        Assert.True((await Desk.ReopenAsync(store.Charge, episode, Guid.CreateVersion7(), "back on the ventilator", TestStore.Cancel)).Succeeded);
        Assert.Equal("7", await BedAsync(episode));
        TestStore.Value(await Desk.CancelAsync(store.Charge, episode, Guid.CreateVersion7(), "wrong patient", TestStore.Cancel));
        Assert.Equal("episode.ended", (await Desk.EndAsync(store.Charge, episode, Guid.CreateVersion7(), store.Now, Outcome.Died, TestStore.Cancel)).Errors.Single().Code);
    }

    [Fact]
    public async Task CorrectedHeight_ChangesPredictedWeight_ForTheWholeEpisode()
    {
        var episode = await store.AdmitAsync("8", "H1");
        var facts = new PatientFacts { Mrn = "H1", FamilyName = "Granit", Sex = Sex.Male, HeightCm = 190 };

        TestStore.Value(await Desk.CorrectPatientAsync(store.Charge, episode, Guid.CreateVersion7(), facts, "measured", TestStore.Cancel));

        var chart = TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, null, TestStore.Cancel));
        Assert.Equal(84.22, chart.Picture[ValueNames.PredictedBodyWeightKg].Value!.Value, 2); // 50 + 0.91 × (190 − 152.4), N Engl J Med 2000;342:1301
        Assert.Equal(2, await Sql.AskAsync<long>(store.Runtime, $"select count(*) from patient_fact f join episode e on e.patient_id = f.patient_id where e.id = '{episode}'", store.UnitId));
    }

    [Fact]
    public async Task SamePatient_TwiceInTheUnit_IsRefused()
    {
        await store.AdmitAsync("9", "TWICE");

        var result = await Desk.AdmitAsync(store.Charge, "ICU", Admission("10") with { Patient = new PatientFacts { Mrn = "TWICE", FamilyName = "Granit" } }, TestStore.Cancel);

        Assert.Equal("patient.admitted", result.Errors.Single().Code);
    }

    private async Task<string> BedAsync(Guid episode) =>
        TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, null, TestStore.Cancel)).Window.Episode.Bed;

    private Admission Admission(string bed) =>
        new(Guid.CreateVersion7(), bed, new PatientFacts { Mrn = Guid.NewGuid().ToString("N"), FamilyName = "Granit" }, store.Now - Duration.FromHours(5));
}
