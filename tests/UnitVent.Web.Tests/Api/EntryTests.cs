using System.Net;
using System.Text.Json.Nodes;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

[Collection(AppCollection.Name)]
public sealed class EntryTests(RunningApp app)
{
    [Fact]
    public async Task Entry_SentTwice_IsOneEntry()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var gas = caller.Gas();
        var first = await caller.PostAsync(episode + "/blood-gases", gas);
        var second = await caller.PostAsync(episode + "/blood-gases", gas);
        Assert.Equal((HttpStatusCode.Created, HttpStatusCode.OK), (first.Status, second.Status));
        Assert.Equal(first.Json.GetProperty("recordedAt").GetString(), second.Json.GetProperty("recordedAt").GetString());
    }

    [Fact]
    public async Task Entry_SameIdOtherBody_Conflicts()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var gas = caller.Gas();
        await caller.PostAsync(episode + "/blood-gases", gas);
        gas["pO2"] = 76;
        var answer = await caller.PostAsync(episode + "/blood-gases", gas);
        Assert.Equal(HttpStatusCode.Conflict, answer.Status);
        Assert.Equal("application/problem+json", answer.MediaType);
    }

    [Fact]
    public async Task Entry_WithManyFaults_HearsOfAllAtOnce()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var answer = await caller.PostAsync(episode + "/blood-gases", new JsonObject { ["surprise"] = 1, ["specimen"] = "tail", ["pH"] = "7.4", ["tensionUnit"] = "mmHg", ["id"] = "7" });
        Assert.Equal(HttpStatusCode.BadRequest, answer.Status);
        Assert.Equal(["drawnAt", "id", "pCO2", "pH", "specimen", "surprise"], answer.Fields.Order(StringComparer.Ordinal));
    }

    [Fact]
    public async Task Entry_ThatCannotBe_IsRefusedAndNamed()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var gas = caller.Gas();
        gas["pH"] = 74;
        var answer = await caller.PostAsync(episode + "/blood-gases", gas);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, answer.Status);
        Assert.Contains("pH", answer.Fields);
    }

    [Fact]
    public async Task Entry_ThatIsUnusual_AsksAndTakesYes()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var settings = caller.Aprv();
        settings["pHighCmH2O"] = 36;
        var asked = await caller.PostAsync(episode + "/setting-changes", settings);
        Assert.Equal(HttpStatusCode.UnprocessableEntity, asked.Status);
        Assert.All(asked.Codes, c => Assert.StartsWith("ask.", c, StringComparison.Ordinal));
        settings["confirmed"] = new JsonArray([.. asked.Codes.Select(c => (JsonNode)c)]);
        Assert.Equal(HttpStatusCode.Created, (await caller.PostAsync(episode + "/setting-changes", settings)).Status);
    }

    [Fact]
    public async Task Correction_ReplacesAndKeepsBoth()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var wrong = caller.Gas();
        await caller.PostAsync(episode + "/blood-gases", wrong);
        var right = caller.Gas();
        (right["pO2"], right["corrects"], right["correctionReason"]) = (85, (string)wrong["id"]!, "slip misread");
        Assert.Equal(HttpStatusCode.Created, (await caller.PostAsync(episode + "/blood-gases", right)).Status);
        var items = (await caller.GetAsync(episode + "/entries?kind=bloodGas")).Json.GetProperty("items").EnumerateArray().ToList();
        Assert.Equal(2, items.Count);
        Assert.Contains(items, i => i.GetProperty("replacedBy").GetString() == (string)right["id"]!);
    }

    [Fact]
    public async Task StrikeOut_NeedsAReason_AndLeavesTheEntryMarked()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var gas = caller.Gas();
        await caller.PostAsync(episode + "/blood-gases", gas);
        var path = $"{episode}/entries/{gas["id"]}/strike-out";
        Assert.Equal(HttpStatusCode.UnprocessableEntity, (await caller.PostAsync(path, new JsonObject { ["id"] = Caller.NewId(), ["reason"] = " " })).Status);
        Assert.Equal(HttpStatusCode.BadRequest, (await caller.PostAsync(path, new JsonObject { ["id"] = Caller.NewId() })).Status);
        Assert.Equal(HttpStatusCode.OK, (await caller.PostAsync(path, new JsonObject { ["id"] = Caller.NewId(), ["reason"] = "wrong patient" })).Status);
        var item = (await caller.GetAsync(episode + "/entries?kind=bloodGas")).Json.GetProperty("items")[0];
        Assert.Equal("wrong patient", item.GetProperty("struck").GetProperty("reason").GetString());
    }

    [Fact]
    public async Task Entries_ComeInPages_WithoutGapOrRepeat()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        for (var i = 0; i < 5; i++)
        {
            await caller.PostAsync(episode + "/notes", new JsonObject { ["id"] = Caller.NewId(), ["at"] = caller.Ago(10 + i), ["text"] = $"note {i}" });
        }

        var seen = new List<string>();
        string? next = "";
        while (next is not null)
        {
            var page = (await caller.GetAsync($"{episode}/entries?kind=note&limit=2&after={next}")).Json;
            seen.AddRange(page.GetProperty("items").EnumerateArray().Select(i => i.GetProperty("body").GetProperty("text").GetString()!));
            next = page.GetProperty("next").GetString();
        }

        Assert.Equal(["note 0", "note 1", "note 2", "note 3", "note 4"], seen);
    }

    [Fact]
    public async Task Numbers_ComeBackAsTyped()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var body = caller.Gas().ToJsonString().Replace("7.34", "7.340", StringComparison.Ordinal);
        using var content = new StringContent(body, System.Text.Encoding.UTF8, "application/json");
        var answer = await caller.SendAsync(HttpMethod.Post, episode + "/blood-gases", content);
        Assert.Equal("7.340", answer.Json.GetProperty("body").GetProperty("pH").GetRawText());
    }

    [Fact]
    public async Task Author_IsTheToken_WhateverTheBodySays()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var gas = caller.Gas();
        gas["recordedBy"] = "Somebody Else";
        Assert.Equal(HttpStatusCode.BadRequest, (await caller.PostAsync(episode + "/blood-gases", gas)).Status);
        gas.Remove("recordedBy");
        Assert.Equal("ChargeTherapist of ICU", (await caller.PostAsync(episode + "/blood-gases", gas)).Json.GetProperty("recordedBy").GetString());
    }
}
