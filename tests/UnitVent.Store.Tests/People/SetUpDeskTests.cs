using UnitVent.Charting.Results;
using UnitVent.Store.People;
using UnitVent.Store.Units;

namespace UnitVent.Store.Tests.People;

public sealed class SetUpDeskTests
{
    private static readonly NewUnit Unit = new("FIRST", "First unit", "Europe/Zurich", ["1", "2"]);

    [Fact]
    public async Task Complete_WithTheLatestSecret_HappensOnce_HoweverManyTry()
    {
        await using var store = new TestStore();
        await store.InitializeAsync();
        var desk = store.Get<SetUpDesk>();
        Assert.True(TestStore.Value(await desk.IsNeededAsync(TestStore.Cancel)));
        var old = TestStore.Value(await desk.IssueSecretAsync(TestStore.Cancel));
        var secret = TestStore.Value(await desk.IssueSecretAsync(TestStore.Cancel));

        Assert.Equal("secret.wrong", (await CompleteAsync(desk, old, "early")).Errors.Single().Code);
        var answers = await Task.WhenAll(Enumerable.Range(0, 5).Select(i => CompleteAsync(desk, secret, $"first-{i}")));

        Assert.Single(answers, a => a.Succeeded);
        Assert.All(answers.Where(a => !a.Succeeded), a => Assert.Equal("set-up.done", a.Errors.Single().Code));
        Assert.False(TestStore.Value(await desk.IsNeededAsync(TestStore.Cancel)));
        Assert.Equal("set-up.done", (await desk.IssueSecretAsync(TestStore.Cancel)).Errors.Single().Code);
        var person = Assert.Single(TestStore.Value(await store.Get<UserDesk>().ListAsync(UserDesk.CommandLine, TestStore.Cancel)));
        Assert.Equal((true, UnitRole.Physician), (person.IsAdministrator, person.Roles["FIRST"]));
    }

    [Fact]
    public async Task Complete_WithWhatCannotBe_SaysEverything_AndMakesNothing()
    {
        await using var store = new TestStore();
        await store.InitializeAsync();
        var desk = store.Get<SetUpDesk>();
        var secret = TestStore.Value(await desk.IssueSecretAsync(TestStore.Cancel));

        var result = await desk.CompleteAsync(secret, "admin", "Admin", "short", Unit with { Code = "no spaces", TimeZone = "Mars/Olympus" }, TestStore.Cancel);

        Assert.Equal(["code", "password", "timeZone"], result.Errors.Select(e => e.Field).Order());
        Assert.True(TestStore.Value(await desk.IsNeededAsync(TestStore.Cancel)));
        Assert.True((await CompleteAsync(desk, secret, "admin")).Succeeded);
    }

    private static Task<Result<bool>> CompleteAsync(SetUpDesk desk, string secret, string userName) =>
        desk.CompleteAsync(secret, userName, "Admin", "four quiet words here", Unit, TestStore.Cancel);
}
