using System.Net;
using UnitVent.Web.Tests.Account;
using UnitVent.Web.Tests.Api;

namespace UnitVent.Web.Tests.Hosting;

/// <summary>What callers hear when the database is gone. Has a program of its own, whose database it takes away.</summary>
public sealed class LostStoreTests(RunningApp app) : IClassFixture<RunningApp>
{
    [Fact]
    public async Task Store_Gone_IsSaidAsSuch_AndTheProgramLives()
    {
        var caller = await Caller.OfAsync(app);
        Assert.Equal(HttpStatusCode.OK, (await caller.GetAsync("/units")).Status);
        Assert.Equal(HttpStatusCode.OK, await StatusAsync("/readyz"));
        var browser = new Browser(app);
        await browser.GetAsync("/sign-in");
        await app.DropDatabaseAsync();
        var answer = await caller.GetAsync("/units");
        Assert.Equal((HttpStatusCode.ServiceUnavailable, "application/problem+json"), (answer.Status, answer.MediaType));
        Assert.Equal(HttpStatusCode.ServiceUnavailable, await StatusAsync("/readyz"));
        Assert.Equal(HttpStatusCode.OK, await StatusAsync("/livez"));
        Assert.Contains("does not answer", (await browser.SignInAsync("somebody", RunningApp.Password)).Text, StringComparison.Ordinal);
    }

    private async Task<HttpStatusCode> StatusAsync(string path)
    {
        using var answer = await app.Http.GetAsync(path, TestContext.Current.CancellationToken);
        return answer.StatusCode;
    }
}
