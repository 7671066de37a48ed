using System.Net;
using UnitVent.Store.People;
using UnitVent.Web.SetUp;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Account;

/// <summary>The first run. Has a program of its own, in which nobody can sign in yet.</summary>
public sealed class SetUpTests(RunningApp app) : IClassFixture<RunningApp>
{
    private const string Password = "a first password of many letters";

    [Fact]
    public async Task SetUp_WithTheSecret_MakesAdministratorAndUnit_Once()
    {
        var browser = new Browser(app);
        Assert.Contains("/set-up", (await browser.GetAsync("/sign-in")).Text, StringComparison.Ordinal);
        var secret = RunningApp.Value(await app.Desk<SetUpDesk>().IssueSecretAsync(TestContext.Current.CancellationToken));
        Assert.Contains("secret is not the one", (await SubmitAsync(browser, "guessed")).Text, StringComparison.Ordinal);
        Assert.EndsWith("/sign-in", (await SubmitAsync(browser, secret)).Location, StringComparison.Ordinal);
        await browser.SignInAsync("first", Password);
        Assert.Equal(HttpStatusCode.OK, (await browser.GetAsync("/admin")).Status);
        Assert.Equal(HttpStatusCode.OK, (await browser.GetAsync("/sheets/units/NEW.pdf")).Status);
        Assert.Contains("done already", (await browser.GetAsync("/set-up")).Text, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("1-3, A", "1,2,3,A")]
    [InlineData("10–12", "10,11,12")]
    [InlineData("North-1;South", "North-1,South")]
    [InlineData("", "")]
    public void Beds_AreReadAsPeopleWriteThem(string typed, string beds) => Assert.Equal(beds, string.Join(',', BedList.Read(typed)));

    private static Task<Page> SubmitAsync(Browser browser, string secret) => browser.SubmitAsync(
        "/set-up", "set-up", ("Typed.Secret", secret), ("Typed.DisplayName", "First Person"), ("Typed.UserName", "first"), ("Typed.Password", Password),
        ("Typed.UnitName", "New unit"), ("Typed.Code", "NEW"), ("Typed.TimeZone", "Europe/Zurich"), ("Typed.Beds", "1-4"));
}
