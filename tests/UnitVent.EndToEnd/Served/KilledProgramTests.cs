using System.Net;
using System.Net.Http.Headers;
using System.Net.Http.Json;
using System.Text.Json;

namespace UnitVent.EndToEnd.Served;

/// <summary>What was acknowledged survives the death of the program and of its database, and stands exactly once.</summary>
public sealed class KilledProgramTests : IDisposable
{
    private const int Writers = 4;

    private static readonly TimeSpan WritingTime = TimeSpan.FromSeconds(6);

    private readonly string folder = Directory.CreateTempSubdirectory("unitvent-killed-").FullName;

    public void Dispose() => Directory.Delete(folder, recursive: true);

    [Fact]
    public async Task KilledWhileFourWrite_KeepsEveryAcknowledgedEntryOnce_AndStartsAgain()
    {
        var program = await ServedProgram.StartAsync(folder);
        await ServedProgram.SayAsync(folder, "create-unit", "--code", "ICU", "--name", "Test unit", "--time-zone", "Etc/UTC", "--beds", "1", "2", "3", "4");
        var token = (await ServedProgram.SayAsync(folder, "create-token", "--unit", "ICU", "--role", "chargeTherapist", "--name", "writer")).Trim();
        Assert.StartsWith("uv_", token);
        var episodes = await Task.WhenAll(Enumerable.Range(1, Writers).Select(bed => AdmitAsync(program, token, bed)));
        var writing = episodes.Select(e => WriteUntilDeadAsync(program, token, e)).ToList();
        await Task.Delay(WritingTime, TestContext.Current.CancellationToken);
        await program.KillAsync();
        var notes = await Task.WhenAll(writing);
        await program.DisposeAsync();

        await using var again = await ServedProgram.StartAsync(folder);
        using var client = Client(again, token);
        foreach (var (episode, sent) in episodes.Zip(notes))
        {
            var kept = await EntriesAsync(client, episode);
            Assert.True(sent.Count(n => n.Acknowledged) > 3, "Too few were acknowledged to prove anything.");
            Assert.All(sent.Where(n => n.Acknowledged), note => Assert.Equal(1, kept.Count(id => id == note.Id)));
            Assert.Equal(kept.Count, kept.Distinct().Count());
            var replayed = await Task.WhenAll(sent.Select(n => PostAsync(client, episode, n)));
            Assert.All(sent.Zip(replayed), pair => Assert.True(pair.Second is HttpStatusCode.OK || (!pair.First.Acknowledged && pair.Second is HttpStatusCode.Created)));
            Assert.Equal(sent.Count, (await EntriesAsync(client, episode)).Count(id => sent.Exists(n => n.Id == id)));
        }
    }

    [Fact]
    public async Task Terminated_StopsCleanly_AndTheNextStartFindsEverything()
    {
        var first = await ServedProgram.StartAsync(folder, "--empty");
        Assert.Contains("Set-up secret", first.Output, StringComparison.Ordinal);
        await ServedProgram.SayAsync(folder, "create-unit", "--code", "ICU", "--name", "Test unit", "--time-zone", "Etc/UTC", "--beds", "1");
        Assert.Equal(0, await first.TerminateAsync());
        Assert.False(File.Exists(Path.Combine(folder, "postgres", "postmaster.pid")));

        await using var second = await ServedProgram.StartAsync(folder);
        Assert.NotEmpty(await ServedProgram.SayAsync(folder, "create-token", "--unit", "ICU", "--role", "viewer", "--name", "reader"));
    }

    private static async Task<Guid> AdmitAsync(ServedProgram program, string token, int bed)
    {
        using var client = Client(program, token);
        var id = Guid.CreateVersion7();
        using var answer = await client.PostAsJsonAsync(
            "/api/v1/units/ICU/episodes",
            new { id, bed = $"{bed}", patient = new { mrn = $"K{bed}", familyName = "Granit" }, airwaySecuredAt = DateTime.UtcNow.AddHours(-5) },
            TestContext.Current.CancellationToken);
        Assert.Equal(HttpStatusCode.Created, answer.StatusCode);
        return id;
    }

    private static async Task<List<Sent>> WriteUntilDeadAsync(ServedProgram program, string token, Guid episode)
    {
        using var client = Client(program, token);
        var sent = new List<Sent>();
        while (true)
        {
            var note = new Sent(Guid.CreateVersion7(), DateTime.UtcNow, false);
            try
            {
                var status = await PostAsync(client, episode, note);
                Assert.Equal(HttpStatusCode.Created, status);
                sent.Add(note with { Acknowledged = true });
            }
            catch (HttpRequestException)
            {
                sent.Add(note);
                return sent;
            }
        }
    }

    private static async Task<HttpStatusCode> PostAsync(HttpClient client, Guid episode, Sent note)
    {
        using var answer = await client.PostAsJsonAsync(
            $"/api/v1/episodes/{episode}/notes", new { id = note.Id, at = note.At, text = "written while the power fails" }, TestContext.Current.CancellationToken);
        return answer.StatusCode;
    }

    private static async Task<List<Guid>> EntriesAsync(HttpClient client, Guid episode)
    {
        var ids = new List<Guid>();
        for (string? next = ""; next is not null;)
        {
            var page = await client.GetFromJsonAsync<JsonElement>(
                $"/api/v1/episodes/{episode}/entries?kind=note{(next.Length > 0 ? "&after=" + next : "")}", TestContext.Current.CancellationToken);
            ids.AddRange(page.GetProperty("items").EnumerateArray().Select(i => i.GetProperty("id").GetGuid()));
            next = page.GetProperty("next").GetString();
        }

        return ids;
    }

    private static HttpClient Client(ServedProgram program, string token)
    {
        var client = new HttpClient { BaseAddress = program.Address };
        client.DefaultRequestHeaders.Authorization = new AuthenticationHeaderValue("Bearer", token);
        return client;
    }

    private sealed record Sent(Guid Id, DateTime At, bool Acknowledged);
}
