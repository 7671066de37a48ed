using System.Net;
using System.Text.RegularExpressions;
using UnitVent.Store.People;
using UnitVent.Web.Tests.Api;

namespace UnitVent.Web.Tests.Hosting;

[Collection(AppCollection.Name)]
public sealed class HeaderTests(RunningApp app)
{
    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    [Theory]
    [InlineData("/sign-in")]
    [InlineData("/")]
    [InlineData("/no/such/page")]
    [InlineData("/api/v1/units")]
    [InlineData("/livez")]
    public async Task Answer_CarriesTheSecurityHeaders_AndIsNotStored(string path)
    {
        using var answer = await app.Http.GetAsync(path, Cancel);
        Assert.Equal("nosniff", Assert.Single(answer.Headers.GetValues("X-Content-Type-Options")));
        Assert.Equal("no-referrer", Assert.Single(answer.Headers.GetValues("Referrer-Policy")));
        Assert.Contains("frame-ancestors 'none'", Policy(answer), StringComparison.Ordinal);
        Assert.True(answer.Headers.CacheControl!.NoStore);
        Assert.False(answer.Headers.Contains("Server"));
    }

    [Fact]
    public async Task File_OfTheProgram_MayBeKept()
    {
        using var answer = await app.Http.GetAsync("/app.css", Cancel);
        Assert.Equal(HttpStatusCode.OK, answer.StatusCode);
        Assert.False(answer.Headers.CacheControl!.NoStore);
        Assert.NotEmpty(await answer.Content.ReadAsByteArrayAsync(Cancel));
    }

    [Fact]
    public async Task Policy_AllowsNoInlineScriptButTheImportMap()
    {
        using var first = await app.Http.GetAsync("/sign-in", Cancel);
        using var second = await app.Http.GetAsync("/sign-in", Cancel);
        var nonce = Nonce(first);
        Assert.NotEqual(nonce, Nonce(second));
        Assert.StartsWith("default-src 'none'; ", Policy(first), StringComparison.Ordinal);
        Assert.Contains($"script-src 'self' 'nonce-{nonce}';", Policy(first), StringComparison.Ordinal);
        Assert.DoesNotContain("unsafe-eval", Policy(first), StringComparison.Ordinal);
        Assert.DoesNotContain("'unsafe-inline'", Policy(first).Replace("style-src-attr 'unsafe-inline'", "", StringComparison.Ordinal), StringComparison.Ordinal);
        var html = WebUtility.HtmlDecode(await first.Content.ReadAsStringAsync(Cancel));
        var inline = Regex.Matches(html, "<script(?![^>]*src=)[^>]*>").Select(m => m.Value);
        Assert.All(inline, script => Assert.Contains($"nonce=\"{nonce}\"", script, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Circuit_OpenedFromElsewhere_IsRefused()
    {
        using var request = new HttpRequestMessage(HttpMethod.Post, "/_blazor/negotiate?negotiateVersion=1");
        request.Headers.Add("Origin", "https://elsewhere.example");
        using var answer = await app.Http.SendAsync(request, Cancel);
        Assert.Equal(HttpStatusCode.Forbidden, answer.StatusCode);
    }

    [Fact]
    public async Task Sheet_HasANameWithoutThePatients_AndIsNotStored()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync("Canaryname");
        using var request = new HttpRequestMessage(HttpMethod.Get, "/api/v1" + episode + "/handover.pdf");
        request.Headers.Authorization = new("Bearer", await app.TokenAsync(UnitRole.Viewer));
        using var answer = await app.Http.SendAsync(request, Cancel);
        Assert.True(answer.Headers.CacheControl!.NoStore);
        Assert.Equal("inline", answer.Content.Headers.ContentDisposition!.DispositionType);
        Assert.Matches("^\"?handover-ICU-bed-[0-9]+-[0-9]{8}-[0-9]{4}\\.pdf\"?$", answer.Content.Headers.ContentDisposition.FileName);
    }

    private static string Policy(HttpResponseMessage answer) => Assert.Single(answer.Headers.GetValues("Content-Security-Policy"));

    private static string Nonce(HttpResponseMessage answer) => Regex.Match(Policy(answer), "'nonce-([^']+)'").Groups[1].Value;
}
