using System.Text.Json.Nodes;
using UnitVent.Store.People;
using UnitVent.Web.Tests.Account;
using UnitVent.Web.Tests.Api;

namespace UnitVent.Web.Tests.Hosting;

[Collection(AppCollection.Name)]
public sealed class LogTests(RunningApp app)
{
    [Fact]
    public async Task Logs_CarryNothingOfAPatient_AndNoSecret()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync("Canaryname");
        await caller.PostAsync(episode + "/notes", new JsonObject { ["id"] = Caller.NewId(), ["at"] = caller.Ago(1), ["text"] = "Canarynote" });
        await caller.PostAsync(episode + "/notes", new JsonObject { ["id"] = Caller.NewId(), ["at"] = "Canarytime", ["text"] = 7 });
        await caller.GetAsync(episode + "/handover.pdf");
        await caller.GetAsync("/units/ICU/board");
        var (_, name, password) = await app.PersonAsync(UnitRole.Nurse, "a Canarypassword indeed");
        var browser = new Browser(app);
        await browser.SignInAsync(name, "a Canarymistake indeed");
        await browser.SignInAsync(name, password);
        await browser.GetAsync("/sheets" + episode + ".pdf");

        Assert.NotEmpty(app.Logs.Lines);
        Assert.DoesNotContain(app.Logs.Lines, line => line.Contains("Canary", StringComparison.OrdinalIgnoreCase));
        Assert.DoesNotContain(app.Logs.Lines, line => line.Contains("uv_", StringComparison.Ordinal));
    }
}
