using UnitVent.Charting.Results;
using UnitVent.Store.People;
using UnitVent.Store.Reading;
using UnitVent.Store.Units;
using UnitVent.Web.Shared;

namespace UnitVent.Web.Admin;

/// <summary>What the tabs of the administration page do, each time as whoever the person is at that moment.</summary>
public sealed class AdminDesks(CurrentActor current, UnitDesk units, UserDesk users, TokenDesk tokens, ChartReader charts)
{
    public Task<Result<IReadOnlyList<UnitSummary>>> UnitsAsync() => AsAsync(actor => units.ListAsync(actor, default));

    /// <summary>The units whose beds the person may keep without being an administrator.</summary>
    public async Task<Result<IReadOnlyList<UnitSummary>>> OwnUnitsAsync()
    {
        var actor = await current.GetAsync();
        var seen = await charts.UnitsAsync(actor, default);
        return seen.Succeeded
            ? Result<IReadOnlyList<UnitSummary>>.Of([.. seen.Value.Where(u => actor.May(Operation.ManageBeds, u.Id)).Select(u => new UnitSummary(u, default, []))])
            : seen.As<IReadOnlyList<UnitSummary>>();
    }

    public Task<Result<Guid>> CreateUnitAsync(NewUnit unit) => AsAsync(actor => units.CreateAsync(actor, unit, default));

    public Task<Result<bool>> ChangeSettingsAsync(string unit, UnitSettings settings) => AsAsync(actor => units.ChangeSettingsAsync(actor, unit, settings, default));

    public Task<Result<bool>> AddBedAsync(string unit, string bed) => AsAsync(actor => units.AddBedAsync(actor, unit, bed, default));

    public Task<Result<bool>> RetireBedAsync(string unit, string bed) => AsAsync(actor => units.RetireBedAsync(actor, unit, bed, default));

    public Task<Result<IReadOnlyList<Person>>> PeopleAsync() => AsAsync(actor => users.ListAsync(actor, default));

    public Task<Result<NewPerson>> CreatePersonAsync(string userName, string name, bool administers) =>
        AsAsync(actor => users.CreateAsync(actor, userName, name, null, administers, default));

    public Task<Result<NewPerson>> ResetPasswordAsync(string userName) => AsAsync(actor => users.ResetPasswordAsync(actor, userName, default));

    public Task<Result<bool>> SetDisabledAsync(Guid person, bool disabled) => AsAsync(actor => users.SetDisabledAsync(actor, person, disabled, default));

    public Task<Result<bool>> SetRoleAsync(Guid person, string unit, UnitRole? role) => AsAsync(actor => users.SetMembershipAsync(actor, person, unit, role, default));

    public Task<Result<IReadOnlyList<ApiToken>>> TokensAsync() => AsAsync(actor => tokens.ListAsync(actor, default));

    public Task<Result<string>> CreateTokenAsync(string unit, UnitRole role, string name, int days) =>
        AsAsync(actor => tokens.CreateAsync(actor, unit, role, name, NodaTime.Duration.FromDays(days), default));

    public Task<Result<bool>> RevokeTokenAsync(Guid token) => AsAsync(actor => tokens.RevokeAsync(actor, token, default));

    private async Task<Result<T>> AsAsync<T>(Func<Actor, Task<Result<T>>> work) => await work(await current.GetAsync());
}
