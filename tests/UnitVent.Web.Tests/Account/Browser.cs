using System.Net;
using System.Text.RegularExpressions;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Account;

/// <summary>A browser without screens: keeps cookies as one does on loopback, sends forms with their tokens, follows no redirect.</summary>
public sealed partial class Browser(RunningApp app)
{
    private static CancellationToken Cancel => TestContext.Current.CancellationToken;

    public Dictionary<string, string> Cookies { get; } = [];

    /// <summary>Every Set-Cookie header that came.</summary>
    public List<string> Set { get; } = [];

    public Task<Page> GetAsync(string path) => SendAsync(new HttpRequestMessage(HttpMethod.Get, path));

    /// <summary>Opens a page and sends its form.</summary>
    public async Task<Page> SubmitAsync(string path, string form, params (string Name, string Value)[] fields)
    {
        var page = await GetAsync(path);
        var token = FormToken().Match(page.Text).Groups[1].Value;
        return await PostAsync(path, [.. fields, ("_handler", form), ("__RequestVerificationToken", token)]);
    }

    public Task<Page> PostAsync(string path, params (string Name, string Value)[] fields) =>
        SendAsync(new HttpRequestMessage(HttpMethod.Post, path) { Content = new FormUrlEncodedContent(fields.Select(f => KeyValuePair.Create(f.Name, f.Value))) });

    public Task<Page> SignInAsync(string userName, string password, string back = "/") =>
        SubmitAsync("/sign-in?return=" + Uri.EscapeDataString(back), "sign-in", ("Typed.UserName", userName), ("Typed.Password", password));

    private async Task<Page> SendAsync(HttpRequestMessage request)
    {
        using (request)
        {
            request.Headers.Add("Cookie", Cookies.Select(c => $"{c.Key}={c.Value}"));
            using var response = await app.Http.SendAsync(request, Cancel);
            foreach (var cookie in response.Headers.TryGetValues("Set-Cookie", out var set) ? set : [])
            {
                Set.Add(cookie);
                var pair = cookie.Split(';')[0].Split('=', 2);
                Cookies[pair[0]] = pair[1];
            }

            return new Page(response.StatusCode, response.Headers.Location?.ToString(), await response.Content.ReadAsStringAsync(Cancel));
        }
    }

    [GeneratedRegex("name=\"__RequestVerificationToken\"[^>]*value=\"([^\"]*)\"")]
    private static partial Regex FormToken();
}

/// <summary>What came back.</summary>
public sealed record Page(HttpStatusCode Status, string? Location, string Text);
