using System.Net;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Account;

/// <summary>Guessing is slowed down. Has a program of its own: once slowed, this address signs nobody in for a while.</summary>
public sealed class GuessingTests(RunningApp app) : IClassFixture<RunningApp>
{
    [Fact]
    public async Task SignIn_TriedTooOften_IsSlowedDown()
    {
        var answers = new List<HttpStatusCode>();
        for (var i = 0; i < 31; i++)
        {
            answers.Add((await new Browser(app).PostAsync("/sign-in", ("_handler", "sign-in"))).Status);
        }

        Assert.Equal(HttpStatusCode.TooManyRequests, answers[^1]);
        Assert.Equal(HttpStatusCode.OK, (await new Browser(app).GetAsync("/livez")).Status);
    }
}
