using NodaTime;
using UnitVent.Charting.Results;
using UnitVent.Store.People;

namespace UnitVent.Store.Tests.People;

public sealed class TokenDeskTests(TestStore store) : IClassFixture<TestStore>
{
    private const int Base64BitsACharacter = 6;

    private TokenDesk Desk => store.Get<TokenDesk>();

    [Fact]
    public async Task Token_StandsForItsRoleInItsUnit_AndNothingElse()
    {
        var token = await CreateAsync("lab", UnitRole.Nurse);

        var actor = TestStore.Value(await Desk.AuthenticateAsync(token, TestStore.Cancel));

        Assert.Equal(("lab", false), (actor.Name, actor.IsAdministrator));
        Assert.Equal(KeyValuePair.Create(store.UnitId, UnitRole.Nurse), Assert.Single(actor.Units));
    }

    [Fact]
    public async Task Token_IsLong_HasItsPrefix_AndIsNotKept()
    {
        var token = await CreateAsync("secret", UnitRole.Viewer);

        Assert.StartsWith("uv_", token, StringComparison.Ordinal);
        Assert.True((token.Length - 3) * Base64BitsACharacter >= 128);
        Assert.Equal(
            Convert.ToHexStringLower(System.Security.Cryptography.SHA256.HashData(System.Text.Encoding.UTF8.GetBytes(token))),
            await Sql.AskAsync<string>(store.Owner, "select encode(hash, 'hex') from api_token where name = 'secret'"));
        Assert.Equal(0, await Sql.AskAsync<long>(store.Owner, $"select count(*) from api_token t where t::text like '%{token[3..]}%'"));
    }

    [Fact]
    public async Task Token_ThatIsRevokedExpiredOrUnknown_IsNobody()
    {
        var (revoked, expiring) = (await CreateAsync("revoked", UnitRole.Nurse), await CreateAsync("expiring", UnitRole.Nurse, Duration.FromHours(1)));
        var listed = TestStore.Value(await Desk.ListAsync(UserDesk.CommandLine, TestStore.Cancel));
        TestStore.Value(await Desk.RevokeAsync(UserDesk.CommandLine, listed.Single(t => t.Name == "revoked").Id, TestStore.Cancel));
        Assert.True((await Desk.AuthenticateAsync(expiring, TestStore.Cancel)).Succeeded);

        store.Clock.Now += Duration.FromHours(1);

        Assert.Equal(Refusal.NotFound, (await Desk.AuthenticateAsync(revoked, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await Desk.AuthenticateAsync(expiring, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.NotFound, (await Desk.AuthenticateAsync("uv_unknown", TestStore.Cancel)).Refusal);
    }

    [Fact]
    public async Task Token_LastsAYearAtMost_AndSaysWhenItWasUsed()
    {
        var token = await CreateAsync("long", UnitRole.Nurse, Duration.FromDays(4000));
        Assert.Null((await ListedAsync("long")).LastUsedAt);

        await Desk.AuthenticateAsync(token, TestStore.Cancel);

        Assert.Equal((store.Now + Duration.FromDays(365), (Instant?)store.Now), ((await ListedAsync("long")).ExpiresAt, (await ListedAsync("long")).LastUsedAt));
    }

    [Fact]
    public async Task WhoIsNoAdministrator_IsDenied()
    {
        var physician = store.With(UnitRole.Physician);

        Assert.Equal(Refusal.Denied, (await Desk.CreateAsync(physician, "ICU", UnitRole.Viewer, "x", null, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.Denied, (await Desk.ListAsync(physician, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.Denied, (await Desk.RevokeAsync(physician, Guid.NewGuid(), TestStore.Cancel)).Refusal);
    }

    private async Task<string> CreateAsync(string name, UnitRole role, Duration? validFor = null) =>
        TestStore.Value(await Desk.CreateAsync(UserDesk.CommandLine, "ICU", role, name, validFor, TestStore.Cancel));

    private async Task<ApiToken> ListedAsync(string name) => TestStore.Value(await Desk.ListAsync(UserDesk.CommandLine, TestStore.Cancel)).Single(t => t.Name == name);
}
