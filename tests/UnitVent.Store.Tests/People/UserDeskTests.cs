using System.Buffers.Binary;
using Microsoft.AspNetCore.Identity;
using Microsoft.Extensions.DependencyInjection;
using UnitVent.Charting.Results;
using UnitVent.Store.Auditing;
using UnitVent.Store.People;

namespace UnitVent.Store.Tests.People;

public sealed class UserDeskTests(TestStore store) : IClassFixture<TestStore>
{
    private const string Password = "four quiet words here";

    private UserDesk Desk => store.Get<UserDesk>();

    [Fact]
    public async Task Create_MakesAPerson_WhosePasswordIsKeptAsASlowHash()
    {
        var person = await CreateAsync("r.stein", Password);

        var account = await AccountAsync("r.stein");
        Assert.Equal(person.Id, account.Id);
        Assert.True(await OpensAsync("r.stein", Password));
        Assert.False(await OpensAsync("r.stein", Password + "x"));
        Assert.True(IterationsOf(account.PasswordHash!) >= 210_000, "OWASP ASVS 5.0, 11.4.2");
    }

    [Theory]
    [InlineData("fourteen chars", "password", "account.PasswordTooShort")]
    [InlineData("fifteen charact", null, null)]
    public async Task Create_LooksAtTheLengthOfAPasswordOnly(string password, string? field, string? code)
    {
        var result = await Desk.CreateAsync(UserDesk.CommandLine, "length-" + password.Length, "L", password, false, TestStore.Cancel);

        Assert.Equal((field, code), (result.Errors.SingleOrDefault()?.Field, result.Errors.SingleOrDefault()?.Code));
    }

    [Fact]
    public async Task Create_WithATakenName_IsRefused_AndLeavesNoTrace()
    {
        await CreateAsync("twice", Password);

        var result = await Desk.CreateAsync(UserDesk.CommandLine, "TWICE", "Other", Password, false, TestStore.Cancel);

        Assert.Equal("account.DuplicateUserName", result.Errors.Single().Code);
        Assert.Equal(1, await Sql.AskAsync<long>(store.Runtime, "select count(*) from account where normalized_user_name = 'TWICE'"));
    }

    [Fact]
    public async Task OneTimeCode_OpensOnce_AndAsksForAPasswordOfOnesOwn()
    {
        var person = await CreateAsync("code", null);
        Assert.True((await AccountAsync("code")).MustChangePassword);
        Assert.True(await OpensAsync("code", person.Secret));

        var reset = TestStore.Value(await Desk.ResetPasswordAsync(UserDesk.CommandLine, "code", TestStore.Cancel));
        Assert.False(await OpensAsync("code", person.Secret));
        Assert.True(await OpensAsync("code", reset.Secret));

        TestStore.Value(await Desk.SetPasswordAsync(UserDesk.CommandLine, person.Id, Password, TestStore.Cancel));
        Assert.False((await AccountAsync("code")).MustChangePassword);
        Assert.True(await OpensAsync("code", Password));
    }

    [Fact]
    public async Task Disabled_IsNobodyAnyMore_UntilEnabled()
    {
        var person = await CreateAsync("gone", Password);

        await Desk.SetDisabledAsync(UserDesk.CommandLine, person.Id, true, TestStore.Cancel);
        Assert.Equal(Refusal.NotFound, (await Desk.ActorAsync(person.Id, TestStore.Cancel)).Refusal);

        await Desk.SetDisabledAsync(UserDesk.CommandLine, person.Id, false, TestStore.Cancel);
        Assert.Equal("gone", TestStore.Value(await Desk.ActorAsync(person.Id, TestStore.Cancel)).Name);
    }

    [Fact]
    public async Task Membership_GivesAndTakesARole()
    {
        var person = await CreateAsync("member", Password);
        Assert.Empty(TestStore.Value(await Desk.ActorAsync(person.Id, TestStore.Cancel)).Units);

        await Desk.SetMembershipAsync(UserDesk.CommandLine, person.Id, "ICU", UnitRole.Nurse, TestStore.Cancel);
        await Desk.SetMembershipAsync(UserDesk.CommandLine, person.Id, "ICU", UnitRole.Therapist, TestStore.Cancel);
        Assert.Equal(UnitRole.Therapist, TestStore.Value(await Desk.ActorAsync(person.Id, TestStore.Cancel)).Units[store.UnitId]);
        Assert.Equal(UnitRole.Therapist, TestStore.Value(await Desk.ListAsync(UserDesk.CommandLine, TestStore.Cancel)).Single(p => p.Id == person.Id).Roles["ICU"]);

        await Desk.SetMembershipAsync(UserDesk.CommandLine, person.Id, "ICU", null, TestStore.Cancel);
        Assert.Empty(TestStore.Value(await Desk.ActorAsync(person.Id, TestStore.Cancel)).Units);
    }

    [Fact]
    public async Task WhoIsNoAdministrator_IsDenied_WhateverTheRole()
    {
        var physician = store.With(UnitRole.Physician);

        Assert.Equal(Refusal.Denied, (await Desk.CreateAsync(physician, "no", "No", Password, false, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.Denied, (await Desk.ResetPasswordAsync(physician, "no", TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.Denied, (await Desk.ListAsync(physician, TestStore.Cancel)).Refusal);
        Assert.Equal(Refusal.Denied, (await Desk.SetMembershipAsync(physician, physician.UserId!.Value, "ICU", UnitRole.Physician, TestStore.Cancel)).Refusal);
    }

    [Fact]
    public async Task EveryStep_IsInTheTrail()
    {
        var person = await CreateAsync("traced", Password);
        await Desk.SetMembershipAsync(UserDesk.CommandLine, person.Id, "ICU", UnitRole.Nurse, TestStore.Cancel);
        await Desk.SetDisabledAsync(UserDesk.CommandLine, person.Id, true, TestStore.Cancel);

        var events = TestStore.Value(await store.Get<AuditTrail>().NewestAsync(AuditTrail.Everywhere, 3, TestStore.Cancel));

        Assert.Equal(["disable-user", "membership", "create-user"], events.Select(e => e.What));
        Assert.All(events, e => Assert.Equal(person.Id, e.Subject));
    }

    private async Task<NewPerson> CreateAsync(string userName, string? password) =>
        TestStore.Value(await Desk.CreateAsync(UserDesk.CommandLine, userName, userName, password, false, TestStore.Cancel));

    private async Task<Account> AccountAsync(string userName) => await WithAsync(async users => (await users.FindByNameAsync(userName))!);

    private Task<bool> OpensAsync(string userName, string password) =>
        WithAsync(async users => await users.CheckPasswordAsync((await users.FindByNameAsync(userName))!, password));

    private async Task<T> WithAsync<T>(Func<UserManager<Account>, Task<T>> work)
    {
        await using var scope = store.Get<IServiceScopeFactory>().CreateAsyncScope();
        return await work(scope.ServiceProvider.GetRequiredService<UserManager<Account>>());
    }

    // Identity's format 3: marker, pseudo-random function, iterations, each number in network order.
    private static int IterationsOf(string hash) => BinaryPrimitives.ReadInt32BigEndian(Convert.FromBase64String(hash).AsSpan(5, 4));
}
