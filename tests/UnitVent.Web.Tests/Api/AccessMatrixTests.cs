using System.Net;
using System.Text.Json.Nodes;
using UnitVent.Store.People;
using UnitVent.Web.Tests.Hosting;

namespace UnitVent.Web.Tests.Api;

/// <summary>Who may do what, over the interface: every role, every operation, the own unit and another.</summary>
[Collection(AppCollection.Name)]
public sealed class AccessMatrixTests(RunningApp app)
{
    private const UnitRole V = UnitRole.Viewer;
    private const UnitRole N = UnitRole.Nurse;
    private const UnitRole T = UnitRole.Therapist;
    private const UnitRole C = UnitRole.ChargeTherapist;
    private const UnitRole P = UnitRole.Physician;

    /// <summary>The roles table of the unit policy as it is delivered.</summary>
    public static TheoryData<string, UnitRole[]> Rights => new()
    {
        { "read", [V, N, T, C, P] },
        { "print", [V, N, T, C, P] },
        { "chart", [N, T, C, P] },
        { "strike another's", [C, P] },
        { "admit", [N, T, C, P] },
        { "move", [N, T, C, P] },
        { "acknowledge", [T, C, P] },
        { "phase", [N, T, C, P] },
        { "method", [T, C, P] },
        { "context", [C, P] },
        { "targets", [P] },
    };

    [Theory]
    [MemberData(nameof(Rights))]
    public async Task Operation_InTheOwnUnit_IsOpenToTheRolesThatHaveIt(string operation, UnitRole[] allowed)
    {
        Chart? chart = null;
        foreach (var role in Enum.GetValues<UnitRole>())
        {
            chart ??= await ChartedAsync();
            var answer = await DoAsync(operation, await Caller.OfAsync(app, role), chart);
            chart = answer.Status == HttpStatusCode.Forbidden ? chart : null;
            Assert.True(
                allowed.Contains(role) ? answer.Status is HttpStatusCode.OK or HttpStatusCode.Created : answer.Status == HttpStatusCode.Forbidden,
                $"{role} {operation}: {answer.Status}");
        }
    }

    [Theory]
    [MemberData(nameof(Rights))]
    public async Task Operation_InAnotherUnit_FindsNothing(string operation, UnitRole[] allowed)
    {
        var chart = await ChartedAsync();
        foreach (var role in allowed)
        {
            var answer = await DoAsync(operation, await Caller.OfAsync(app, role, RunningApp.OtherUnit), chart);
            Assert.True(answer.Status == HttpStatusCode.NotFound, $"{role} {operation}: {answer.Status}");
        }
    }

    [Theory]
    [InlineData(null)]
    [InlineData("nonsense")]
    [InlineData("uv_AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA")]
    public async Task Caller_WithoutAValidToken_IsUnknown(string? token)
    {
        var answer = await new Caller(app, token).GetAsync("/units");
        Assert.Equal((HttpStatusCode.Unauthorized, "application/problem+json"), (answer.Status, answer.MediaType));
    }

    [Fact]
    public async Task Token_OnceRevoked_IsUnknown()
    {
        var caller = new Caller(app, await app.TokenAsync(UnitRole.Viewer, RunningApp.Unit));
        Assert.Equal(HttpStatusCode.OK, (await caller.GetAsync("/units")).Status);
        var cancel = TestContext.Current.CancellationToken;
        var newest = RunningApp.Value(await app.Desk<TokenDesk>().ListAsync(UserDesk.CommandLine, cancel)).First(t => t.Role == UnitRole.Viewer && t.LastUsedAt is not null);
        RunningApp.Value(await app.Desk<TokenDesk>().RevokeAsync(UserDesk.CommandLine, newest.Id, cancel));
        Assert.Equal(HttpStatusCode.Unauthorized, (await caller.GetAsync("/units")).Status);
    }

    private static Task<Answer> DoAsync(string operation, Caller caller, Chart chart)
    {
        var (episode, gas, flag, bed) = chart;
        return operation switch
        {
            "read" => caller.GetAsync(episode + "/picture"),
            "print" => caller.GetAsync(episode + "/handover.pdf"),
            "chart" => caller.PostAsync(episode + "/blood-gases", caller.Gas(5)),
            "strike another's" => caller.PostAsync($"{episode}/entries/{gas}/strike-out", With("reason", "test")),
            "admit" => caller.PostAsync($"/units/{RunningApp.Unit}/episodes", caller.Admission(bed)),
            "move" => caller.PostAsync(episode + "/move", With("bed", bed)),
            "acknowledge" => caller.PostAsync($"/flags/{flag}/acknowledge", With("plan", "look at the curve")),
            "phase" => caller.PostAsync(episode + "/phase", With("phase", "weaning", "from", caller.Ago(1))),
            "method" => caller.PostAsync(episode + "/method", With("method", "flowGuided", "from", caller.Ago(1))),
            "context" => caller.PostAsync(episode + "/context", With("flag", "obstructive", "from", caller.Ago(1))),
            "targets" => caller.PostAsync(episode + "/targets", With("reason", "test", "from", caller.Ago(1))),
            _ => throw new ArgumentOutOfRangeException(nameof(operation), operation, "No such operation."),
        };
    }

    private static JsonObject With(params string[] members)
    {
        var body = new JsonObject { ["id"] = Caller.NewId() };
        for (var i = 0; i < members.Length; i += 2)
        {
            body[members[i]] = members[i + 1];
        }

        return body;
    }

    /// <summary>A patient with settings, a gas and an open flag, all charted by somebody else.</summary>
    private async Task<Chart> ChartedAsync()
    {
        var author = await Caller.OfAsync(app);
        var episode = await author.AdmitAsync();
        var gas = author.Gas();
        await author.PostAsync(episode + "/setting-changes", author.Aprv());
        await author.PostAsync(episode + "/blood-gases", gas);
        await author.PostAsync(episode + "/ventilator-checks", author.Check(10, endFlow: 21));
        var flag = (await author.GetAsync(episode + "/flags")).Json[0].GetProperty("id").GetString()!;
        return new Chart(episode, (string)gas["id"]!, flag, app.FreeBed());
    }

    private sealed record Chart(string Episode, string Gas, string Flag, string FreeBed);
}
