using System.Net;
using UnitVent.Store.Auditing;
using UnitVent.Store.People;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Account;

[Collection(AppCollection.Name)]
public sealed class SignInTests(RunningApp app)
{
    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    [Fact]
    public async Task Person_SignsIn_AndGoesBackToWhereTheyWere()
    {
        var (_, name, password) = await app.PersonAsync(UnitRole.Nurse);
        var browser = new Browser(app);
        Assert.EndsWith("/sign-in?return=%2Fhandover", (await browser.GetAsync("/handover")).Location, StringComparison.Ordinal);
        Assert.EndsWith("/handover", (await browser.SignInAsync(name, password, "/handover")).Location, StringComparison.Ordinal);
        Assert.Equal(HttpStatusCode.OK, (await browser.GetAsync("/handover")).Status);
    }

    [Fact]
    public async Task Cookies_AreBoundToTheHost_AndUnreadableForScripts()
    {
        var (_, name, password) = await app.PersonAsync(UnitRole.Nurse);
        var browser = new Browser(app);
        await browser.SignInAsync(name, password);
        Assert.Equal(["__Host-form", "__Host-session"], browser.Cookies.Keys.Order(StringComparer.Ordinal));
        Assert.All(browser.Set, cookie =>
        {
            var attributes = cookie.Split("; ").Skip(1).Select(a => a.ToUpperInvariant()).ToList();
            Assert.Superset(new HashSet<string> { "PATH=/", "SECURE", "HTTPONLY", "SAMESITE=STRICT" }, attributes.ToHashSet());
            Assert.DoesNotContain(attributes, a => a.StartsWith("DOMAIN", StringComparison.Ordinal));
        });
    }

    [Fact]
    public async Task Stranger_AndWrongPassword_HearTheSame()
    {
        var (_, name, _) = await app.PersonAsync(UnitRole.Nurse);
        var wrong = await new Browser(app).SignInAsync(name, "a wrong password indeed");
        var stranger = await new Browser(app).SignInAsync("nobody-at-all", "a wrong password indeed");
        Assert.Equal((HttpStatusCode.OK, HttpStatusCode.OK), (wrong.Status, stranger.Status));
        Assert.Contains("do not fit together", wrong.Text, StringComparison.Ordinal);
        Assert.Contains("do not fit together", stranger.Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task SignIn_IsInTheAuditTrail()
    {
        var (id, name, password) = await app.PersonAsync(UnitRole.Nurse);
        await new Browser(app).SignInAsync(name, "a wrong password indeed");
        await new Browser(app).SignInAsync(name, password);
        var events = RunningApp.Value(await app.Desk<AuditTrail>().NewestAsync(AuditTrail.Everywhere, 100, Cancel)).Where(e => e.Subject == id).Select(e => e.What);
        Assert.Equal(["sign-in", "sign-in-failed"], events.Take(2));
    }

    [Fact]
    public async Task Form_WithoutItsToken_IsRefused()
    {
        var (_, name, password) = await app.PersonAsync(UnitRole.Nurse);
        var page = await new Browser(app).PostAsync("/sign-in", ("Typed.UserName", name), ("Typed.Password", password), ("_handler", "sign-in"));
        Assert.Equal(HttpStatusCode.BadRequest, page.Status);
    }

    [Fact]
    public async Task OneTimeCode_OpensNothingButItsChange()
    {
        var (_, name, code) = await app.PersonAsync(UnitRole.Nurse, password: null);
        var browser = new Browser(app);
        await browser.SignInAsync(name, code);
        Assert.Equal("/account/password", (await browser.GetAsync("/")).Location);
        var weak = await browser.SubmitAsync("/account/password", "password", ("Typed.Old", code), ("Typed.New", "too short"), ("Typed.Again", "too short"));
        Assert.Contains("15", weak.Text, StringComparison.Ordinal);
        await browser.SubmitAsync("/account/password", "password", ("Typed.Old", code), ("Typed.New", "four words in a row"), ("Typed.Again", "four words in a row"));
        Assert.Equal(HttpStatusCode.OK, (await browser.GetAsync("/")).Status);
    }

    [Fact]
    public async Task SignOut_EndsTheSession_CopiesOfItsCookieIncluded()
    {
        var browser = await SignedInAsync();
        var copy = new Browser(app);
        copy.Cookies["__Host-session"] = browser.Cookies["__Host-session"];
        Assert.Equal(HttpStatusCode.OK, (await copy.GetAsync("/")).Status);
        var password = await browser.GetAsync("/account/password");
        var token = password.Text.Split("name=\"__RequestVerificationToken\"")[1].Split("value=\"")[1].Split('"')[0];
        Assert.Equal("/sign-in?return=%2Fhandover", (await browser.PostAsync("/sign-out", ("__RequestVerificationToken", token), ("then", "switch"), ("back", "/handover"))).Location);
        Assert.Equal(HttpStatusCode.Redirect, (await copy.GetAsync("/")).Status);
    }

    [Fact]
    public async Task Person_OnceDisabled_IsOut()
    {
        var (id, name, password) = await app.PersonAsync(UnitRole.Nurse);
        var browser = new Browser(app);
        await browser.SignInAsync(name, password);
        RunningApp.Value(await app.Desk<UserDesk>().SetDisabledAsync(UserDesk.CommandLine, id, true, Cancel));
        Assert.Equal(HttpStatusCode.Redirect, (await browser.GetAsync("/")).Status);
        Assert.Contains("do not fit together", (await new Browser(app).SignInAsync(name, password)).Text, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Role_OnceTakenAway_IsGoneAtTheNextAction()
    {
        var (id, name, password) = await app.PersonAsync(UnitRole.Nurse);
        var browser = new Browser(app);
        await browser.SignInAsync(name, password);
        Assert.Equal(HttpStatusCode.OK, (await browser.GetAsync("/sheets/units/ICU.pdf")).Status);
        RunningApp.Value(await app.Desk<UserDesk>().SetMembershipAsync(UserDesk.CommandLine, id, RunningApp.Unit, null, Cancel));
        Assert.Equal(HttpStatusCode.NotFound, (await browser.GetAsync("/sheets/units/ICU.pdf")).Status);
    }

    [Theory]
    [InlineData(UnitRole.Nurse, false, false)]
    [InlineData(UnitRole.Physician, false, false)]
    [InlineData(UnitRole.ChargeTherapist, false, true)]
    [InlineData(UnitRole.Viewer, true, true)]
    public async Task Administration_IsOpenToAdministratorsAndKeepersOfBeds(UnitRole role, bool administers, bool opens)
    {
        var (_, name, password) = await app.PersonAsync(role, administers: administers);
        var browser = new Browser(app);
        await browser.SignInAsync(name, password);
        var page = await browser.GetAsync("/admin");
        Assert.Equal(opens ? HttpStatusCode.OK : HttpStatusCode.Redirect, page.Status);
    }

    private async Task<Browser> SignedInAsync()
    {
        var (_, name, password) = await app.PersonAsync(UnitRole.Nurse);
        var browser = new Browser(app);
        await browser.SignInAsync(name, password);
        return browser;
    }
}
