using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.DependencyInjection;
using UnitVent.Store.People;

namespace UnitVent.Store.Tests.People;

public sealed class UserDeskTests(TestStore store) : IClassFixture<TestStore>
{
    private const string Password = "four quiet words here";

    private UserDesk Desk => store.Get<UserDesk>();

    [Fact]
    public async Task Create_MakesAPerson_WhosePasswordIsKeptAsASlowHash()
    {
        var person = TestStore.Value(await Desk.CreateAsync(UserDesk.CommandLine, "r.stein", "R. Stein", Password, false, TestStore.Cancel));

        await using var scope = store.Get<IServiceScopeFactory>().CreateAsyncScope();
        var users = scope.ServiceProvider.GetRequiredService<UserManager<Account>>();
        var account = await users.FindByNameAsync("r.stein");
        Assert.Equal(person.Id, account!.Id);
        Assert.True(await users.CheckPasswordAsync(account, Password));
        Assert.False(await users.CheckPasswordAsync(account, Password + "x"));
        Assert.True(IterationsOf(account.PasswordHash!) >= 210_000, "OWASP ASVS 5.0, 11.4.2");
    }

    // Identity's format 3: marker, pseudo-random function, iterations, each number in network order.
    private static int IterationsOf(string hash) => System.Buffers.Binary.BinaryPrimitives.ReadInt32BigEndian(Convert.FromBase64String(hash).AsSpan(5, 4));
}
