using System.Net;
using System.Text.Json.Nodes;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

[Collection(AppCollection.Name)]
public sealed class EpisodeTests(RunningApp app)
{
    [Fact]
    public async Task Admission_ToATakenBed_Conflicts()
    {
        var caller = await Caller.OfAsync(app);
        var admission = caller.Admission(app.FreeBed());
        Assert.Equal(HttpStatusCode.Created, (await caller.PostAsync("/units/ICU/episodes", admission)).Status);
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync("/units/ICU/episodes", admission)).Status);
        var other = caller.Admission((string)admission["bed"]!);
        Assert.Equal(HttpStatusCode.Conflict, (await caller.PostAsync("/units/ICU/episodes", other)).Status);
    }

    [Fact]
    public async Task Admission_WithManyFaults_HearsOfAllAtOnce()
    {
        var caller = await Caller.OfAsync(app);
        var answer = await caller.PostAsync("/units/ICU/episodes", new JsonObject
        {
            ["id"] = Caller.NewId(),
            ["patient"] = new JsonObject { ["mrn"] = "1", ["sex"] = "robot", ["shoeSize"] = 42 },
            ["contextFlags"] = new JsonArray("tired"),
            ["color"] = "red",
        });
        Assert.Equal(HttpStatusCode.BadRequest, answer.Status);
        Assert.Equal(
            ["airwaySecuredAt", "bed", "color", "contextFlags", "patient.familyName", "patient.sex", "patient.shoeSize"],
            answer.Fields.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task Episode_SaysPatientAndWhatIsInForce()
    {
        var caller = await Caller.OfAsync(app);
        var episode = (await caller.GetAsync(await caller.AdmitAsync())).Json;
        Assert.Equal("Granit", episode.GetProperty("patient").GetProperty("familyName").GetString());
        Assert.Equal(("maintaining", "fixedRate"), (episode.GetProperty("phase").GetString(), episode.GetProperty("method").GetString()));
        Assert.Equal("ards", episode.GetProperty("context")[0].GetProperty("flag").GetString());
    }

    [Fact]
    public async Task Episode_Moves_Ends_AndReopens()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var bed = app.FreeBed();
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(episode + "/move", new JsonObject { ["id"] = Caller.NewId(), ["bed"] = bed })).Status);
        Assert.Equal(bed, (await caller.GetAsync(episode)).Json.GetProperty("bed").GetString());
        var end = new JsonObject { ["id"] = Caller.NewId(), ["endedAt"] = caller.Ago(0), ["outcome"] = "liberated" };
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(episode + "/end", end)).Status);
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(episode + "/end", end)).Status);
        end["id"] = Caller.NewId();
        Assert.Equal(HttpStatusCode.Conflict, (await caller.PostAsync(episode + "/end", end)).Status);
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(episode + "/reopen", new JsonObject { ["id"] = Caller.NewId(), ["reason"] = "back on the ventilator" })).Status);
        Assert.Equal("null", (await caller.GetAsync(episode)).Json.GetProperty("endedAt").GetRawText());
    }

    [Fact]
    public async Task Admission_InError_IsCancelledWithAReason()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(episode + "/cancel", new JsonObject { ["id"] = Caller.NewId(), ["reason"] = "wrong bed" })).Status);
        Assert.Equal("cancelledInError", (await caller.GetAsync(episode)).Json.GetProperty("outcome").GetString());
    }

    [Fact]
    public async Task FollowUp_IsDoneOnce()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var followUp = new JsonObject { ["id"] = Caller.NewId(), ["what"] = "gas", ["dueAt"] = caller.Ago(-60), ["forRole"] = "nurse" };
        await caller.PostAsync(episode + "/follow-ups", followUp);
        var path = $"{episode}/follow-ups/{followUp["id"]}/";
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(path + "reassign", new JsonObject { ["id"] = Caller.NewId(), ["forRole"] = "therapist" })).Status);
        var done = new JsonObject { ["id"] = Caller.NewId() };
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(path + "done", done)).Status);
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(path + "done", done)).Status);
        Assert.Equal(HttpStatusCode.Conflict, (await caller.PostAsync(path + "cancel", new JsonObject { ["id"] = Caller.NewId() })).Status);
    }
}
