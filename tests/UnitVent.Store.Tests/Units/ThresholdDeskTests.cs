using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.Live;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Units;

namespace UnitVent.Store.Tests.Units;

public sealed class ThresholdDeskTests : IAsyncLifetime
{
    private readonly TestStore store = new();
    private string unit = "";

    private ThresholdDesk Desk => store.Get<ThresholdDesk>();

    public async ValueTask InitializeAsync()
    {
        await store.InitializeAsync();
        unit = (await Sql.AskAsync<string>(store.Runtime, $"select code from unit where id = '{store.UnitId}'", store.UnitId))!;
    }

    public ValueTask DisposeAsync() => store.DisposeAsync();

    [Fact]
    public async Task Choice_BelowUrgentLevels_HoldsAtOnce_AndChangesWhatIsRaised()
    {
        var episode = await store.AdmitAsync("1");
        TestStore.Value(await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Check(end: 28))));
        Assert.Contains(await OpenAsync(episode), r => r == "R01");

        var chosen = TestStore.Value(await ChooseAsync(("R01.fixedRateTarget", 25)));

        Assert.Equal((store.Now, 25), (chosen.InForce!.From, chosen.Now.ReleasedLong.FixedRateTarget));
        Assert.Null(chosen.Waiting);
        store.Clock.Now += Duration.FromMinutes(1);
        Assert.Equal(1, await store.Get<DueEvaluator>().EvaluateDueAsync(TestStore.Cancel));
        Assert.DoesNotContain(await OpenAsync(episode), r => r == "R01");
    }

    [Fact]
    public async Task Choice_OverAnUrgentLevel_WaitsForASecondPerson()
    {
        var first = store.With(UnitRole.Physician, "First");
        var waiting = TestStore.Value(await ChooseAsync(first, ("R25.spO2LowPercent", 85))).Waiting!;

        Assert.Equal(88, TestStore.Value(await ReadAsync()).Now.LowOxygen.SpO2LowPercent);
        Assert.Equal("thresholds.second", (await Desk.AnswerAsync(first, unit, waiting.Id, true, TestStore.Cancel)).Errors.Single().Code);

        var agreed = TestStore.Value(await Desk.AnswerAsync(store.With(UnitRole.ChargeTherapist, "Second"), unit, waiting.Id, true, TestStore.Cancel));

        Assert.Equal((85, "Second", "First"), (agreed.Now.LowOxygen.SpO2LowPercent, agreed.InForce!.Answer!.By, agreed.InForce.By));
        Assert.Equal("thresholds.closed", (await Desk.AnswerAsync(store.With(UnitRole.Physician), unit, waiting.Id, false, TestStore.Cancel)).Errors.Single().Code);
    }

    [Fact]
    public async Task Choice_ThatTheSecondPersonRefuses_NeverHolds_AndStaysInTheHistory()
    {
        var waiting = TestStore.Value(await ChooseAsync(("R25.spO2LowPercent", 85))).Waiting!;

        var refused = TestStore.Value(await Desk.AnswerAsync(store.With(UnitRole.Physician), unit, waiting.Id, false, TestStore.Cancel));

        Assert.Null(refused.InForce);
        Assert.Equal((false, (Instant?)null), (refused.History.Single().Answer!.Agrees, refused.History.Single().From));
    }

    [Fact]
    public async Task PastPictures_UseTheThresholdsInForceThen()
    {
        var episode = await store.AdmitAsync("2");
        TestStore.Value(await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Check(end: 28))));
        var before = store.Now;
        store.Clock.Now += Duration.FromMinutes(5);
        await ChooseAsync(("R01.fixedRateTarget", 25));
        store.Clock.Now += Duration.FromMinutes(5);

        Assert.Equal(50, (await PatientAsync(episode, before)).Window.Unit.Thresholds.ReleasedLong.FixedRateTarget);
        Assert.Equal(25, (await PatientAsync(episode, null)).Window.Unit.Thresholds.ReleasedLong.FixedRateTarget);
    }

    [Theory]
    [InlineData("R25.spO2FloorPercent", 79, "R25.spO2FloorPercent", "hard floor: no unit goes below 80 %")]
    [InlineData("R01.fixedRateTarget", 76, "R01.fixedRateTarget", "above its limit")]
    [InlineData("R01.fixedRateTarget", double.NaN, "R01.fixedRateTarget", "not a number")]
    [InlineData("R99.nothing", 1, "R99.nothing", "no such threshold")]
    public async Task Choice_OutsideItsLimits_IsRefusedByName(string key, double value, string field, string reason)
    {
        var refused = await ChooseAsync((key, value));

        Assert.True(refused.Refusal == Refusal.Value, reason);
        Assert.Equal(field, refused.Errors.Single().Field);
        Assert.Empty(TestStore.Value(await ReadAsync()).History);
    }

    [Fact]
    public async Task Choice_WithTheSameId_IsMadeOnce_AndByANurse_Denied()
    {
        var id = Guid.CreateVersion7();
        var chosen = new Dictionary<string, double> { ["R04.cautionMlPerKg"] = 9 };
        await Desk.ChooseAsync(store.Charge, unit, id, chosen, "test", TestStore.Cancel);
        await Desk.ChooseAsync(store.Charge, unit, id, chosen, "test", TestStore.Cancel);

        Assert.Single(TestStore.Value(await ReadAsync()).History);
        Assert.Equal(Refusal.Denied, (await Desk.ChooseAsync(store.With(UnitRole.Nurse), unit, Guid.CreateVersion7(), chosen, "test", TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await Desk.ReadAsync(store.Stranger(), unit, TestStore.Cancel)).Refusal);
    }

    [Fact]
    public async Task DryRun_CountsTheCardsThatTheThresholdsWouldHaveOpened()
    {
        var episode = await store.AdmitAsync("3");
        TestStore.Value(await store.RecordAsync(episode, TestStore.New(store.Aprv()), TestStore.New(store.Check(end: 28))));
        store.Clock.Now += Duration.FromHours(1);

        var asItIs = TestStore.Value(await Desk.TryAsync(store.Charge, unit, new Dictionary<string, double>(), 7, TestStore.Cancel));
        var other = TestStore.Value(await Desk.TryAsync(store.Charge, unit, new Dictionary<string, double> { ["R01.fixedRateTarget"] = 25 }, 7, TestStore.Cancel));

        Assert.Contains(asItIs.Families, f => f is { Family: Charting.Rules.Family.Timing, Cards: 1, CautionOrUrgent: 1, CameBack: 0 });
        Assert.DoesNotContain(other.Families, f => f.Family == Charting.Rules.Family.Timing);
        Assert.True(asItIs.PatientDays > 0);
        Assert.Equal("days", (await Desk.TryAsync(store.Charge, unit, new Dictionary<string, double>(), 15, TestStore.Cancel)).Errors.Single().Field);
    }

    private Task<Result<UnitThresholds>> ChooseAsync(params (string Key, double Value)[] chosen) => ChooseAsync(store.Charge, chosen);

    private Task<Result<UnitThresholds>> ChooseAsync(Actor actor, params (string Key, double Value)[] chosen) =>
        Desk.ChooseAsync(actor, unit, Guid.CreateVersion7(), chosen.ToDictionary(c => c.Key, c => c.Value), "as the protocol says", TestStore.Cancel);

    private Task<Result<UnitThresholds>> ReadAsync() => Desk.ReadAsync(store.Charge, unit, TestStore.Cancel);

    private async Task<PatientChart> PatientAsync(Guid episode, Instant? at) => TestStore.Value(await store.Get<ChartReader>().PatientAsync(store.Charge, episode, at, TestStore.Cancel));

    private async Task<IEnumerable<string>> OpenAsync(Guid episode) => (await PatientAsync(episode, null)).Flags.Select(f => f.Finding.Rule);
}
