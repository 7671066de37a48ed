using System.Net;
using System.Text.Json.Nodes;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

[Collection(AppCollection.Name)]
public sealed class PassTests(RunningApp app)
{
    [Fact]
    public async Task Pass_RecordsAll_OnceHoweverOftenSent()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var pass = Pass(("settingChange", caller.Aprv()), ("ventilatorCheck", caller.Check()));
        Assert.Equal(HttpStatusCode.Created, (await caller.PostAsync(episode + "/pass", pass)).Status);
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(episode + "/pass", pass)).Status);
        var kinds = (await caller.GetAsync(episode + "/entries")).Json.GetProperty("items").EnumerateArray().Select(i => i.GetProperty("kind").GetString()).ToList();
        Assert.Equal((1, 1), (kinds.Count(k => k == "settingChange"), kinds.Count(k => k == "ventilatorCheck")));
    }

    [Fact]
    public async Task Pass_WithOneRefusedEntry_RecordsNothing()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var bad = caller.Check();
        bad["spO2Percent"] = 940;
        var answer = await caller.PostAsync(episode + "/pass", Pass(("settingChange", caller.Aprv()), ("ventilatorCheck", bad)));
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.Status);
        Assert.Contains("entries[1].spO2Percent", answer.Fields);
        Assert.Empty((await caller.GetAsync(episode + "/entries?kind=settingChange")).Json.GetProperty("items").EnumerateArray());
    }

    [Fact]
    public async Task Pass_WithUnknownKindAndMember_HearsOfBoth()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var check = caller.Check();
        check["surprise"] = 1;
        var answer = await caller.PostAsync(episode + "/pass", Pass(("prayer", new JsonObject()), ("ventilatorCheck", check)));
        Assert.Equal(HttpStatusCode.BadRequest, answer.Status);
        Assert.Equal(["entries[0].kind", "entries[1].body.surprise"], answer.Fields);
    }

    private static JsonObject Pass(params (string Kind, JsonObject Body)[] entries) => new()
    {
        ["id"] = Caller.NewId(),
        ["entries"] = new JsonArray([.. entries.Select(e =>
        {
            e.Body.Remove("id");
            return (JsonNode)new JsonObject { ["kind"] = e.Kind, ["body"] = e.Body };
        })]),
    };
}
