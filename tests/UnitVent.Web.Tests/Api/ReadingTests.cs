using System.Net;
using System.Text;
using System.Text.Json;
using System.Text.Json.Nodes;
using UnitVent.Store.People;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

[Collection(AppCollection.Name)]
public sealed class ReadingTests(RunningApp app)
{
    [Fact]
    public async Task Units_AreThoseOfTheToken()
    {
        var units = (await (await Caller.OfAsync(app)).GetAsync("/units")).Json.EnumerateArray().ToList();
        Assert.Equal(["ICU"], units.Select(u => u.GetProperty("code").GetString()));
        Assert.Equal("Europe/Zurich", units[0].GetProperty("timeZone").GetString());
    }

    [Fact]
    public async Task Picture_HasValuesWithInputs_AndReasonsWhereThereIsNone()
    {
        var (caller, episode) = await ChartedAsync();
        var picture = (await caller.GetAsync(episode + "/picture")).Json;
        var ratio = picture.GetProperty("values").GetProperty("pfRatio");
        Assert.Equal((150.0, "ok", "derived"), (ratio.GetProperty("value").GetDouble(), ratio.GetProperty("state").GetString(), ratio.GetProperty("kind").GetString()));
        Assert.NotEmpty(ratio.GetProperty("inputs").EnumerateArray());
        var compliance = picture.GetProperty("values").GetProperty("staticCompliance");
        Assert.Equal(JsonValueKind.Null, compliance.GetProperty("value").ValueKind);
        Assert.NotEmpty(compliance.GetProperty("because").GetString()!);
    }

    [Fact]
    public async Task Value_SaysHowItWasMade()
    {
        var (caller, episode) = await ChartedAsync();
        var mean = (await caller.GetAsync(episode + "/picture")).Json.GetProperty("values").GetProperty("meanAirwayPressureComputed");
        Assert.Equal("(28 × 4.5 + 5 × 0.5) ÷ (4.5 + 0.5) → 25.7 cmH2O", mean.GetProperty("working").GetString());
    }

    [Fact]
    public async Task Projection_TellsWhatFollows_OrWhyNot_AndRefusesWhatCannotBeSet()
    {
        var (caller, episode) = await ChartedAsync();
        var projection = (await caller.PostAsync(episode + "/projection", new JsonObject { ["pHighCmH2O"] = 26 })).Json;
        Assert.Equal((26 * 4.5 + 5 * 0.5) / 5.0, projection.GetProperty("then").GetProperty("meanAirwayPressureCmH2O").GetDouble(), 6);
        Assert.Equal(JsonValueKind.Null, projection.GetProperty("paCO2").ValueKind);
        Assert.NotEmpty(projection.GetProperty("refusals").EnumerateArray());
        var refused = await caller.PostAsync(episode + "/projection", new JsonObject { ["pHighCmH2O"] = 99 });
        Assert.Equal((HttpStatusCode.UnprocessableEntity, "pHighCmH2O"), (refused.Status, refused.Fields.Single()));
        Assert.Equal(HttpStatusCode.BadRequest, (await caller.PostAsync(episode + "/projection", new JsonObject { ["fiO2"] = 0.5 })).Status);
    }

    [Fact]
    public async Task Picture_OfThePast_KnowsNothingLater()
    {
        var (caller, episode) = await ChartedAsync();
        var past = (await caller.GetAsync($"{episode}/picture?at={caller.Ago(60)}")).Json;
        Assert.Equal("missing", past.GetProperty("values").GetProperty("pfRatio").GetProperty("state").GetString());
        Assert.Equal("aprv", past.GetProperty("mode").GetString());
        Assert.Equal(HttpStatusCode.UnprocessableEntity, (await caller.GetAsync($"{episode}/picture?at={caller.Ago(-60)}")).Status);
        Assert.Equal(HttpStatusCode.BadRequest, (await caller.GetAsync($"{episode}/picture?at=yesterday")).Status);
    }

    [Fact]
    public async Task Flag_IsListed_AndTakenInHand()
    {
        var (caller, episode) = await ChartedAsync();
        await caller.PostAsync(episode + "/ventilator-checks", caller.Check(2, endFlow: 21));
        var flag = (await caller.GetAsync(episode + "/flags")).Json.EnumerateArray().First(f => f.GetProperty("rule").GetString() == "R01");
        var path = $"/flags/{flag.GetProperty("id").GetString()}/acknowledge";
        var taken = await caller.PostAsync(path, new JsonObject
        {
            ["id"] = Caller.NewId(),
            ["plan"] = "look at the curve",
            ["until"] = caller.Ago(-30),
            ["told"] = new JsonObject { ["who"] = "Dr Basalt", ["at"] = caller.Ago(0) },
        });
        Assert.Equal(HttpStatusCode.OK, taken.Status);
        Assert.Equal("Dr Basalt", taken.Json.GetProperty("acknowledged").GetProperty("told").GetProperty("who").GetString());
        Assert.Equal(HttpStatusCode.BadRequest, (await caller.PostAsync(path, new JsonObject { ["id"] = Caller.NewId(), ["told"] = new JsonObject { ["whom"] = "x" } })).Status);
        Assert.Equal(HttpStatusCode.BadRequest, (await caller.GetAsync(episode + "/flags?state=some")).Status);
        Assert.NotEmpty((await caller.GetAsync(episode + "/flags?state=all")).Json.EnumerateArray());
    }

    [Fact]
    public async Task Board_HasOneRowAPatient_WithItsReason()
    {
        var (caller, episode) = await ChartedAsync();
        var rows = (await caller.GetAsync("/units/ICU/board")).Json.GetProperty("rows").EnumerateArray();
        var row = rows.Single(r => episode.EndsWith(r.GetProperty("episodeId").GetString()!, StringComparison.Ordinal));
        Assert.Contains(row.GetProperty("band").GetString(), new[] { "lookNow", "lookThisHour", "notKnown", "nothingRaised" });
        Assert.NotEmpty(row.GetProperty("why").GetString()!);
        Assert.Equal("ards", row.GetProperty("badges")[0].GetString());
    }

    [Fact]
    public async Task Timeline_CarriesTheSeries()
    {
        var (caller, episode) = await ChartedAsync();
        var timeline = (await caller.GetAsync($"{episode}/timeline?from={caller.Ago(600)}&to={caller.Ago(0)}")).Json;
        var ratio = timeline.GetProperty("series").EnumerateArray().Single(s => s.GetProperty("name").GetString() == "pfRatio");
        Assert.Equal(150, ratio.GetProperty("points")[0].GetProperty("value").GetDouble());
        Assert.Equal(HttpStatusCode.UnprocessableEntity, (await caller.GetAsync($"{episode}/timeline?from={caller.Ago(0)}&to={caller.Ago(600)}")).Status);
    }

    [Theory]
    [InlineData("")]
    [InlineData("?paper=letter")]
    public async Task Sheet_IsAPdf(string query)
    {
        var (caller, episode) = await ChartedAsync();
        foreach (var path in new[] { episode + "/handover.pdf" + query, "/units/ICU/handover.pdf" + query })
        {
            var sheet = await caller.GetAsync(path);
            Assert.Equal((HttpStatusCode.OK, "application/pdf"), (sheet.Status, sheet.MediaType));
            Assert.StartsWith("%PDF-", Encoding.ASCII.GetString(sheet.Bytes, 0, 8), StringComparison.Ordinal);
        }
    }

    [Fact]
    public async Task OpenApi_DescribesTheBodies_ToWhoeverHasAToken()
    {
        Assert.Equal(HttpStatusCode.Unauthorized, (await new Caller(app, null).GetAsync("/openapi/v1.json")).Status);
        var document = (await (await Caller.OfAsync(app, UnitRole.Viewer)).GetAsync("/openapi/v1.json")).Json;
        var gas = document.GetProperty("paths").GetProperty("/api/v1/episodes/{id}/blood-gases").GetProperty("post").GetProperty("requestBody");
        var schema = gas.GetProperty("content").GetProperty("application/json").GetProperty("schema");
        Assert.Contains("drawnAt", schema.GetProperty("required").EnumerateArray().Select(r => r.GetString()));
        Assert.Equal(6.5, schema.GetProperty("properties").GetProperty("pH").GetProperty("minimum").GetDouble());
    }

    private async Task<(Caller Caller, string Episode)> ChartedAsync()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        foreach (var (path, body) in new[] { ("setting-changes", caller.Aprv()), ("blood-gases", caller.Gas()), ("ventilator-checks", caller.Check()) })
        {
            Assert.Equal(HttpStatusCode.Created, (await caller.PostAsync($"{episode}/{path}", body)).Status);
        }

        return (caller, episode);
    }
}
