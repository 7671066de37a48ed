using System.Net;
using System.Text;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

[Collection(AppCollection.Name)]
public sealed class ProblemTests(RunningApp app)
{
    [Theory]
    [InlineData("{", "not JSON")]
    [InlineData("", "no body")]
    [InlineData("[]", "no object")]
    [InlineData("""{"id":"x","id":"y"}""", "a member twice")]
    public async Task Body_OfTheWrongShape_IsRefused(string body, string why)
    {
        var caller = await Caller.OfAsync(app);
        var answer = await SendAsync(caller, await caller.AdmitAsync() + "/notes", body);
        Assert.True(answer.Status == HttpStatusCode.BadRequest, why);
        Assert.NotEmpty(answer.Codes);
    }

    [Fact]
    public async Task Body_BeyondTheLimit_IsRefused_AndMoreInAPass()
    {
        var caller = await Caller.OfAsync(app);
        var episode = await caller.AdmitAsync();
        var long70K = $$"""{"id":"{{Caller.NewId()}}","text":"{{new string('a', 70_000)}}"}""";
        Assert.Equal(HttpStatusCode.RequestEntityTooLarge, (await SendAsync(caller, episode + "/notes", long70K)).Status);
        Assert.Equal(HttpStatusCode.BadRequest, (await SendAsync(caller, episode + "/pass", long70K)).Status);
    }

    [Theory]
    [InlineData("/nothing")]
    [InlineData("/units/NOWHERE/board")]
    [InlineData("/episodes/00000000-0000-7000-8000-000000000000/picture")]
    [InlineData("/episodes/7/picture")]
    [InlineData("/flags/00000000-0000-7000-8000-000000000000")]
    public async Task Address_WithNothingBehindIt_IsNotFound(string path)
    {
        var answer = await (await Caller.OfAsync(app)).GetAsync(path);
        Assert.Equal((HttpStatusCode.NotFound, "application/problem+json"), (answer.Status, answer.MediaType));
    }

    private static async Task<Answer> SendAsync(Caller caller, string path, string body)
    {
        using var content = new StringContent(body, Encoding.UTF8, "application/json");
        return await caller.SendAsync(HttpMethod.Post, path, content);
    }
}
