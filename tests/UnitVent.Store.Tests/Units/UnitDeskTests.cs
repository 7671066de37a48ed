using NodaTime;
using UnitVent.Charting.Entries;
using UnitVent.Charting.Results;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Units;

namespace UnitVent.Store.Tests.Units;

public sealed class UnitDeskTests(TestStore store) : IClassFixture<TestStore>
{
    private UnitDesk Desk => store.Get<UnitDesk>();

    public static TheoryData<NewUnit, string> Impossible => new()
    {
        { Unit() with { Code = "lower" }, "code" },
        { Unit() with { Name = " " }, "name" },
        { Unit() with { TimeZone = "Nowhere" }, "timeZone" },
        { Unit() with { Beds = ["1", "1 "] }, "beds" },
        { Unit() with { Settings = new() { AltitudeM = 6001 } }, "altitudeM" },
        { Unit() with { Settings = new() { AltitudeM = double.NaN } }, "altitudeM" },
        { Unit() with { Settings = new() { CheckInterval = Duration.FromMinutes(59) } }, "checkInterval" },
        { Unit() with { Settings = new() { ShiftStarts = [] } }, "shiftStarts" },
    };

    [Theory, MemberData(nameof(Impossible))]
    public async Task Create_WithWhatCannotBe_IsRefused(NewUnit unit, string field) =>
        Assert.Equal(field, (await Desk.CreateAsync(UserDesk.CommandLine, unit, TestStore.Cancel)).Errors.Single().Field);

    [Fact]
    public async Task Create_WithATakenCode_IsAConflict() =>
        Assert.Equal("unit.exists", (await Desk.CreateAsync(UserDesk.CommandLine, Unit() with { Code = "ICU" }, TestStore.Cancel)).Errors.Single().Code);

    [Fact]
    public async Task Settings_AreTheAdministrators_AndShapeHowChartsAreRead()
    {
        var settings = new UnitSettings { AltitudeM = 1500, TensionUnit = TensionUnit.KPa, Method = SettingMethod.FlowGuided, CheckInterval = Duration.FromHours(2), ShiftStarts = [new(19, 30), new(7, 30)] };

        Assert.Equal(Refusal.Denied, (await Desk.ChangeSettingsAsync(store.Charge, "ICU", settings, TestStore.Cancel)).Refusal);
        TestStore.Value(await Desk.ChangeSettingsAsync(UserDesk.CommandLine, "ICU", settings, TestStore.Cancel));

        var profile = Assert.Single(TestStore.Value(await store.Get<ChartReader>().UnitsAsync(store.Charge, TestStore.Cancel)));
        Assert.Equal((1500, TensionUnit.KPa, SettingMethod.FlowGuided, Duration.FromHours(2)), (profile.AltitudeM, profile.TensionUnit, profile.Method, profile.CheckInterval));
        Assert.Equal([new LocalTime(7, 30), new LocalTime(19, 30)], profile.ShiftStarts);
    }

    [Fact]
    public async Task Beds_AreKeptByChargeTherapists_AndATakenOneIsNotRetired()
    {
        await store.AdmitAsync("1");

        Assert.True((await Desk.AddBedAsync(store.Charge, "ICU", "side room", TestStore.Cancel)).Succeeded);
        Assert.Equal("side room", (await BedsAsync())[^1]);
        Assert.Equal("bed.taken", (await Desk.RetireBedAsync(store.Charge, "ICU", "1", TestStore.Cancel)).Errors.Single().Code);
        Assert.True((await Desk.RetireBedAsync(store.Charge, "ICU", "side room", TestStore.Cancel)).Succeeded);
        Assert.DoesNotContain("side room", await BedsAsync());
        Assert.Equal(Refusal.Denied, (await Desk.AddBedAsync(store.With(UnitRole.Nurse), "ICU", "x", TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await Desk.AddBedAsync(store.Stranger(), "ICU", "x", TestStore.Cancel)).Refusal);
    }

    private static NewUnit Unit() => new("NEW", "New unit", "Etc/UTC", ["1"]);

    private async Task<IReadOnlyList<string>> BedsAsync() => TestStore.Value(await Desk.ListAsync(UserDesk.CommandLine, TestStore.Cancel)).Single(u => u.Profile.Code == "ICU").Profile.Beds;
}
