using System.Net;
using NodaTime;
using UnitVent.Store.People;
using UnitVent.Web.Shared;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Account;

/// <summary>Sessions end by themselves. Has a program of its own, whose clock it puts forward.</summary>
public sealed class LongSessionTests(RunningApp app) : IClassFixture<RunningApp>
{
    [Fact]
    public async Task Session_LongerThanAShift_IsOver()
    {
        var (_, name, password) = await app.PersonAsync(UnitRole.Nurse);
        var browser = new Browser(app);
        await browser.SignInAsync(name, password);
        app.Clock.Ahead = Duration.FromHours(11);
        Assert.Equal(HttpStatusCode.OK, (await browser.GetAsync("/")).Status);
        app.Clock.Ahead = Duration.FromHours(12) + Duration.FromMinutes(1);
        Assert.Equal(HttpStatusCode.Redirect, (await browser.GetAsync("/")).Status);
    }

    [Fact]
    public void Circuit_WithoutInput_IsIdleAfterHalfAnHour()
    {
        var clock = new TestClock();
        var session = new CircuitSession(clock);
        clock.Ahead = Duration.FromMinutes(29);
        Assert.False(session.IsIdle);
        session.Touch();
        clock.Ahead += Duration.FromMinutes(29);
        Assert.False(session.IsIdle);
        clock.Ahead += Duration.FromMinutes(2);
        Assert.True(session.IsIdle);
    }
}
