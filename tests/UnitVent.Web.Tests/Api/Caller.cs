using System.Net;
using System.Net.Http.Json;
using System.Text.Json;
using System.Text.Json.Nodes;
using NodaTime;
using NodaTime.Text;
using UnitVent.Store.People;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

/// <summary>Somebody who uses the HTTP interface with a token.</summary>
public sealed class Caller(RunningApp app, string? token)
{
    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    public static async Task<Caller> OfAsync(RunningApp app, UnitRole role = UnitRole.ChargeTherapist, string unit = RunningApp.Unit) =>
        new(app, await app.TokenAsync(role, unit));

    public static string NewId() => Guid.CreateVersion7().ToString();

    public string Ago(double minutes) => InstantPattern.ExtendedIso.Format(app.Clock.GetCurrentInstant() - Duration.FromMinutes(minutes));

    public Task<Answer> GetAsync(string path) => SendAsync(HttpMethod.Get, path, null);

    public Task<Answer> PostAsync(string path, JsonNode body) => SendAsync(HttpMethod.Post, path, JsonContent.Create(body));

    public async Task<Answer> SendAsync(HttpMethod method, string path, HttpContent? content)
    {
        using var request = new HttpRequestMessage(method, path.StartsWith("/openapi", StringComparison.Ordinal) ? path : "/api/v1" + path) { Content = content };
        if (token is not null)
        {
            request.Headers.Authorization = new("Bearer", token);
        }

        using var response = await app.Http.SendAsync(request, Cancel);
        return new Answer(response.StatusCode, response.Content.Headers.ContentType?.MediaType, await response.Content.ReadAsByteArrayAsync(Cancel));
    }

    public JsonObject Admission(string bed, string? familyName = null) => new()
    {
        ["id"] = NewId(),
        ["bed"] = bed,
        ["patient"] = new JsonObject
        {
            ["mrn"] = Guid.NewGuid().ToString("N"),
            ["familyName"] = familyName ?? "Granit",
            ["givenName"] = "Test",
            ["birthDate"] = "1961-02-03",
            ["sex"] = "female",
            ["heightCm"] = 165,
        },
        ["airwaySecuredAt"] = Ago(3000),
        ["contextFlags"] = new JsonArray("ards"),
        ["method"] = "fixedRate",
        ["phase"] = "maintaining",
    };

    /// <summary>Admits somebody to a bed of their own.</summary>
    /// <returns>The path of the episode.</returns>
    public async Task<string> AdmitAsync(string? familyName = null)
    {
        var answer = await PostAsync($"/units/{RunningApp.Unit}/episodes", Admission(app.FreeBed(), familyName));
        Assert.Equal(HttpStatusCode.Created, answer.Status);
        return "/episodes/" + answer.Json.GetProperty("id").GetString();
    }

    public JsonObject Aprv(double minutesAgo = 100) => new()
    {
        ["id"] = NewId(),
        ["effectiveAt"] = Ago(minutesAgo),
        ["mode"] = "aprv",
        ["fiO2"] = 0.5,
        ["pHighCmH2O"] = 28,
        ["pLowCmH2O"] = 5,
        ["tHighS"] = 4.5,
        ["tLowS"] = 0.5,
    };

    public JsonObject Gas(double minutesAgo = 30) => new()
    {
        ["id"] = NewId(),
        ["drawnAt"] = Ago(minutesAgo),
        ["specimen"] = "arterial",
        ["pH"] = 7.34,
        ["pCO2"] = 48,
        ["pO2"] = 75,
        ["tensionUnit"] = "mmHg",
        ["bicarbonateMmolL"] = 25.5,
        ["bicarbonateKind"] = "actual",
        ["fiO2"] = 0.5,
    };

    public JsonObject Check(double minutesAgo = 25, double endFlow = 36) => new()
    {
        ["id"] = NewId(),
        ["observedAt"] = Ago(minutesAgo),
        ["settingsConfirmed"] = true,
        ["peakExpiratoryFlowLMin"] = 60,
        ["endReleaseFlowLMin"] = endFlow,
        ["flowReadings"] = 3,
        ["totalMinuteVolumeLMin"] = 6.6,
        ["releaseVolumeMl"] = 380,
        ["spO2Percent"] = 94,
    };
}

/// <summary>What came back.</summary>
public sealed record Answer(HttpStatusCode Status, string? MediaType, byte[] Bytes)
{
    public JsonElement Json => JsonDocument.Parse(Bytes).RootElement;

    /// <summary>The fields that were complained about.</summary>
    public IEnumerable<string> Fields => Json.GetProperty("errors").EnumerateArray().Select(e => e.GetProperty("field").GetString()!);

    public IEnumerable<string> Codes => Json.GetProperty("errors").EnumerateArray().Select(e => e.GetProperty("code").GetString()!);
}
